import type { QuantityGroup } from '../definition'
import { latentHeatOfSublimationDefinition } from '../quantities/latentHeatOfSublimation'
import { latentHeatOfVaporizationDefinition } from '../quantities/latentHeatOfVaporization'
import { saturationVaporPressureDefinition } from '../quantities/saturationVaporPressure'
import { saturationVaporPressureOverIceDefinition } from '../quantities/saturationVaporPressureOverIce'

export const moisture: QuantityGroup = {
  key: 'moisture',
  title: 'Moisture',
  quantities: [
    saturationVaporPressureDefinition,
    saturationVaporPressureOverIceDefinition,
    latentHeatOfVaporizationDefinition,
    latentHeatOfSublimationDefinition,
  ],
}
