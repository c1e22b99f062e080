import { forGivenMass } from '../firstLaw'
import { polytropicHeatDefinition } from './polytropicHeat'

/** Heat taken up by a given mass, polytropic, J. */
export const polytropicHeatOfMassDefinition = forGivenMass(polytropicHeatDefinition, 'heat taken up by a given mass, polytropic', { inputs: { mass: 2, temperatureStart: 293.15, pressureStart: 100_000, pressureEnd: 70_000, polytropicExponent: 1.2 }, gives: 24295.2, within: 0.2 })
