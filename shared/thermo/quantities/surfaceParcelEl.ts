import { parcelDefinition } from '../parcelDefinition'
import { elResult } from '../parcelResults'

/** Equilibrium level of the surface parcel, without virtual correction: see `parcelDefinition` and `lift`. */
export const surfaceParcelElDefinition = parcelDefinition('surface', elResult, false, { gives: 18265.11, within: 0.02 })
