import { forGivenMass } from '../firstLaw'
import { isothermalInternalEnergyChangeDefinition } from './isothermalInternalEnergyChange'

/** Change of internal energy, isothermal, of a given mass: 0 J. */
export const isothermalInternalEnergyChangeOfMassDefinition = forGivenMass(isothermalInternalEnergyChangeDefinition, 'change of internal energy of a given mass, isothermal', { inputs: { mass: 2, temperature: 293.15, pressureStart: 100_000, pressureEnd: 70_000 }, gives: 0, within: 0 })
