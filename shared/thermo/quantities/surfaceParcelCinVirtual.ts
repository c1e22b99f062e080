import { parcelDefinition } from '../parcelDefinition'
import { cinResult } from '../parcelResults'

/** Convective inhibition of the surface parcel, with virtual correction on parcel and surroundings: see `parcelDefinition` and `lift`. */
export const surfaceParcelCinVirtualDefinition = parcelDefinition('surface', cinResult, true, { gives: -19.00571, within: 2e-05 })
