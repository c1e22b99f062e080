import { parcelDefinition } from '../parcelDefinition'
import { liftedIndexResult } from '../parcelResults'

/** Lifted index of the most unstable parcel, without virtual correction: see `parcelDefinition` and `lift`. */
export const mostUnstableParcelLiftedIndexDefinition = parcelDefinition('most-unstable', liftedIndexResult, false, { gives: -6.28649, within: 6e-06 })
