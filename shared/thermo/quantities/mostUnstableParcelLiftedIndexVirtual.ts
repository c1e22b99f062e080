import { parcelDefinition } from '../parcelDefinition'
import { liftedIndexResult } from '../parcelResults'

/** Lifted index of the most unstable parcel, with virtual correction on parcel and surroundings: see `parcelDefinition` and `lift`. */
export const mostUnstableParcelLiftedIndexVirtualDefinition = parcelDefinition('most-unstable', liftedIndexResult, true, { gives: -7.179813, within: 7e-06 })
