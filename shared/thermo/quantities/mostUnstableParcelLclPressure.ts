import { parcelDefinition } from '../parcelDefinition'
import { lclPressureResult } from '../parcelResults'

/** Pressure of the lifting condensation level of the most unstable parcel: see `parcelDefinition` and `lift`. */
export const mostUnstableParcelLclPressureDefinition = parcelDefinition('most-unstable', lclPressureResult, false, { gives: 91631.65, within: 0.09 })
