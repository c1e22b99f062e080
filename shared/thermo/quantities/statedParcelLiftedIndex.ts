import { parcelDefinition } from '../parcelDefinition'
import { liftedIndexResult } from '../parcelResults'

/** Lifted index of the parcel with stated θ and w, without virtual correction: see `parcelDefinition` and `lift`. */
export const statedParcelLiftedIndexDefinition = parcelDefinition('stated', liftedIndexResult, false, { gives: -3.742013, within: 4e-06 })
