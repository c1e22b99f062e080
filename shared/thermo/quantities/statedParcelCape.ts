import { parcelDefinition } from '../parcelDefinition'
import { capeResult } from '../parcelResults'

/** Convective available potential energy of the parcel with stated θ and w, without virtual correction: see `parcelDefinition` and `lift`. */
export const statedParcelCapeDefinition = parcelDefinition('stated', capeResult, false, { gives: 1121.267, within: 0.001 })
