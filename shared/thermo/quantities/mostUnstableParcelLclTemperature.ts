import { parcelDefinition } from '../parcelDefinition'
import { lclTemperatureResult } from '../parcelResults'

/** Temperature at the lifting condensation level of the most unstable parcel: see `parcelDefinition` and `lift`. */
export const mostUnstableParcelLclTemperatureDefinition = parcelDefinition('most-unstable', lclTemperatureResult, false, { gives: 293.7199, within: 0.0003 })
