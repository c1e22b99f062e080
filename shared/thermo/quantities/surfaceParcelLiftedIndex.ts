import { parcelDefinition } from '../parcelDefinition'
import { liftedIndexResult } from '../parcelResults'

/** Lifted index of the surface parcel, without virtual correction: see `parcelDefinition` and `lift`. */
export const surfaceParcelLiftedIndexDefinition = parcelDefinition('surface', liftedIndexResult, false, { gives: -6.28649, within: 6e-06 })
