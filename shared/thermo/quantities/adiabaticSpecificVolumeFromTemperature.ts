import { adiabaticRelation } from '../adiabats'

/** Specific volume after a dry-adiabatic change, from the temperatures. Formula, source and range: `adiabats.ts`. */
export const adiabaticSpecificVolumeFromTemperatureDefinition = adiabaticRelation({
  key: 'adiabatic-specific-volume-from-temperature',
  name: 'specific volume after a dry-adiabatic change, from the temperatures',
  of: 'specificVolume',
  from: 'temperature',
  ask: 'The specific volume α₂ of dry air after a dry-adiabatic change of its temperature, by Poisson’s relation, with temperatures in kelvin.',
  example: { inputs: { specificVolumeStart: 0.84, temperatureStart: 293.15, temperatureEnd: 273.15 }, gives: 1.002184, within: 0.000001 },
})
