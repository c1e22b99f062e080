import { parcelDefinition } from '../parcelDefinition'
import { capeResult } from '../parcelResults'

/** Convective available potential energy of the surface parcel, without virtual correction: see `parcelDefinition` and `lift`. */
export const surfaceParcelCapeDefinition = parcelDefinition('surface', capeResult, false, { gives: 2384.946, within: 0.002 })
