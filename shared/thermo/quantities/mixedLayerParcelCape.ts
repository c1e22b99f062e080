import { parcelDefinition } from '../parcelDefinition'
import { capeResult } from '../parcelResults'

/** Convective available potential energy of the mixed-layer parcel, without virtual correction: see `parcelDefinition` and `lift`. */
export const mixedLayerParcelCapeDefinition = parcelDefinition('mixed-layer', capeResult, false, { gives: 2023.693, within: 0.002 })
