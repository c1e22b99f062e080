import { adiabaticRelation } from '../adiabats'

/** Temperature after a dry-adiabatic change, from the specific volumes. Formula, source and range: `adiabats.ts`. */
export const adiabaticTemperatureFromSpecificVolumeDefinition = adiabaticRelation({
  key: 'adiabatic-temperature-from-specific-volume',
  name: 'temperature after a dry-adiabatic change, from the specific volumes',
  of: 'temperature',
  from: 'specificVolume',
  ask: 'The temperature T₂ of dry air after a dry-adiabatic change of its specific volume, by Poisson’s relation.',
  example: { inputs: { temperatureStart: 293.15, specificVolumeStart: 0.84, specificVolumeEnd: 1.08 }, gives: 265.0951, within: 0.0001 },
})
