import { log10 } from '../../numerics/elementary'
import { dewpointFunction, frostPoint } from '../dewpoints'
import { vaporPressureInput } from '../moistInputs'
import { fineMoistSlip, moistQuantity, moistSlip } from '../moistQuantity'
import { kelvinAsCelsiusSlip } from '../moistSlips'
import { inCelsius, inHectopascal } from '../moistTex'
import { glossary } from '../sources'

/** Dewpoint over liquid water from a vapor pressure. Formula and source: `dewpoints.ts`. */
export const dewpointDefinition = moistQuantity({
  key: 'dewpoint',
  name: 'dewpoint from the vapor pressure',
  symbol: 'T_d',
  unit: 'K', shownUnit: 'Cel', kind: 'temperature',
  inputs: [{ ...vaporPressureInput, range: [0.1, 30_000] }],
  variants: [{ key: 'over-water', label: 'eₛ(T_d) = e', source: glossary('dewpoint'), validity: 'over liquid water, also below 0 °C', knownError: '0.05 K by the formula of eₛ', value: ({ given, constants, formulae }) => dewpointFunction(constants, formulae)(given('vaporPressure')) }],
  constants: ['enhancementFactor'],
  inside: ['es'],
  ask: 'The dewpoint over liquid water, also below 0 °C: the temperature at which the air’s vapor pressure is that of saturation.',
  working: ({ given }, value) => [{ text: 'The temperature at which the vapor pressure is that of saturation', formula: 'e_s(T_d) = e', filled: `e_s(${inCelsius(value)}) = ${inHectopascal(given('vaporPressure'))}` }],
  slips: [
    fineMoistSlip('frost-point', 'frost point for dewpoint', 'This is the frost point, over ice; the dewpoint refers to liquid water, also below 0 °C.', ({ given, constants, formulae, right }) => {
      if (right > 273.15) return null
      const outcome = frostPoint(given('vaporPressure'), constants, formulae)
      return outcome.is === 'value' ? outcome.value : null
    }),
    moistSlip('base-ten', 'log₁₀ for ln', 'This comes from the logarithm to base 10 in place of the natural one.', ({ given }) => {
      const logarithm = log10(given('vaporPressure') / 611.2)
      return logarithm === 0 ? null : 273.15 + 243.5 * logarithm / (17.67 - logarithm)
    }),
    moistSlip('pascal-for-hectopascal', 'Pa put in for hPa', 'This is what comes out with the vapor pressure in pascal where the formula takes hectopascal.', ({ given, again }) => given('vaporPressure') < 30_000 ? again({ vaporPressure: 100 * given('vaporPressure') }) : null),
    kelvinAsCelsiusSlip,
  ],
  example: { inputs: { vaporPressure: 1401.539 }, gives: 285.15, within: 0.0002 },
})
