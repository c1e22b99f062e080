import { parcelDefinition } from '../parcelDefinition'
import { lfcResult } from '../parcelResults'

/** Level of free convection of the parcel with stated θ and w, without virtual correction: see `parcelDefinition` and `lift`. */
export const statedParcelLfcDefinition = parcelDefinition('stated', lfcResult, false, { gives: 75704.93, within: 0.08 })
