import { forGivenMass } from '../firstLaw'
import { adiabaticInternalEnergyChangeDefinition } from './adiabaticInternalEnergyChange'

/** Change of internal energy of a given mass, adiabatic, J. */
export const adiabaticInternalEnergyChangeOfMassDefinition = forGivenMass(adiabaticInternalEnergyChangeDefinition, 'change of internal energy of a given mass, adiabatic', { inputs: { mass: 2, temperatureStart: 293.15, pressureStart: 100_000, pressureEnd: 70_000 }, gives: -40742, within: 10 })
