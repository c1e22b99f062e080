import { forGivenMass } from '../firstLaw'
import { polytropicInternalEnergyChangeDefinition } from './polytropicInternalEnergyChange'

/** Change of internal energy of a given mass, polytropic, J. */
export const polytropicInternalEnergyChangeOfMassDefinition = forGivenMass(polytropicInternalEnergyChangeDefinition, 'change of internal energy of a given mass, polytropic', { inputs: { mass: 2, temperatureStart: 293.15, pressureStart: 100_000, pressureEnd: 70_000, polytropicExponent: 1.2 }, gives: -24261.4, within: 0.2 })
