import { specificHumidityFrom } from '../humidity'
import { mixingRatioInput } from '../moistInputs'
import { fineMoistSlip, moistQuantity, moistSlip } from '../moistQuantity'
import { kilogramSlip } from '../moistSlips'
import { inGrams } from '../moistTex'
import { glossary } from '../sources'
import { texNumber } from '../tex'

/** Specific humidity, mass of vapor per mass of moist air: q = w/(1 + w). Source: AMS Glossary, "specific humidity". */
export const specificHumidityDefinition = moistQuantity({
  key: 'specific-humidity',
  name: 'specific humidity from the mixing ratio',
  symbol: 'q',
  unit: '1', shownUnit: 'g/kg', kind: 'ratio',
  inputs: [mixingRatioInput],
  variants: [{ key: 'exact', label: 'w/(1 + w)', source: glossary('specific humidity'), validity: 'any', knownError: 'none: by definition', value: ({ given }) => specificHumidityFrom(given('mixingRatio')) }],
  constants: [],
  ask: 'The specific humidity q of the air, mass of vapor per mass of moist air.',
  working: ({ given }, value) => [{ text: 'Per kilogram of moist air, with w in kg per kg', formula: 'q = \\frac{w}{1 + w}', filled: `q = \\frac{${texNumber(given('mixingRatio'))}}{1 + ${texNumber(given('mixingRatio'))}} = ${inGrams(value)}` }],
  slips: [
    fineMoistSlip('mixing-ratio', 'the mixing ratio itself', 'This is the mixing ratio, per kilogram of dry air: the specific humidity is per kilogram of moist air.', ({ given }) => given('mixingRatio')),
    fineMoistSlip('turned-round', 'conversion turned round', 'This is w/(1 − w), the conversion the other way round.', ({ given }) => given('mixingRatio') / (1 - given('mixingRatio'))),
    moistSlip('grams', 'g kg⁻¹ put in for kg kg⁻¹', 'This is what comes out with w in g per kg: the formula takes kg per kg.', ({ given, again }) => again({ mixingRatio: 1000 * given('mixingRatio') })),
    kilogramSlip,
  ],
  example: { inputs: { mixingRatio: 0.015 }, gives: 0.014778, within: 0.000001 },
})
