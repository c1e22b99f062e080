import { forGivenMass } from '../firstLaw'
import { isobaricHeatDefinition } from './isobaricHeat'

/** Heat taken up by a given mass, isobaric, J. */
export const isobaricHeatOfMassDefinition = forGivenMass(isobaricHeatDefinition, 'heat taken up by a given mass, isobaric', { inputs: { mass: 2, temperatureStart: 283.15, temperatureEnd: 308.15 }, gives: 50200, within: 2 })
