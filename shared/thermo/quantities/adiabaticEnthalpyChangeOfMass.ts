import { forGivenMass } from '../firstLaw'
import { adiabaticEnthalpyChangeDefinition } from './adiabaticEnthalpyChange'

/** Change of enthalpy of a given mass, adiabatic, J. */
export const adiabaticEnthalpyChangeOfMassDefinition = forGivenMass(adiabaticEnthalpyChangeDefinition, 'change of enthalpy of a given mass, adiabatic', { inputs: { mass: 2, temperatureStart: 293.15, pressureStart: 100_000, pressureEnd: 70_000 }, gives: -57050, within: 10 })
