import { parcelDefinition } from '../parcelDefinition'
import { liftedIndexResult } from '../parcelResults'

/** Lifted index of the surface parcel, with virtual correction on parcel and surroundings: see `parcelDefinition` and `lift`. */
export const surfaceParcelLiftedIndexVirtualDefinition = parcelDefinition('surface', liftedIndexResult, true, { gives: -7.179813, within: 7e-06 })
