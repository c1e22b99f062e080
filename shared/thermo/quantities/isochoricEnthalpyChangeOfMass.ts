import { forGivenMass } from '../firstLaw'
import { isochoricEnthalpyChangeDefinition } from './isochoricEnthalpyChange'

/** Change of enthalpy of a given mass, isochoric, J. */
export const isochoricEnthalpyChangeOfMassDefinition = forGivenMass(isochoricEnthalpyChangeDefinition, 'change of enthalpy of a given mass, isochoric', { inputs: { mass: 2, temperatureStart: 283.15, temperatureEnd: 303.15 }, gives: 40160.0, within: 0.2 })
