import { convectiveDefinition, downStep } from '../convectiveCondensation'
import { seriesOf } from '../inputs'
import { lclFunction } from '../liftingCondensation'
import { fineSlip, slip } from '../slips'

/** Pressure at the convective condensation level of a sounding. Formula and source: `convectiveCondensation.ts`. */
export const convectiveCondensationLevelPressureDefinition = convectiveDefinition({
  key: 'convective-condensation-level-pressure',
  name: 'pressure at the convective condensation level',
  symbol: 'p_ccl',
  unit: 'Pa', shownUnit: 'hPa', kind: 'ratio',
  ask: 'The pressure at the convective condensation level: the lowest level at which the sounding is as cold as saturation with the mixing ratio of its lowest row; temperature linear in ln p between rows; "not reached" where the data end before it.',
  value: level => level.pressure,
  last: downStep,
  slips: find => [
    fineSlip('lifted', 'lifting condensation level', 'This is the lifting condensation level of the lowest row: it is lifted there without being heated first.', (inputs, constants, _right, formulae) => lclFunction(constants, formulae)(seriesOf(inputs, 'temperature')[0] ?? 0, seriesOf(inputs, 'dewpoint')[0] ?? 0, seriesOf(inputs, 'pressure')[0] ?? 0).pressure),
    fineSlip('row-below', 'row below in place of interpolation', 'This is the last row below the level: the ask interpolates between rows.', (inputs, constants, _right, formulae) => {
      const { level } = find(inputs, constants, formulae)
      const rows = seriesOf(inputs, 'pressure').filter(p => level && p > level.pressure)
      return rows[rows.length - 1] ?? null
    }),
    fineSlip('row-above', 'row above in place of interpolation', 'This is the first row above the level: the ask interpolates between rows.', (inputs, constants, _right, formulae) => {
      const { level } = find(inputs, constants, formulae)
      return seriesOf(inputs, 'pressure').find(p => level && p < level.pressure) ?? null
    }),
    slip('pascal-for-hectopascal', 'Pa given as hPa', 'Your number is in pascal; the unit beside it says hectopascal.', (_i, _c, right) => right * 100),
  ],
  example: { inputs: { pressure: [99_300, 95_700, 92_500, 88_600, 85_000, 81_300, 79_800, 73_200, 71_600, 70_000], temperature: [307.75, 304.25, 300.95, 297.45, 294.55, 292.75, 291.85, 286.15, 286.65, 286.15], dewpoint: [292.75, 291.85, 290.95, 289.45, 285.55, 272.75, 269.35, 267.15, 259.95, 262.15] }, gives: 75_834.8, within: 60 },
})
