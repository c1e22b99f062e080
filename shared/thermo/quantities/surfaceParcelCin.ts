import { parcelDefinition } from '../parcelDefinition'
import { cinResult } from '../parcelResults'

/** Convective inhibition of the surface parcel, without virtual correction: see `parcelDefinition` and `lift`. */
export const surfaceParcelCinDefinition = parcelDefinition('surface', cinResult, false, { gives: -27.77756, within: 3e-05 })
