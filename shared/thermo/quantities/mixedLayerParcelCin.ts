import { parcelDefinition } from '../parcelDefinition'
import { cinResult } from '../parcelResults'

/** Convective inhibition of the mixed-layer parcel, without virtual correction: see `parcelDefinition` and `lift`. */
export const mixedLayerParcelCinDefinition = parcelDefinition('mixed-layer', cinResult, false, { gives: -18.03819, within: 2e-05 })
