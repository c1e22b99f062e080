import { parcelDefinition } from '../parcelDefinition'
import { lfcResult } from '../parcelResults'

/** Level of free convection of the mixed-layer parcel, with virtual correction on parcel and surroundings: see `parcelDefinition` and `lift`. */
export const mixedLayerParcelLfcVirtualDefinition = parcelDefinition('mixed-layer', lfcResult, true, { gives: 86735.87, within: 0.09 })
