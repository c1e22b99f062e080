import { adiabaticRelation } from '../adiabats'

/** Pressure after a dry-adiabatic change, from the specific volumes. Formula, source and range: `adiabats.ts`. */
export const adiabaticPressureFromSpecificVolumeDefinition = adiabaticRelation({
  key: 'adiabatic-pressure-from-specific-volume',
  name: 'pressure after a dry-adiabatic change, from the specific volumes',
  of: 'pressure',
  from: 'specificVolume',
  ask: 'The pressure p₂ of dry air after a dry-adiabatic change of its specific volume, by Poisson’s relation.',
  example: { inputs: { pressureStart: 100_000, specificVolumeStart: 0.84, specificVolumeEnd: 1.08 }, gives: 70334.32, within: 0.01 },
})
