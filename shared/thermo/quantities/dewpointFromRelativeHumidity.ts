import { log, log10 } from '../../numerics/elementary'
import { dewpointFunction, frostPoint } from '../dewpoints'
import { relativeHumidityInput, temperatureInput } from '../moistInputs'
import { fineMoistSlip, moistQuantity, moistSlip, supersaturated } from '../moistQuantity'
import { kelvinAsCelsiusSlip } from '../moistSlips'
import { inCelsius, inHectopascal, saturationStep } from '../moistTex'
import { zeroCelsius } from '../slips'
import { glossary } from '../sources'
import { texNumber } from '../tex'

/** Dewpoint over liquid water from temperature and relative humidity: eₛ(T_d) = RH eₛ(T). Formula and source: `dewpoints.ts`. */
export const dewpointFromRelativeHumidityDefinition = moistQuantity({
  key: 'dewpoint-from-relative-humidity',
  name: 'dewpoint from the relative humidity',
  symbol: 'T_d',
  unit: 'K', shownUnit: 'Cel', kind: 'temperature',
  inputs: [temperatureInput, relativeHumidityInput],
  variants: [{ key: 'over-water', label: 'eₛ(T_d) = RH eₛ(T)', source: glossary('dewpoint'), validity: 'over liquid water, also below 0 °C', knownError: '0.05 K by the formula of eₛ', value: ({ given, air, constants, formulae }) => dewpointFunction(constants, formulae)(given('relativeHumidity') * air.es(given('temperature'))) }],
  constants: [],
  inside: ['es'],
  notedAt: { es: given => [given('temperature')] },
  remarks: ({ given }) => [supersaturated(given('relativeHumidity'))],
  ask: 'The dewpoint over liquid water, also below 0 °C, from the temperature and the relative humidity e/es.',
  working: ({ given, air }, value) => {
    const es = air.es(given('temperature')), e = given('relativeHumidity') * es
    return [
      saturationStep('e_s', 'T', given('temperature'), es),
      { text: 'Vapor pressure', formula: 'e = \\mathit{RH}\\,e_s', filled: `e = ${texNumber(given('relativeHumidity'))} \\cdot ${texNumber(es / 100)} = ${inHectopascal(e)}`, value: e, unit: 'Pa' },
      { text: 'The temperature at which this is saturation', formula: 'e_s(T_d) = e', filled: `e_s(${inCelsius(value)}) = ${inHectopascal(e)}` },
    ]
  },
  slips: [
    fineMoistSlip('frost-point', 'frost point for dewpoint', 'This is the frost point, over ice; the dewpoint refers to liquid water, also below 0 °C.', ({ given, air, constants, formulae, right }) => {
      if (right > 273.15) return null
      const outcome = frostPoint(given('relativeHumidity') * air.es(given('temperature')), constants, formulae)
      return outcome.is === 'value' ? outcome.value : null
    }),
    moistSlip('share-of-celsius', 'T in °C times RH', 'This is the temperature in °C times the relative humidity: the ratio is of vapor pressures.', ({ given }) => given('relativeHumidity') === 1 || given('temperature') === zeroCelsius ? null : zeroCelsius + given('relativeHumidity') * (given('temperature') - zeroCelsius)),
    fineMoistSlip('five-per-kelvin', 'T − (100 − RH)/5', 'This is the rule of thumb T − (100 − RH)/5: it is within 1 K in damp air only.', ({ given }) => given('relativeHumidity') === 1 ? null : given('temperature') - 20 * (1 - given('relativeHumidity'))),
    moistSlip('base-ten', 'log₁₀ for ln', 'This comes from the logarithm of RH to base 10 in place of the natural one.', ({ given }) => {
      const t = given('temperature') - zeroCelsius, RH = given('relativeHumidity')
      const gamma = log10(RH) + 17.67 * t / (t + 243.5)
      return RH === 1 ? null : zeroCelsius + 243.5 * gamma / (17.67 - gamma)
    }),
    moistSlip('percent', 'percent not divided by 100', 'This comes from the relative humidity in percent where the formula takes a fraction.', ({ given }) => {
      const t = given('temperature') - zeroCelsius
      const gamma = log(100 * given('relativeHumidity')) + 17.67 * t / (t + 243.5)
      return gamma > 14 ? null : zeroCelsius + 243.5 * gamma / (17.67 - gamma)
    }),
    kelvinAsCelsiusSlip,
  ],
  example: { inputs: { temperature: 298.15, relativeHumidity: 0.5 }, gives: 287.0176, within: 0.0001 },
})
