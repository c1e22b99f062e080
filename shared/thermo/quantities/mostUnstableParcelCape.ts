import { parcelDefinition } from '../parcelDefinition'
import { capeResult } from '../parcelResults'

/** Convective available potential energy of the most unstable parcel, without virtual correction: see `parcelDefinition` and `lift`. */
export const mostUnstableParcelCapeDefinition = parcelDefinition('most-unstable', capeResult, false, { gives: 2384.946, within: 0.002 })
