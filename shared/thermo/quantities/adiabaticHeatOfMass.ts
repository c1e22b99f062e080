import { forGivenMass } from '../firstLaw'
import { adiabaticHeatDefinition } from './adiabaticHeat'

/** Heat taken up by a given mass, adiabatic, J: exactly 0. */
export const adiabaticHeatOfMassDefinition = forGivenMass(adiabaticHeatDefinition, 'heat taken up by a given mass, adiabatic', { inputs: { mass: 2, temperatureStart: 293.15, pressureStart: 100_000, pressureEnd: 70_000 }, gives: 0, within: 0 })
