import { forGivenMass } from '../firstLaw'
import { polytropicEnthalpyChangeDefinition } from './polytropicEnthalpyChange'

/** Change of enthalpy of a given mass, polytropic, J. */
export const polytropicEnthalpyChangeOfMassDefinition = forGivenMass(polytropicEnthalpyChangeDefinition, 'change of enthalpy of a given mass, polytropic', { inputs: { mass: 2, temperatureStart: 293.15, pressureStart: 100_000, pressureEnd: 70_000, polytropicExponent: 1.2 }, gives: -33972.7, within: 0.2 })
