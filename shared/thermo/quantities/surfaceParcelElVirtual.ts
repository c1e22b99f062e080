import { parcelDefinition } from '../parcelDefinition'
import { elResult } from '../parcelResults'

/** Equilibrium level of the surface parcel, with virtual correction on parcel and surroundings: see `parcelDefinition` and `lift`. */
export const surfaceParcelElVirtualDefinition = parcelDefinition('surface', elResult, true, { gives: 18259.05, within: 0.02 })
