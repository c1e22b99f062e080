import { parcelDefinition } from '../parcelDefinition'
import { lclPressureResult } from '../parcelResults'

/** Pressure of the lifting condensation level of the mixed-layer parcel: see `parcelDefinition` and `lift`. */
export const mixedLayerParcelLclPressureDefinition = parcelDefinition('mixed-layer', lclPressureResult, false, { gives: 89322.91, within: 0.09 })
