import { parcelDefinition } from '../parcelDefinition'
import { cinResult } from '../parcelResults'

/** Convective inhibition of the parcel with stated θ and w, without virtual correction: see `parcelDefinition` and `lift`. */
export const statedParcelCinDefinition = parcelDefinition('stated', cinResult, false, { gives: -112.0671, within: 0.0001 })
