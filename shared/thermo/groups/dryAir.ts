import type { QuantityGroup } from '../definition'
import { adiabaticEnthalpyChangeDefinition } from '../quantities/adiabaticEnthalpyChange'
import { adiabaticEnthalpyChangeOfMassDefinition } from '../quantities/adiabaticEnthalpyChangeOfMass'
import { adiabaticHeatDefinition } from '../quantities/adiabaticHeat'
import { adiabaticHeatOfMassDefinition } from '../quantities/adiabaticHeatOfMass'
import { adiabaticInternalEnergyChangeDefinition } from '../quantities/adiabaticInternalEnergyChange'
import { adiabaticInternalEnergyChangeOfMassDefinition } from '../quantities/adiabaticInternalEnergyChangeOfMass'
import { adiabaticPressureFromSpecificVolumeDefinition } from '../quantities/adiabaticPressureFromSpecificVolume'
import { adiabaticPressureFromTemperatureDefinition } from '../quantities/adiabaticPressureFromTemperature'
import { adiabaticSpecificVolumeFromPressureDefinition } from '../quantities/adiabaticSpecificVolumeFromPressure'
import { adiabaticSpecificVolumeFromTemperatureDefinition } from '../quantities/adiabaticSpecificVolumeFromTemperature'
import { adiabaticTemperatureFromSpecificVolumeDefinition } from '../quantities/adiabaticTemperatureFromSpecificVolume'
import { adiabaticWorkDefinition } from '../quantities/adiabaticWork'
import { adiabaticWorkOfMassDefinition } from '../quantities/adiabaticWorkOfMass'
import { densityDefinition } from '../quantities/density'
import { dryAdiabaticLapseRateDefinition } from '../quantities/dryAdiabaticLapseRate'
import { dryStaticEnergyDefinition } from '../quantities/dryStaticEnergy'
import { exnerFunctionDefinition } from '../quantities/exnerFunction'
import { heatFromEnthalpyAndGeopotentialDefinition } from '../quantities/heatFromEnthalpyAndGeopotential'
import { heatFromEnthalpyAndPressureChangeDefinition } from '../quantities/heatFromEnthalpyAndPressureChange'
import { heatFromInternalEnergyAndWorkDefinition } from '../quantities/heatFromInternalEnergyAndWork'
import { heatingRateDefinition } from '../quantities/heatingRate'
import { heightChangeFromHeatAndEnthalpyDefinition } from '../quantities/heightChangeFromHeatAndEnthalpy'
import { isobaricEnthalpyChangeDefinition } from '../quantities/isobaricEnthalpyChange'
import { isobaricEnthalpyChangeOfMassDefinition } from '../quantities/isobaricEnthalpyChangeOfMass'
import { isobaricHeatDefinition } from '../quantities/isobaricHeat'
import { isobaricHeatOfMassDefinition } from '../quantities/isobaricHeatOfMass'
import { isobaricInternalEnergyChangeDefinition } from '../quantities/isobaricInternalEnergyChange'
import { isobaricInternalEnergyChangeOfMassDefinition } from '../quantities/isobaricInternalEnergyChangeOfMass'
import { isobaricWorkDefinition } from '../quantities/isobaricWork'
import { isobaricWorkOfMassDefinition } from '../quantities/isobaricWorkOfMass'
import { isochoricEnthalpyChangeDefinition } from '../quantities/isochoricEnthalpyChange'
import { isochoricEnthalpyChangeOfMassDefinition } from '../quantities/isochoricEnthalpyChangeOfMass'
import { isochoricHeatDefinition } from '../quantities/isochoricHeat'
import { isochoricHeatOfMassDefinition } from '../quantities/isochoricHeatOfMass'
import { isochoricInternalEnergyChangeDefinition } from '../quantities/isochoricInternalEnergyChange'
import { isochoricInternalEnergyChangeOfMassDefinition } from '../quantities/isochoricInternalEnergyChangeOfMass'
import { isochoricWorkDefinition } from '../quantities/isochoricWork'
import { isochoricWorkOfMassDefinition } from '../quantities/isochoricWorkOfMass'
import { isothermalEnthalpyChangeDefinition } from '../quantities/isothermalEnthalpyChange'
import { isothermalEnthalpyChangeOfMassDefinition } from '../quantities/isothermalEnthalpyChangeOfMass'
import { isothermalHeatDefinition } from '../quantities/isothermalHeat'
import { isothermalHeatOfMassDefinition } from '../quantities/isothermalHeatOfMass'
import { isothermalInternalEnergyChangeDefinition } from '../quantities/isothermalInternalEnergyChange'
import { isothermalInternalEnergyChangeOfMassDefinition } from '../quantities/isothermalInternalEnergyChangeOfMass'
import { isothermalWorkDefinition } from '../quantities/isothermalWork'
import { isothermalWorkOfMassDefinition } from '../quantities/isothermalWorkOfMass'
import { moistUnsaturatedLapseRateDefinition } from '../quantities/moistUnsaturatedLapseRate'
import { parcelLapseRateInEnvironmentDefinition } from '../quantities/parcelLapseRateInEnvironment'
import { parcelTemperatureByHeightDefinition } from '../quantities/parcelTemperatureByHeight'
import { parcelTemperatureByPressureDefinition } from '../quantities/parcelTemperatureByPressure'
import { polytropicEnthalpyChangeDefinition } from '../quantities/polytropicEnthalpyChange'
import { polytropicEnthalpyChangeOfMassDefinition } from '../quantities/polytropicEnthalpyChangeOfMass'
import { polytropicHeatDefinition } from '../quantities/polytropicHeat'
import { polytropicHeatOfMassDefinition } from '../quantities/polytropicHeatOfMass'
import { polytropicInternalEnergyChangeDefinition } from '../quantities/polytropicInternalEnergyChange'
import { polytropicInternalEnergyChangeOfMassDefinition } from '../quantities/polytropicInternalEnergyChangeOfMass'
import { polytropicWorkDefinition } from '../quantities/polytropicWork'
import { polytropicWorkOfMassDefinition } from '../quantities/polytropicWorkOfMass'
import { potentialTemperatureDefinition } from '../quantities/potentialTemperature'
import { pressureAfterIsochoricHeatingDefinition } from '../quantities/pressureAfterIsochoricHeating'
import { pressureByEquationOfStateDefinition } from '../quantities/pressureByEquationOfState'
import { pressureChangeFromHeatAndEnthalpyDefinition } from '../quantities/pressureChangeFromHeatAndEnthalpy'
import { specificHeatingRateDefinition } from '../quantities/specificHeatingRate'
import { specificVolumeDefinition } from '../quantities/specificVolume'
import { temperatureByEquationOfStateDefinition } from '../quantities/temperatureByEquationOfState'
import { temperatureChangeFromHeatAndHeightChangeDefinition } from '../quantities/temperatureChangeFromHeatAndHeightChange'
import { temperatureChangeFromHeatAndPressureChangeDefinition } from '../quantities/temperatureChangeFromHeatAndPressureChange'
import { temperatureChangeFromHeatAndWorkDefinition } from '../quantities/temperatureChangeFromHeatAndWork'
import { temperatureFromPotentialTemperatureDefinition } from '../quantities/temperatureFromPotentialTemperature'
import { workFromHeatAndInternalEnergyDefinition } from '../quantities/workFromHeatAndInternalEnergy'
import { specificVolumeFromHeatAndEnthalpyDefinition } from '../quantities/specificVolumeFromHeatAndEnthalpy'

