import { parcelDefinition } from '../parcelDefinition'
import { liftedIndexResult } from '../parcelResults'

/** Lifted index of the parcel with stated θ and w, with virtual correction on parcel and surroundings: see `parcelDefinition` and `lift`. */
export const statedParcelLiftedIndexVirtualDefinition = parcelDefinition('stated', liftedIndexResult, true, { gives: -4.448151, within: 4e-06 })
