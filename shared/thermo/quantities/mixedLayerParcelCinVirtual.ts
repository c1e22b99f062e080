import { parcelDefinition } from '../parcelDefinition'
import { cinResult } from '../parcelResults'

/** Convective inhibition of the mixed-layer parcel, with virtual correction on parcel and surroundings: see `parcelDefinition` and `lift`. */
export const mixedLayerParcelCinVirtualDefinition = parcelDefinition('mixed-layer', cinResult, true, { gives: -10.40273, within: 1e-05 })