export const dryAir: QuantityGroup = {
  key: 'dry-air',
  title: 'Dry air and the first law',
  quantities: [
    densityDefinition,
    specificVolumeDefinition,
    pressureByEquationOfStateDefinition,
    temperatureByEquationOfStateDefinition,
    potentialTemperatureDefinition,
    temperatureFromPotentialTemperatureDefinition,
    exnerFunctionDefinition,
    parcelTemperatureByPressureDefinition,
    adiabaticPressureFromTemperatureDefinition,
    adiabaticTemperatureFromSpecificVolumeDefinition,
    adiabaticSpecificVolumeFromTemperatureDefinition,
    adiabaticPressureFromSpecificVolumeDefinition,
    adiabaticSpecificVolumeFromPressureDefinition,
    isobaricHeatDefinition,
    isobaricHeatOfMassDefinition,
    isobaricWorkDefinition,
    isobaricWorkOfMassDefinition,
    isobaricInternalEnergyChangeDefinition,
    isobaricInternalEnergyChangeOfMassDefinition,
    isobaricEnthalpyChangeDefinition,
    isobaricEnthalpyChangeOfMassDefinition,
    isochoricHeatDefinition,
    isochoricHeatOfMassDefinition,
    isochoricWorkDefinition,
    isochoricWorkOfMassDefinition,
    isochoricInternalEnergyChangeDefinition,
    isochoricInternalEnergyChangeOfMassDefinition,
    isochoricEnthalpyChangeDefinition,
    isochoricEnthalpyChangeOfMassDefinition,
    isothermalHeatDefinition,
    isothermalHeatOfMassDefinition,
    isothermalWorkDefinition,
    isothermalWorkOfMassDefinition,
    isothermalInternalEnergyChangeDefinition,
    isothermalInternalEnergyChangeOfMassDefinition,
    isothermalEnthalpyChangeDefinition,
    isothermalEnthalpyChangeOfMassDefinition,
    adiabaticHeatDefinition,
    adiabaticHeatOfMassDefinition,
    adiabaticWorkDefinition,
    adiabaticWorkOfMassDefinition,
    adiabaticInternalEnergyChangeDefinition,
    adiabaticInternalEnergyChangeOfMassDefinition,
    adiabaticEnthalpyChangeDefinition,
    adiabaticEnthalpyChangeOfMassDefinition,
    polytropicHeatDefinition,
    polytropicHeatOfMassDefinition,
    polytropicWorkDefinition,
    polytropicWorkOfMassDefinition,
    polytropicInternalEnergyChangeDefinition,
    polytropicInternalEnergyChangeOfMassDefinition,
    polytropicEnthalpyChangeDefinition,
    polytropicEnthalpyChangeOfMassDefinition,
    heatFromInternalEnergyAndWorkDefinition,
    workFromHeatAndInternalEnergyDefinition,
    temperatureChangeFromHeatAndWorkDefinition,
    heatFromEnthalpyAndPressureChangeDefinition,
    temperatureChangeFromHeatAndPressureChangeDefinition,
    pressureChangeFromHeatAndEnthalpyDefinition,
    specificVolumeFromHeatAndEnthalpyDefinition,
    heatFromEnthalpyAndGeopotentialDefinition,
    temperatureChangeFromHeatAndHeightChangeDefinition,
    heightChangeFromHeatAndEnthalpyDefinition,
    pressureAfterIsochoricHeatingDefinition,
    heatingRateDefinition,
    specificHeatingRateDefinition,
    dryAdiabaticLapseRateDefinition,
    moistUnsaturatedLapseRateDefinition,
    parcelLapseRateInEnvironmentDefinition,
    parcelTemperatureByHeightDefinition,
    dryStaticEnergyDefinition,
  ],
}
