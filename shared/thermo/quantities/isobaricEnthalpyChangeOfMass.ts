import { forGivenMass } from '../firstLaw'
import { isobaricEnthalpyChangeDefinition } from './isobaricEnthalpyChange'

/** Change of enthalpy of a given mass, isobaric, J. */
export const isobaricEnthalpyChangeOfMassDefinition = forGivenMass(isobaricEnthalpyChangeDefinition, 'change of enthalpy of a given mass, isobaric', { inputs: { mass: 2, temperatureStart: 283.15, temperatureEnd: 308.15 }, gives: 50200, within: 2 })
