import { parcelDefinition } from '../parcelDefinition'
import { capeResult } from '../parcelResults'

/** Convective available potential energy of the mixed-layer parcel, with virtual correction on parcel and surroundings: see `parcelDefinition` and `lift`. */
export const mixedLayerParcelCapeVirtualDefinition = parcelDefinition('mixed-layer', capeResult, true, { gives: 2253.851, within: 0.002 })
