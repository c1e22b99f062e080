import { relativeHumidityInput, temperatureInput } from '../moistInputs'
import { fineMoistSlip, moistQuantity, moistSlip, supersaturated } from '../moistQuantity'
import { kilopascalSlip, overIce } from '../moistSlips'
import { inHectopascal, saturationStep } from '../moistTex'
import { glossary } from '../sources'
import { texNumber } from '../tex'

/** Vapor pressure of air with a relative humidity over liquid water: e = RH eₛ(T), with RH = e/eₛ (WMO-No. 8). Formulae of eₛ: `saturation.ts`. */
export const vaporPressureFromRelativeHumidityDefinition = moistQuantity({
  key: 'vapor-pressure-from-relative-humidity',
  name: 'vapor pressure from the relative humidity',
  symbol: 'e',
  unit: 'Pa', shownUnit: 'hPa', kind: 'ratio',
  inputs: [temperatureInput, relativeHumidityInput],
  variants: [{ key: 'share-of-saturation', label: 'RH eₛ(T)', source: glossary('relative humidity'), validity: 'RH over liquid water, also below 0 °C', knownError: '0.1 to 0.3 % by the formula of eₛ', value: ({ given, air }) => given('relativeHumidity') * air.es(given('temperature')) }],
  constants: ['enhancementFactor'],
  inside: ['es'],
  notedAt: { es: given => [given('temperature')] },
  remarks: ({ given }) => [supersaturated(given('relativeHumidity'))],
  ask: 'The vapor pressure e of the air from its relative humidity over liquid water, RH = e/es.',
  working: ({ given, air }, value) => [
    saturationStep('e_s', 'T', given('temperature'), air.es(given('temperature'))),
    { text: 'Of which the air holds its share', formula: 'e = \\mathit{RH}\\,e_s', filled: `e = ${texNumber(given('relativeHumidity'))} \\cdot ${texNumber(air.es(given('temperature')) / 100)} = ${inHectopascal(value)}` },
  ],
  slips: [
    moistSlip('factor-100', 'a factor of 100: percent not divided, or Pa given as hPa', 'Your value is a hundred times too large: a percentage was not divided by 100, or pascal was given as hectopascal.', ({ right }) => right * 100),
    moistSlip('divided', 'divided by RH', 'This is es divided by the relative humidity: the air holds a share of it, es times RH.', ({ given, air }) => given('relativeHumidity') === 1 ? null : air.es(given('temperature')) / given('relativeHumidity')),
    fineMoistSlip('saturation', 'saturation vapor pressure', 'This is the vapor pressure of saturation: the relative humidity is not in it.', ({ given, air }) => given('relativeHumidity') === 1 ? null : air.es(given('temperature'))),
    fineMoistSlip('ice-for-water', 'over ice for over water', 'This comes from the saturation vapor pressure over ice; relative humidity refers to liquid water, also below 0 °C.', (hand) => {
      const e = overIce(hand, hand.given('temperature'))
      return e === null ? null : hand.given('relativeHumidity') * e
    }),
    kilopascalSlip,
  ],
  example: { inputs: { temperature: 298.15, relativeHumidity: 0.5 }, gives: 1583.715, within: 0.001 },
})
