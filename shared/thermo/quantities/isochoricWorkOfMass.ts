import { forGivenMass } from '../firstLaw'
import { isochoricWorkDefinition } from './isochoricWork'

/** Work done by a given mass, isochoric: 0 J. */
export const isochoricWorkOfMassDefinition = forGivenMass(isochoricWorkDefinition, 'work done by a given mass, isochoric', { inputs: { mass: 2, temperatureStart: 283.15, temperatureEnd: 303.15 }, gives: 0, within: 0 })
