import { forGivenMass } from '../firstLaw'
import { polytropicWorkDefinition } from './polytropicWork'

/** Work done by a given mass, polytropic, J. */
export const polytropicWorkOfMassDefinition = forGivenMass(polytropicWorkDefinition, 'work done by a given mass, polytropic', { inputs: { mass: 2, temperatureStart: 293.15, pressureStart: 100_000, pressureEnd: 70_000, polytropicExponent: 1.2 }, gives: 48556.6, within: 0.2 })
