import { mixingRatioOfSpecificHumidity } from '../humidity'
import { mixingRatioInput } from '../moistInputs'
import { fineMoistSlip, moistQuantity, moistSlip } from '../moistQuantity'
import { kilogramSlip } from '../moistSlips'
import { inGrams } from '../moistTex'
import { glossary } from '../sources'
import { texNumber } from '../tex'

/** Mixing ratio, mass of vapor per mass of dry air, from the specific humidity: w = q/(1 − q). Source: AMS Glossary, "specific humidity", solved for w. */
export const mixingRatioFromSpecificHumidityDefinition = moistQuantity({
  key: 'mixing-ratio-from-specific-humidity',
  name: 'mixing ratio from the specific humidity',
  symbol: 'w',
  unit: '1', shownUnit: 'g/kg', kind: 'ratio',
  inputs: [{ ...mixingRatioInput, name: 'specificHumidity', label: 'specific humidity', symbol: 'q' }],
  variants: [{ key: 'exact', label: 'q/(1 − q)', source: glossary('specific humidity'), validity: 'any', knownError: 'none: by definition', value: ({ given }) => mixingRatioOfSpecificHumidity(given('specificHumidity')) }],
  constants: [],
  ask: 'The mixing ratio w of the air, mass of vapor per mass of dry air, from its specific humidity.',
  working: ({ given }, value) => [{ text: 'Per kilogram of dry air, with q in kg per kg', formula: 'w = \\frac{q}{1 - q}', filled: `w = \\frac{${texNumber(given('specificHumidity'))}}{1 - ${texNumber(given('specificHumidity'))}} = ${inGrams(value)}` }],
  slips: [
    fineMoistSlip('specific-humidity', 'the specific humidity itself', 'This is the specific humidity, per kilogram of moist air: the mixing ratio is per kilogram of dry air.', ({ given }) => given('specificHumidity')),
    fineMoistSlip('turned-round', 'conversion turned round', 'This is q/(1 + q), the conversion the other way round.', ({ given }) => given('specificHumidity') / (1 + given('specificHumidity'))),
    moistSlip('grams', 'g kg⁻¹ put in for kg kg⁻¹', 'This is what comes out with q in g per kg: the formula takes kg per kg.', ({ given, again }) => again({ specificHumidity: 1000 * given('specificHumidity') })),
    kilogramSlip,
  ],
  example: { inputs: { specificHumidity: 0.0147783 }, gives: 0.015, within: 0.0000001 },
})
