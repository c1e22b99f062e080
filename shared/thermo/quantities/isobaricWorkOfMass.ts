import { forGivenMass } from '../firstLaw'
import { isobaricWorkDefinition } from './isobaricWork'

/** Work done by a given mass, isobaric, J. */
export const isobaricWorkOfMassDefinition = forGivenMass(isobaricWorkDefinition, 'work done by a given mass, isobaric', { inputs: { mass: 2, temperatureStart: 283.15, temperatureEnd: 308.15 }, gives: 14350, within: 2 })
