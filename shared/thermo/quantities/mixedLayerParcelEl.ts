import { parcelDefinition } from '../parcelDefinition'
import { elResult } from '../parcelResults'

/** Equilibrium level of the mixed-layer parcel, without virtual correction: see `parcelDefinition` and `lift`. */
export const mixedLayerParcelElDefinition = parcelDefinition('mixed-layer', elResult, false, { gives: 18916.22, within: 0.02 })
