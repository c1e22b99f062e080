import { adiabaticRelation } from '../adiabats'

/** Specific volume after a dry-adiabatic change, from the pressures. Formula, source and range: `adiabats.ts`. */
export const adiabaticSpecificVolumeFromPressureDefinition = adiabaticRelation({
  key: 'adiabatic-specific-volume-from-pressure',
  name: 'specific volume after a dry-adiabatic change, from the pressures',
  of: 'specificVolume',
  from: 'pressure',
  ask: 'The specific volume α₂ of dry air after a dry-adiabatic change of pressure, by Poisson’s relation.',
  example: { inputs: { specificVolumeStart: 0.84, pressureStart: 100_000, pressureEnd: 70_000 }, gives: 1.083681, within: 0.000001 },
})
