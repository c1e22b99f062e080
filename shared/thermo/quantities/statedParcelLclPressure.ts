import { parcelDefinition } from '../parcelDefinition'
import { lclPressureResult } from '../parcelResults'

/** Pressure of the lifting condensation level of the parcel with stated θ and w: see `parcelDefinition` and `lift`. */
export const statedParcelLclPressureDefinition = parcelDefinition('stated', lclPressureResult, false, { gives: 90641.58, within: 0.09 })
