import { adiabaticRelation, adiabaticState } from '../adiabats'
import { numberOf } from '../inputs'
import { slip } from '../slips'

/**
 * Temperature of a parcel lifted or lowered dry-adiabatically from one pressure to another, by Poisson's relation.
 * Formula, source and range: `adiabats.ts`. By height (g/cp) is another quantity: the two agree only where the height comes from the same column.
 */
export const parcelTemperatureByPressureDefinition = adiabaticRelation({
  key: 'parcel-temperature-by-pressure',
  name: 'temperature of a parcel lifted or lowered dry-adiabatically, by pressure',
  of: 'temperature',
  from: 'pressure',
  ask: 'The temperature T₂ of the parcel after it is lifted or lowered dry-adiabatically to the pressure at the end, by Poisson’s relation.',
  moreSlips: [
    slip('standard-pressure', '1013.25 hPa at the start', 'This starts from 1013.25 hPa: the parcel starts from its own pressure.', (inputs, constants) =>
      numberOf(inputs, 'pressureStart') === 101_325 ? null : adiabaticState('temperature', numberOf(inputs, 'temperatureStart'), 'pressure', 101_325, numberOf(inputs, 'pressureEnd'), constants)),
    slip('reference-pressure', '1000 hPa at the start', 'This starts from 1000 hPa, as if the temperature were a potential temperature: the parcel starts from its own pressure.', (inputs, constants) =>
      numberOf(inputs, 'pressureStart') === 100_000 ? null : adiabaticState('temperature', numberOf(inputs, 'temperatureStart'), 'pressure', 100_000, numberOf(inputs, 'pressureEnd'), constants)),
  ],
  example: { inputs: { temperatureStart: 288.15, pressureStart: 100_000, pressureEnd: 90_000 }, gives: 279.6009, within: 0.0001 },
})
