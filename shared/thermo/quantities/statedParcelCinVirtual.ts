import { parcelDefinition } from '../parcelDefinition'
import { cinResult } from '../parcelResults'

/** Convective inhibition of the parcel with stated θ and w, with virtual correction on parcel and surroundings: see `parcelDefinition` and `lift`. */
export const statedParcelCinVirtualDefinition = parcelDefinition('stated', cinResult, true, { gives: -98.96067, within: 0.0001 })
