import { parcelDefinition } from '../parcelDefinition'
import { liftedIndexResult } from '../parcelResults'

/** Lifted index of the mixed-layer parcel, with virtual correction on parcel and surroundings: see `parcelDefinition` and `lift`. */
export const mixedLayerParcelLiftedIndexVirtualDefinition = parcelDefinition('mixed-layer', liftedIndexResult, true, { gives: -6.453964, within: 6e-06 })
