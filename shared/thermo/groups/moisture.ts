import type { QuantityGroup } from '../definition'
import { absoluteHumidityDefinition } from '../quantities/absoluteHumidity'
import { densityOfMoistAirDefinition } from '../quantities/densityOfMoistAir'
import { dewpointDefinition } from '../quantities/dewpoint'
import { dewpointFromMixingRatioDefinition } from '../quantities/dewpointFromMixingRatio'
import { dewpointFromRelativeHumidityDefinition } from '../quantities/dewpointFromRelativeHumidity'
import { frostPointDefinition } from '../quantities/frostPoint'
import { frostPointFromRelativeHumidityDefinition } from '../quantities/frostPointFromRelativeHumidity'
import { latentHeatOfSublimationDefinition } from '../quantities/latentHeatOfSublimation'
import { latentHeatOfVaporizationDefinition } from '../quantities/latentHeatOfVaporization'
import { mixingRatioDefinition } from '../quantities/mixingRatio'
import { mixingRatioFromVaporPressureDefinition } from '../quantities/mixingRatioFromVaporPressure'
import { mixingRatioFromWetBulbDefinition } from '../quantities/mixingRatioFromWetBulb'
import { relativeHumidityDefinition } from '../quantities/relativeHumidity'
import { relativeHumidityByMixingRatioDefinition } from '../quantities/relativeHumidityByMixingRatio'
import { relativeHumidityFromIcePsychrometerDefinition } from '../quantities/relativeHumidityFromIcePsychrometer'
import { relativeHumidityFromPsychrometerDefinition } from '../quantities/relativeHumidityFromPsychrometer'
import { relativeHumidityFromScreenPsychrometerDefinition } from '../quantities/relativeHumidityFromScreenPsychrometer'
import { relativeHumidityOverIceDefinition } from '../quantities/relativeHumidityOverIce'
import { saturationMixingRatioDefinition } from '../quantities/saturationMixingRatio'
import { saturationMixingRatioOverIceDefinition } from '../quantities/saturationMixingRatioOverIce'
import { saturationVaporPressureDefinition } from '../quantities/saturationVaporPressure'
import { saturationVaporPressureOverIceDefinition } from '../quantities/saturationVaporPressureOverIce'
import { specificEnthalpyOfMoistAirDefinition } from '../quantities/specificEnthalpyOfMoistAir'
import { specificHeatAtConstantVolumeOfMoistAirDefinition } from '../quantities/specificHeatAtConstantVolumeOfMoistAir'
import { specificHeatOfMoistAirDefinition } from '../quantities/specificHeatOfMoistAir'
import { specificHumidityDefinition } from '../quantities/specificHumidity'
import { specificHumidityFromDewpointDefinition } from '../quantities/specificHumidityFromDewpoint'
import { vaporPressureDefinition } from '../quantities/vaporPressure'
import { vaporPressureFromIcePsychrometerDefinition } from '../quantities/vaporPressureFromIcePsychrometer'
import { vaporPressureFromMixingRatioDefinition } from '../quantities/vaporPressureFromMixingRatio'
import { vaporPressureFromPsychrometerDefinition } from '../quantities/vaporPressureFromPsychrometer'
import { vaporPressureFromRelativeHumidityDefinition } from '../quantities/vaporPressureFromRelativeHumidity'
import { vaporPressureFromScreenPsychrometerDefinition } from '../quantities/vaporPressureFromScreenPsychrometer'
import { virtualTemperatureDefinition } from '../quantities/virtualTemperature'
import { wetBulbTemperatureDefinition } from '../quantities/wetBulbTemperature'
import { wetBulbTemperatureFromRelativeHumidityDefinition } from '../quantities/wetBulbTemperatureFromRelativeHumidity'
import { latentHeatOfFusionDefinition } from '../quantities/latentHeatOfFusion'
import { mixingRatioFromSpecificHumidityDefinition } from '../quantities/mixingRatioFromSpecificHumidity'

export const moisture: QuantityGroup = {
  key: 'moisture',
  title: 'Moisture',
  quantities: [
    saturationVaporPressureDefinition,
    saturationVaporPressureOverIceDefinition,
    latentHeatOfVaporizationDefinition,
    latentHeatOfSublimationDefinition,
    latentHeatOfFusionDefinition,
    vaporPressureDefinition,
    vaporPressureFromRelativeHumidityDefinition,
    vaporPressureFromMixingRatioDefinition,
    mixingRatioDefinition,
    mixingRatioFromVaporPressureDefinition,
    mixingRatioFromSpecificHumidityDefinition,
    saturationMixingRatioDefinition,
    saturationMixingRatioOverIceDefinition,
    specificHumidityDefinition,
    specificHumidityFromDewpointDefinition,
    absoluteHumidityDefinition,
    relativeHumidityDefinition,
    relativeHumidityByMixingRatioDefinition,
    relativeHumidityOverIceDefinition,
    dewpointDefinition,
    dewpointFromRelativeHumidityDefinition,
    dewpointFromMixingRatioDefinition,
    frostPointDefinition,
    frostPointFromRelativeHumidityDefinition,
    virtualTemperatureDefinition,
    densityOfMoistAirDefinition,
    specificEnthalpyOfMoistAirDefinition,
    specificHeatOfMoistAirDefinition,
    specificHeatAtConstantVolumeOfMoistAirDefinition,
    vaporPressureFromPsychrometerDefinition,
    vaporPressureFromScreenPsychrometerDefinition,
    vaporPressureFromIcePsychrometerDefinition,
    relativeHumidityFromPsychrometerDefinition,
    relativeHumidityFromScreenPsychrometerDefinition,
    relativeHumidityFromIcePsychrometerDefinition,
    wetBulbTemperatureDefinition,
    wetBulbTemperatureFromRelativeHumidityDefinition,
    mixingRatioFromWetBulbDefinition,
  ],
}
