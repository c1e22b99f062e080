import { parcelDefinition } from '../parcelDefinition'
import { capeResult } from '../parcelResults'

/** Convective available potential energy of the surface parcel, with virtual correction on parcel and surroundings: see `parcelDefinition` and `lift`. */
export const surfaceParcelCapeVirtualDefinition = parcelDefinition('surface', capeResult, true, { gives: 2635.367, within: 0.003 })
