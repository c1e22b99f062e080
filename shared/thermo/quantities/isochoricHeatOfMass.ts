import { forGivenMass } from '../firstLaw'
import { isochoricHeatDefinition } from './isochoricHeat'

/** Heat taken up by a given mass, isochoric, J. */
export const isochoricHeatOfMassDefinition = forGivenMass(isochoricHeatDefinition, 'heat taken up by a given mass, isochoric', { inputs: { mass: 2, temperatureStart: 283.15, temperatureEnd: 303.15 }, gives: 28680.0, within: 0.2 })
