import { parcelDefinition } from '../parcelDefinition'
import { elResult } from '../parcelResults'

/** Equilibrium level of the mixed-layer parcel, with virtual correction on parcel and surroundings: see `parcelDefinition` and `lift`. */
export const mixedLayerParcelElVirtualDefinition = parcelDefinition('mixed-layer', elResult, true, { gives: 18909.3, within: 0.02 })
