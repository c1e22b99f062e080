import { exp, log } from '../../numerics/elementary'
import type { QuantityDefinition } from '../definition'
import { roughnessLength, twoHeightInputs, twoHeightsOf } from '../logProfile'
import { fineSlip, slip } from '../slips'
import { texNumber, texQuantity } from '../tex'

/** Roughness length from the wind at two heights: see `roughnessLength`. "Not defined" where the wind does not grow with height. */
export const roughnessLengthDefinition: QuantityDefinition = {
  key: 'roughness-length',
  name: 'roughness length from the wind at two heights',
  symbol: 'z_0',
  unit: 'm',
  shownUnit: 'm',
  kind: 'ratio',
  nearZero: 0.0001,
  inputs: twoHeightInputs,
  variants: [{
    key: 'neutral', label: 'neutral logarithmic profile',
    source: { text: 'AMS Glossary of Meteorology, "logarithmic velocity profile", at two heights', status: 'verified' },
    validity: 'neutral air over even ground', knownError: 'very sensitive to the two speeds',
    evaluate(inputs) {
      const value = roughnessLength(twoHeightsOf(inputs))
      return value === null ? { is: 'not_defined', why: 'The wind does not grow with height: no roughness length follows.' } : { is: 'value', value }
    },
  }],
  constants: [],
  ask: 'The roughness length z₀ from the wind at two heights by the neutral logarithmic profile; heights above the displacement height, which is 0 where none is given; "not defined" where the wind does not grow with height.',
  trace(inputs) {
    const { low, high, lowSpeed, highSpeed } = twoHeightsOf(inputs), value = roughnessLength(twoHeightsOf(inputs))
    if (value === null) return [{ text: 'The wind does not grow with height', formula: 'u_2 \\le u_1', filled: `${texNumber(highSpeed)} \\le ${texNumber(lowSpeed)}` }]
    const logarithm = (highSpeed * log(low) - lowSpeed * log(high)) / (highSpeed - lowSpeed)
    return [
      { text: 'Height at which the profile comes to 0, as a logarithm', formula: '\\ln z_0 = \\frac{u_2 \\ln z_1 - u_1 \\ln z_2}{u_2 - u_1}', filled: `\\ln z_0 = \\frac{${texNumber(highSpeed)} \\ln ${texNumber(low)} - ${texNumber(lowSpeed)} \\ln ${texNumber(high)}}{${texNumber(highSpeed - lowSpeed)}} = ${texNumber(logarithm)}` },
      { text: 'Roughness length', formula: 'z_0 = e^{\\ln z_0}', filled: `z_0 = ${texQuantity(value, 'm')}`, value, unit: 'm' },
    ]
  },
  slips: [
    slip('speeds-swapped', 'speeds swapped', 'The two speeds are swapped.', (inputs) => {
      const { low, high, lowSpeed, highSpeed } = twoHeightsOf(inputs)
      return exp((highSpeed * log(high) - lowSpeed * log(low)) / (highSpeed - lowSpeed))
    }),
    slip('logarithm', 'ln z₀ for z₀', 'This is ln z₀: take its exponential.', (_i, _c, right) => log(right)),
    slip('powers-of-ten', 'power of 10 of a natural logarithm', 'This mixes natural logarithms and powers of 10.', (_i, _c, right) => exp(2.302585092994046 * log(right))),
    slip('linear', 'straight line in height', 'This lets the wind grow in proportion to height: it grows with its logarithm.', (inputs) => {
      const { low, high, lowSpeed, highSpeed } = twoHeightsOf(inputs)
      return low - lowSpeed * (high - low) / (highSpeed - lowSpeed)
    }),
    fineSlip('in-centimeters', 'cm given as m', 'Your number is in centimeters; the unit beside it says meters.', (_i, _c, right) => right * 100),
  ],
  example: { inputs: { lowHeight: 2, lowSpeed: 3.2, highHeight: 10, highSpeed: 4.6 }, gives: 0.050511, within: 0.00001 },
}
