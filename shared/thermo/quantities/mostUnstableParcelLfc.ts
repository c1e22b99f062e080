import { parcelDefinition } from '../parcelDefinition'
import { lfcResult } from '../parcelResults'

/** Level of free convection of the most unstable parcel, without virtual correction: see `parcelDefinition` and `lift`. */
export const mostUnstableParcelLfcDefinition = parcelDefinition('most-unstable', lfcResult, false, { gives: 86442.37, within: 0.09 })
