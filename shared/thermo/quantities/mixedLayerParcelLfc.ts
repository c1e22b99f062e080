import { parcelDefinition } from '../parcelDefinition'
import { lfcResult } from '../parcelResults'

/** Level of free convection of the mixed-layer parcel, without virtual correction: see `parcelDefinition` and `lift`. */
export const mixedLayerParcelLfcDefinition = parcelDefinition('mixed-layer', lfcResult, false, { gives: 84582.55, within: 0.08 })
