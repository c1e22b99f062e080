import { lclDefinition } from '../lclDefinition'
import { fineMoistSlip } from '../moistQuantity'
import { kelvinAsCelsiusSlip } from '../moistSlips'

/** Temperature at the lifting condensation level. Formulae and sources: `liftingCondensation.ts`. */
export const liftingCondensationLevelTemperatureDefinition = lclDefinition({
  key: 'lifting-condensation-level-temperature',
  name: 'temperature at the lifting condensation level',
  symbol: 'T_L',
  unit: 'K', shownUnit: 'Cel', kind: 'temperature',
  part: 'temperature',
  ask: 'The temperature of the parcel at its lifting condensation level, lifted dry-adiabatically from the start.',
  slips: [
    fineMoistSlip('dewpoint', 'dewpoint at the start', 'This is the dewpoint at the start: it falls as the parcel rises, by about 2 K per km.', ({ given }) => given('dewpoint') >= given('temperature') ? null : given('dewpoint')),
    fineMoistSlip('mean', 'mean of temperature and dewpoint', 'This is the mean of temperature and dewpoint.', ({ given }) => given('dewpoint') >= given('temperature') ? null : (given('temperature') + given('dewpoint')) / 2),
    kelvinAsCelsiusSlip,
  ],
  example: { inputs: { pressure: 94_300, temperature: 306.15, dewpoint: 301.15 }, gives: 299.919, within: 0.001 },
})
