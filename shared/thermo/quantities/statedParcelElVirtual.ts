import { parcelDefinition } from '../parcelDefinition'
import { elResult } from '../parcelResults'

/** Equilibrium level of the parcel with stated θ and w, with virtual correction on parcel and surroundings: see `parcelDefinition` and `lift`. */
export const statedParcelElVirtualDefinition = parcelDefinition('stated', elResult, true, { gives: 21580.13, within: 0.02 })
