import { parcelDefinition } from '../parcelDefinition'
import { elResult } from '../parcelResults'

/** Equilibrium level of the most unstable parcel, with virtual correction on parcel and surroundings: see `parcelDefinition` and `lift`. */
export const mostUnstableParcelElVirtualDefinition = parcelDefinition('most-unstable', elResult, true, { gives: 18259.05, within: 0.02 })
