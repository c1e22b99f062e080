import { parcelDefinition } from '../parcelDefinition'
import { lclTemperatureResult } from '../parcelResults'

/** Temperature at the lifting condensation level of the mixed-layer parcel: see `parcelDefinition` and `lift`. */
export const mixedLayerParcelLclTemperatureDefinition = parcelDefinition('mixed-layer', lclTemperatureResult, false, { gives: 292.3734, within: 0.0003 })
