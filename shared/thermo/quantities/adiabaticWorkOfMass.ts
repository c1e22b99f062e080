import { forGivenMass } from '../firstLaw'
import { adiabaticWorkDefinition } from './adiabaticWork'

/** Work done by a given mass, adiabatic, J. */
export const adiabaticWorkOfMassDefinition = forGivenMass(adiabaticWorkDefinition, 'work done by a given mass, adiabatic', { inputs: { mass: 2, temperatureStart: 293.15, pressureStart: 100_000, pressureEnd: 70_000 }, gives: 40742, within: 10 })
