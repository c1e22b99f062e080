import { parcelDefinition } from '../parcelDefinition'
import { cinResult } from '../parcelResults'

/** Convective inhibition of the most unstable parcel, without virtual correction: see `parcelDefinition` and `lift`. */
export const mostUnstableParcelCinDefinition = parcelDefinition('most-unstable', cinResult, false, { gives: -27.77756, within: 3e-05 })
