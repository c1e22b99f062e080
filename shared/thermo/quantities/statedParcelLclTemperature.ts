import { parcelDefinition } from '../parcelDefinition'
import { lclTemperatureResult } from '../parcelResults'

/** Temperature at the lifting condensation level of the parcel with stated θ and w: see `parcelDefinition` and `lift`. */
export const statedParcelLclTemperatureDefinition = parcelDefinition('stated', lclTemperatureResult, false, { gives: 291.691, within: 0.0003 })
