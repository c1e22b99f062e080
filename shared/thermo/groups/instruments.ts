import type { QuantityGroup } from '../definition'
import { eastwardWindDefinition } from '../quantities/eastwardWind'
import { frictionVelocityDefinition } from '../quantities/frictionVelocity'
import { lagCorrectedTemperatureDefinition } from '../quantities/lagCorrectedTemperature'
import { lagCorrectedTemperatureInFlightDefinition } from '../quantities/lagCorrectedTemperatureInFlight'
import { logarithmicWindSpeedDefinition } from '../quantities/logarithmicWindSpeed'
import { meanWindDirectionDefinition } from '../quantities/meanWindDirection'
import { northwardWindDefinition } from '../quantities/northwardWind'
import { roughnessLengthDefinition } from '../quantities/roughnessLength'
import { scalarMeanWindSpeedDefinition } from '../quantities/scalarMeanWindSpeed'
import { sensorLagErrorDefinition } from '../quantities/sensorLagError'
import { sensorLagHeightShiftDefinition } from '../quantities/sensorLagHeightShift'
import { sensorStepResponseDefinition } from '../quantities/sensorStepResponse'
import { sensorTimeConstantDefinition } from '../quantities/sensorTimeConstant'
import { vectorMeanWindDirectionDefinition } from '../quantities/vectorMeanWindDirection'
import { vectorMeanWindSpeedDefinition } from '../quantities/vectorMeanWindSpeed'

export const instruments: QuantityGroup = {
  key: 'instruments',
  title: 'Instruments and the surface layer',
  quantities: [
    sensorLagErrorDefinition,
    sensorLagHeightShiftDefinition,
    sensorStepResponseDefinition,
    sensorTimeConstantDefinition,
    lagCorrectedTemperatureDefinition,
    lagCorrectedTemperatureInFlightDefinition,
    logarithmicWindSpeedDefinition,
    frictionVelocityDefinition,
    roughnessLengthDefinition,
    eastwardWindDefinition,
    northwardWindDefinition,
    scalarMeanWindSpeedDefinition,
    vectorMeanWindSpeedDefinition,
    vectorMeanWindDirectionDefinition,
    meanWindDirectionDefinition,
  ],
}
