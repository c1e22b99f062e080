import { parcelDefinition } from '../parcelDefinition'
import { capeResult } from '../parcelResults'

/** Convective available potential energy of the parcel with stated θ and w, with virtual correction on parcel and surroundings: see `parcelDefinition` and `lift`. */
export const statedParcelCapeVirtualDefinition = parcelDefinition('stated', capeResult, true, { gives: 1293.311, within: 0.001 })
