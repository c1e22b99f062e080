import { parcelDefinition } from '../parcelDefinition'
import { lfcResult } from '../parcelResults'

/** Level of free convection of the surface parcel, with virtual correction on parcel and surroundings: see `parcelDefinition` and `lift`. */
export const surfaceParcelLfcVirtualDefinition = parcelDefinition('surface', lfcResult, true, { gives: 88324.97, within: 0.09 })
