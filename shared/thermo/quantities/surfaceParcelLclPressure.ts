import { parcelDefinition } from '../parcelDefinition'
import { lclPressureResult } from '../parcelResults'

/** Pressure of the lifting condensation level of the surface parcel: see `parcelDefinition` and `lift`. */
export const surfaceParcelLclPressureDefinition = parcelDefinition('surface', lclPressureResult, false, { gives: 91631.65, within: 0.09 })
