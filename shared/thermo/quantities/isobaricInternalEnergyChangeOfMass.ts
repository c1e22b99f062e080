import { forGivenMass } from '../firstLaw'
import { isobaricInternalEnergyChangeDefinition } from './isobaricInternalEnergyChange'

/** Change of internal energy of a given mass, isobaric, J. */
export const isobaricInternalEnergyChangeOfMassDefinition = forGivenMass(isobaricInternalEnergyChangeDefinition, 'change of internal energy of a given mass, isobaric', { inputs: { mass: 2, temperatureStart: 283.15, temperatureEnd: 308.15 }, gives: 35850, within: 2 })
