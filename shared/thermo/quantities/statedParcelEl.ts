import { parcelDefinition } from '../parcelDefinition'
import { elResult } from '../parcelResults'

/** Equilibrium level of the parcel with stated θ and w, without virtual correction: see `parcelDefinition` and `lift`. */
export const statedParcelElDefinition = parcelDefinition('stated', elResult, false, { gives: 21605.45, within: 0.02 })
