import { convectiveDefinition, convectiveTemperatureOf, downStep } from '../convectiveCondensation'
import { seriesOf } from '../inputs'
import { fineSlip, slip, zeroCelsius } from '../slips'
import { pow } from '../../numerics/elementary'

/** Convective temperature of a sounding: that of the ground air when convection reaches the condensation level. Formula and source: `convectiveCondensation.ts`. */
export const convectiveTemperatureDefinition = convectiveDefinition({
  key: 'convective-temperature',
  name: 'convective temperature',
  symbol: 'T_c',
  unit: 'K', shownUnit: 'Cel', kind: 'temperature',
  ask: 'The convective temperature: from the convective condensation level of the lowest row’s mixing ratio down the dry adiabat to the pressure of the lowest row; "not reached" where the data end before the level.',
  value: (level, air) => convectiveTemperatureOf(level, air.kappa),
  last: downStep,
  slips: find => [
    fineSlip('at-level', 'temperature at the level', 'This is the temperature at the convective condensation level: it is still to be taken down the dry adiabat to the ground.', (inputs, constants, _right, formulae) => find(inputs, constants, formulae).level?.temperature ?? null),
    fineSlip('to-1000', 'down to 1000 hPa', 'This goes down to 1000 hPa: the ground is at the pressure of the lowest row.', (inputs, constants, right, formulae) => {
      const { level, air } = find(inputs, constants, formulae)
      return level && level.surfacePressure !== 100_000 ? right * pow(100_000 / level.surfacePressure, air.kappa) : null
    }),
    fineSlip('surface', 'temperature of the lowest row', 'This is the temperature of the lowest row as it is: asked is what it has to become.', inputs => seriesOf(inputs, 'temperature')[0] ?? null),
    slip('end-unit', 'kelvin and °C mixed up', 'Your number is in kelvin; the unit beside it says °C.', (_i, _c, right) => right + zeroCelsius),
  ],
  example: { inputs: { pressure: [99_300, 95_700, 92_500, 88_600, 85_000, 81_300, 79_800, 73_200, 71_600, 70_000], temperature: [307.75, 304.25, 300.95, 297.45, 294.55, 292.75, 291.85, 286.15, 286.65, 286.15], dewpoint: [292.75, 291.85, 290.95, 289.45, 285.55, 272.75, 269.35, 267.15, 259.95, 262.15] }, gives: 311.58, within: 0.1 },
})
