import { parcelDefinition } from '../parcelDefinition'
import { elResult } from '../parcelResults'

/** Equilibrium level of the most unstable parcel, without virtual correction: see `parcelDefinition` and `lift`. */
export const mostUnstableParcelElDefinition = parcelDefinition('most-unstable', elResult, false, { gives: 18265.11, within: 0.02 })
