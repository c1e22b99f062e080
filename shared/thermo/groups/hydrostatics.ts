import type { QuantityGroup } from '../definition'
import { autoconvectiveLapseRateDefinition } from '../quantities/autoconvectiveLapseRate'
import { geometricHeightDefinition } from '../quantities/geometricHeight'
import { geopotentialHeightDefinition } from '../quantities/geopotentialHeight'
import { hypsometricHeightAboveLaunchDefinition } from '../quantities/hypsometricHeightAboveLaunch'
import { hypsometricThicknessDefinition } from '../quantities/hypsometricThickness'
import { hypsometricThicknessOfLevelsDefinition } from '../quantities/hypsometricThicknessOfLevels'
import { layerMeanTemperatureDefinition } from '../quantities/layerMeanTemperature'
import { layerMeanVirtualTemperatureDefinition } from '../quantities/layerMeanVirtualTemperature'
import { pressureAltitudeDefinition } from '../quantities/pressureAltitude'
import { pressureAtHeightDefinition } from '../quantities/pressureAtHeight'
import { scaleHeightDefinition } from '../quantities/scaleHeight'
import { seaLevelPressureDefinition } from '../quantities/seaLevelPressure'
import { seaLevelPressureIsothermalDefinition } from '../quantities/seaLevelPressureIsothermal'
import { standardAtmosphereDensityDefinition } from '../quantities/standardAtmosphereDensity'
import { standardAtmosphereDensityAtGeometricHeightDefinition } from '../quantities/standardAtmosphereDensityAtGeometricHeight'
import { standardAtmospherePressureDefinition } from '../quantities/standardAtmospherePressure'
import { standardAtmospherePressureAtGeometricHeightDefinition } from '../quantities/standardAtmospherePressureAtGeometricHeight'
import { standardAtmosphereTemperatureDefinition } from '../quantities/standardAtmosphereTemperature'
import { standardAtmosphereTemperatureAtGeometricHeightDefinition } from '../quantities/standardAtmosphereTemperatureAtGeometricHeight'
import { stationPressureDefinition } from '../quantities/stationPressure'
import { stationPressureIsothermalDefinition } from '../quantities/stationPressureIsothermal'
import { geopotentialDefinition } from '../quantities/geopotential'

export const hydrostatics: QuantityGroup = {
  key: 'hydrostatics',
  title: 'Hydrostatics',
  quantities: [
    hypsometricThicknessDefinition,
    hypsometricThicknessOfLevelsDefinition,
    layerMeanTemperatureDefinition,
    layerMeanVirtualTemperatureDefinition,
    pressureAtHeightDefinition,
    hypsometricHeightAboveLaunchDefinition,
    pressureAltitudeDefinition,
    seaLevelPressureDefinition,
    seaLevelPressureIsothermalDefinition,
    stationPressureDefinition,
    stationPressureIsothermalDefinition,
    scaleHeightDefinition,
    autoconvectiveLapseRateDefinition,
    geopotentialHeightDefinition,
    geometricHeightDefinition,
    geopotentialDefinition,
    standardAtmosphereTemperatureDefinition,
    standardAtmospherePressureDefinition,
    standardAtmosphereDensityDefinition,
    standardAtmosphereTemperatureAtGeometricHeightDefinition,
    standardAtmospherePressureAtGeometricHeightDefinition,
    standardAtmosphereDensityAtGeometricHeightDefinition,
  ],
}
