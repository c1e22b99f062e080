import { mean } from '../../numerics/regression'
import type { QuantityDefinition } from '../definition'
import { seriesOf } from '../inputs'
import { fineSlip } from '../slips'
import { texNumber } from '../tex'
import { fullTurn, meanDirection, perDegree, windDirectionSeries, windSpeedSeries } from '../wind'

/** Mean wind direction by unit vectors: see `meanDirection`. Calm rows stay out; "not defined" where the directions cancel. */
export const meanWindDirectionDefinition: QuantityDefinition = {
  key: 'mean-wind-direction',
  name: 'mean wind direction by unit vectors',
  symbol: 'd̄',
  unit: 'rad',
  shownUnit: 'deg',
  kind: 'difference',
  isDirection: true,
  nearZero: 1.75,
  inputs: [windDirectionSeries, { ...windSpeedSeries, label: 'wind speeds, to know the calm rows', isOptional: true }],
  variants: [{
    key: 'unit-vectors', label: 'unit vectors, calm rows left out',
    source: { text: 'Mardia & Jupp (2000), Directional Statistics, section 2.2; WMO-No. 8, vol. I, ch. 5', status: 'from memory' },
    validity: 'directions that do not cancel', knownError: 'none: the rows alone decide',
    evaluate(inputs) {
      const { direction, resultant, count } = meanDirection(inputs)
      if (direction === null) return { is: 'not_defined', why: count === 0 ? 'All rows are calm: calm air has no direction.' : 'The directions cancel: they have no mean.' }
      return { is: 'value', value: direction, more: { resultant, count } }
    },
  }],
  constants: [],
  ask: 'The mean wind direction of your rows by unit vectors, clockwise from north, which is 360°; rows with a speed of 0 stay out; "not defined" where the directions cancel.',
  trace(inputs) {
    const { direction, resultant, count } = meanDirection(inputs)
    const first = { text: `Mean of ${count} unit vectors`, formula: 'R = \\sqrt{\\overline{\\sin d}^2 + \\overline{\\cos d}^2}', filled: `R = ${texNumber(resultant)}` }
    if (direction === null) return [first]
    return [first, { text: 'Its direction', formula: '\\bar d = \\mathrm{atan2}(\\overline{\\sin d}, \\overline{\\cos d})', filled: `\\bar d = ${texNumber(direction / perDegree)}^{\\circ}`, value: direction, unit: 'rad' }]
  },
  slips: [
    fineSlip('plain-mean', 'plain mean of the angles', 'This is the plain mean of the angles: 350° and 10° have a mean of 360°, not 180°.', inputs => mean(seriesOf(inputs, 'windDirection'))),
    fineSlip('opposite', 'direction that it blows to', 'This is half a turn away: where the wind blows to.', (_i, _c, right) => (right > fullTurn / 2 ? right - fullTurn / 2 : right + fullTurn / 2)),
    fineSlip('swapped-arguments', 'arguments of the arctangent swapped', 'The arguments of the arctangent are swapped.', (_i, _c, right) => {
      const turned = fullTurn / 4 - right
      return turned > 0 ? turned : turned + fullTurn
    }),
  ],
  example: { inputs: { windDirection: [6.1086523819801535, 0.17453292519943295, 0.3490658503988659] }, gives: 0.117024, within: 0.000001 },
}
