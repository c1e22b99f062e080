import { parcelDefinition } from '../parcelDefinition'
import { liftedIndexResult } from '../parcelResults'

/** Lifted index of the mixed-layer parcel, without virtual correction: see `parcelDefinition` and `lift`. */
export const mixedLayerParcelLiftedIndexDefinition = parcelDefinition('mixed-layer', liftedIndexResult, false, { gives: -5.613484, within: 6e-06 })
