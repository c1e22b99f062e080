import { parcelDefinition } from '../parcelDefinition'
import { lfcResult } from '../parcelResults'

/** Level of free convection of the parcel with stated θ and w, with virtual correction on parcel and surroundings: see `parcelDefinition` and `lift`. */
export const statedParcelLfcVirtualDefinition = parcelDefinition('stated', lfcResult, true, { gives: 80121.27, within: 0.08 })
