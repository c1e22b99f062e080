import { forGivenMass } from '../firstLaw'
import { isochoricInternalEnergyChangeDefinition } from './isochoricInternalEnergyChange'

/** Change of internal energy of a given mass, isochoric, J. */
export const isochoricInternalEnergyChangeOfMassDefinition = forGivenMass(isochoricInternalEnergyChangeDefinition, 'change of internal energy of a given mass, isochoric', { inputs: { mass: 2, temperatureStart: 283.15, temperatureEnd: 303.15 }, gives: 28680.0, within: 0.2 })
