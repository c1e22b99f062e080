import { forGivenMass } from '../firstLaw'
import { isothermalEnthalpyChangeDefinition } from './isothermalEnthalpyChange'

/** Change of enthalpy, isothermal, of a given mass: 0 J. */
export const isothermalEnthalpyChangeOfMassDefinition = forGivenMass(isothermalEnthalpyChangeDefinition, 'change of enthalpy of a given mass, isothermal', { inputs: { mass: 2, temperature: 293.15, pressureStart: 100_000, pressureEnd: 70_000 }, gives: 0, within: 0 })
