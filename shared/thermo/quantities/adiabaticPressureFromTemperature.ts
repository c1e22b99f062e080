import { adiabaticRelation } from '../adiabats'

/** Pressure after a dry-adiabatic change, from the temperatures. Formula, source and range: `adiabats.ts`. */
export const adiabaticPressureFromTemperatureDefinition = adiabaticRelation({
  key: 'adiabatic-pressure-from-temperature',
  name: 'pressure after a dry-adiabatic change, from the temperatures',
  of: 'pressure',
  from: 'temperature',
  ask: 'The pressure p₂ at which dry air has the temperature at the end of a dry-adiabatic change, by Poisson’s relation, with temperatures in kelvin.',
  example: { inputs: { pressureStart: 100_000, temperatureStart: 293.15, temperatureEnd: 273.15 }, gives: 78098.56, within: 0.01 },
})
