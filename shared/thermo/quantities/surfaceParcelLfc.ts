import { parcelDefinition } from '../parcelDefinition'
import { lfcResult } from '../parcelResults'

/** Level of free convection of the surface parcel, without virtual correction: see `parcelDefinition` and `lift`. */
export const surfaceParcelLfcDefinition = parcelDefinition('surface', lfcResult, false, { gives: 86442.37, within: 0.09 })
