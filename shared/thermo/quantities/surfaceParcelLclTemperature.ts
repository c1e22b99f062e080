import { parcelDefinition } from '../parcelDefinition'
import { lclTemperatureResult } from '../parcelResults'

/** Temperature at the lifting condensation level of the surface parcel: see `parcelDefinition` and `lift`. */
export const surfaceParcelLclTemperatureDefinition = parcelDefinition('surface', lclTemperatureResult, false, { gives: 293.7199, within: 0.0003 })
