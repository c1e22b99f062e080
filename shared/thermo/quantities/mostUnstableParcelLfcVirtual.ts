import { parcelDefinition } from '../parcelDefinition'
import { lfcResult } from '../parcelResults'

/** Level of free convection of the most unstable parcel, with virtual correction on parcel and surroundings: see `parcelDefinition` and `lift`. */
export const mostUnstableParcelLfcVirtualDefinition = parcelDefinition('most-unstable', lfcResult, true, { gives: 88324.97, within: 0.09 })
