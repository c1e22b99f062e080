import { forGivenMass } from '../firstLaw'
import { isothermalHeatDefinition } from './isothermalHeat'

/** Heat taken up by a given mass, isothermal, J. */
export const isothermalHeatOfMassDefinition = forGivenMass(isothermalHeatDefinition, 'heat taken up by a given mass, isothermal', { inputs: { mass: 2, temperature: 293.15, pressureStart: 100_000, pressureEnd: 70_000 }, gives: 60017.0, within: 0.2 })
