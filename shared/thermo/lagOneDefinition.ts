/** What the lag-1 correlations about lapse rates other than least squares have in common. */
import type { Inputs, QuantityDefinition, Variant } from './definition'
import { heightsOf, layerInputs, lineOf, temperaturesOf } from './layer'
import { lagOneCorrelationAbout } from './residuals'
import { fineSlip, signSlip } from './slips'
import { texNumber, texQuantity } from './tex'

interface LagOne extends Pick<QuantityDefinition, 'key' | 'name' | 'example'> {
  /** "the line between the lowest and the highest row". */
  line: string
  source: Variant['source']
  /** Γ of the line. @throws {SeriesError} */
  rate: (inputs: Inputs) => number
}

export function lagOneDefinition({ line, source, rate, ...named }: LagOne): QuantityDefinition {
  const correlation = (inputs: Inputs): number | null => lagOneCorrelationAbout(inputs, rate(inputs))
  return {
    ...named,
    symbol: 'r₁',
    unit: '1',
    shownUnit: '1',
    kind: 'difference',
    nearZero: 0.1,
    inputs: layerInputs(4),
    variants: [{
      key: 'residuals', label: `residuals about ${line}, less their mean, in the order of the rows`, source,
      validity: 'rows at even steps of time or height', knownError: 'biased low by about 4/n for short series',
      evaluate(inputs) {
        const value = correlation(inputs)
        return value === null ? { is: 'not_defined', why: 'The rows lie on the line: there are no residuals to correlate.' } : { is: 'value', value }
      },
    }],
    constants: [],
    ask: `The lag-1 correlation r₁ = Σ (eᵢ − ē)(eᵢ₊₁ − ē) / Σ (eᵢ − ē)² of the residuals e of temperature about ${line}, less their mean, in the order of your rows. "Not defined" where the rows lie on the line.`,
    trace(inputs) {
      const value = correlation(inputs)
      const residuals = { text: 'Residuals about the line; where the line stands falls out with their mean', formula: 'e_i = T_i + \\Gamma z_i', filled: `\\Gamma = ${texQuantity(rate(inputs) * 1000, 'K/km')},\\quad n = ${heightsOf(inputs).length}` }
      return value === null
        ? [residuals]
        : [residuals, { text: 'Correlation of neighbors', formula: 'r_1 = \\frac{\\sum (e_i - \\bar e)(e_{i+1} - \\bar e)}{\\sum (e_i - \\bar e)^2}', filled: `r_1 = ${texNumber(value)}`, value, unit: '1' }]
    },
    slips: [
      signSlip('The sign is turned round: neighbors that lie on one side of the line correlate positively.'),
      fineSlip('least-squares', 'residuals about the line of least squares', `These are the residuals about the line of least squares: the ask takes ${line}.`, inputs => lagOneCorrelationAbout(inputs, -lineOf(inputs).slope)),
      fineSlip('of-temperature', 'correlation of T in place of the residuals', 'This is the lag-1 correlation of the temperatures: take the line off first.', inputs => lagOneCorrelationAbout({ height: heightsOf(inputs), temperature: temperaturesOf(inputs) }, 0)),
      fineSlip('mean-of-products', 'sums divided by their counts', 'This divides the sum of n − 1 products by n − 1 and the sum of n squares by n: the ask divides the sums.', (inputs, _c, right) => right * heightsOf(inputs).length / (heightsOf(inputs).length - 1)),
    ],
  }
}
