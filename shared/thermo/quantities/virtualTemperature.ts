import { virtualTemperatureFrom } from '../humidity'
import { mixingRatioInput, temperatureInput } from '../moistInputs'
import { moistQuantity, moistSlip } from '../moistQuantity'
import { kelvinAsCelsiusSlip } from '../moistSlips'
import { inCelsius, inKelvin } from '../moistTex'
import { zeroCelsius } from '../slips'
import { glossary } from '../sources'
import { texNumber } from '../tex'

/** Virtual temperature: Tv = T (1 + w/ε)/(1 + w). Source: AMS Glossary, "virtual temperature". The linear form is an approximation, 0.13 K off at 28 g/kg. */
export const virtualTemperatureDefinition = moistQuantity({
  key: 'virtual-temperature',
  name: 'virtual temperature',
  symbol: 'T_v',
  unit: 'K', shownUnit: 'Cel', kind: 'temperature',
  inputs: [temperatureInput, mixingRatioInput],
  variants: [
    { key: 'exact', label: 'T (1 + w/ε)/(1 + w)', source: glossary('virtual temperature'), validity: 'any', knownError: 'none beyond the gas constants', value: ({ given, air }) => virtualTemperatureFrom(given('temperature'), given('mixingRatio'), air.epsilon) },
    { key: 'linear', label: 'T (1 + 0.61 w), as an approximation', source: glossary('virtual temperature', 'common practice'), validity: 'w below 20 g/kg', knownError: '0.13 K at 28 g/kg', value: ({ given }) => given('temperature') * (1 + 0.61 * given('mixingRatio')) },
  ],
  constants: ['R', 'Rv'],
  ask: 'The virtual temperature of the air, exactly: T (1 + w/ε)/(1 + w).',
  working: ({ given, variant, air }, value) => [variant === 'linear'
    ? { text: 'With T in kelvin and w in kg per kg', formula: 'T_v = T\\,(1 + 0.61\\,w)', filled: `T_v = ${texNumber(given('temperature'), 6)}\\,(1 + 0.61 \\cdot ${texNumber(given('mixingRatio'))}) = ${inKelvin(value)} = ${inCelsius(value)}` }
    : { text: 'With T in kelvin and w in kg per kg', formula: 'T_v = T\\,\\frac{1 + w/\\varepsilon}{1 + w}', filled: `T_v = ${texNumber(given('temperature'), 6)} \\cdot \\frac{1 + ${texNumber(given('mixingRatio'))}/${texNumber(air.epsilon)}}{1 + ${texNumber(given('mixingRatio'))}} = ${inKelvin(value)} = ${inCelsius(value)}` }],
  slips: [
    moistSlip('celsius-for-kelvin', 'Celsius put in for kelvin', 'This is what comes out with the temperature in °C: the factor belongs to kelvin.', ({ given, again }) => given('temperature') === zeroCelsius ? null : zeroCelsius + again({ temperature: given('temperature') - zeroCelsius })),
    moistSlip('grams', 'g kg⁻¹ put in for kg kg⁻¹', 'This is what comes out with w in g per kg: the formula takes kg per kg.', ({ given }) => given('temperature') * (1 + 0.61 * 1000 * given('mixingRatio'))),
    moistSlip('cooler', 'cooler where it is warmer', 'Moist air is lighter than dry air, so its virtual temperature is above its temperature: yours is below.', ({ given, right }) => 2 * given('temperature') - right),
    moistSlip('epsilon-left-out', 'ε for 0.61', 'This comes from 1 + 0.622 w: the factor is 1 + 0.61 w, with 0.61 = 1/ε − 1.', ({ given }) => given('mixingRatio') < 0.03 ? null : given('temperature') * (1 + 0.622 * given('mixingRatio'))),
    moistSlip('dry', 'w/ε without 1 + w', 'This is T (1 + w/ε): the denominator 1 + w is missing.', ({ given, air }) => given('temperature') * (1 + given('mixingRatio') / air.epsilon)),
    kelvinAsCelsiusSlip,
  ],
  example: { inputs: { temperature: 303.15, mixingRatio: 0.02 }, gives: 306.764, within: 0.001 },
})
