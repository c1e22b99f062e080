import { parcelDefinition } from '../parcelDefinition'
import { capeResult } from '../parcelResults'

/** Convective available potential energy of the most unstable parcel, with virtual correction on parcel and surroundings: see `parcelDefinition` and `lift`. */
export const mostUnstableParcelCapeVirtualDefinition = parcelDefinition('most-unstable', capeResult, true, { gives: 2635.367, within: 0.003 })
