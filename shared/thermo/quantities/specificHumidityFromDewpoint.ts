import { mixingRatioFrom, specificHumidityFrom } from '../humidity'
import { dewpointInput, pressureInput, temperatureForSlips } from '../moistInputs'
import { fineMoistSlip, moistQuantity, moistSlip, smallMoistSlip } from '../moistQuantity'
import { atTemperatureSlip, kilogramSlip, overIce } from '../moistSlips'
import { inGrams, saturationStep } from '../moistTex'
import { glossary } from '../sources'
import { texNumber } from '../tex'

/** Specific humidity of air with a dewpoint: q = ε e/[p − (1 − ε) e] with e = eₛ(T_d). Source: AMS Glossary, "specific humidity". */
export const specificHumidityFromDewpointDefinition = moistQuantity({
  key: 'specific-humidity-from-dewpoint',
  name: 'specific humidity from the dewpoint',
  symbol: 'q',
  unit: '1', shownUnit: 'g/kg', kind: 'ratio',
  inputs: [pressureInput, dewpointInput, temperatureForSlips],
  variants: [{
    key: 'exact', label: 'ε e/[p − (1 − ε) e]', source: glossary('specific humidity'), validity: 'e < p', knownError: 'below 0.5 %: the enhancement factor of moist air',
    value: ({ given, air }) => specificHumidityFrom(mixingRatioFrom(air.es(given('dewpoint')), given('pressure'), air.epsilon)),
  }],
  constants: ['R', 'Rv', 'enhancementFactor'],
  inside: ['es'],
  notedAt: { es: given => [given('dewpoint')] },
  ask: 'The specific humidity q of the air, mass of vapor per mass of moist air, from its dewpoint over liquid water.',
  working: ({ given, air }, value) => {
    const e = air.es(given('dewpoint'))
    return [
      saturationStep('e', 'T_d', given('dewpoint'), e, 'Vapor pressure: that of saturation at the dewpoint'),
      { text: 'Per kilogram of moist air', formula: 'q = \\frac{\\varepsilon\\,e}{p - (1 - \\varepsilon)\\,e}', filled: `q = \\frac{${texNumber(air.epsilon)} \\cdot ${texNumber(e / 100)}}{${texNumber(given('pressure') / 100, 6)} - ${texNumber(1 - air.epsilon)} \\cdot ${texNumber(e / 100)}} = ${inGrams(value)}` },
    ]
  },
  slips: [
    atTemperatureSlip('the specific humidity'),
    smallMoistSlip('mixing-ratio', 'the mixing ratio', 'This is the mixing ratio, per kilogram of dry air: the specific humidity is per kilogram of moist air.', ({ right }) => right / (1 - right)),
    fineMoistSlip('ice-for-water', 'over ice for over water', 'This comes from the vapor pressure over ice; a dewpoint refers to liquid water, also below 0 °C.', (hand) => {
      const e = overIce(hand, hand.given('dewpoint'))
      return e === null ? null : specificHumidityFrom(mixingRatioFrom(e, hand.given('pressure'), hand.air.epsilon))
    }),
    moistSlip('epsilon-left-out', 'ε left out', 'This is e/p: the ratio of the molar masses, ε = 0.622, is missing.', ({ given, air }) => air.es(given('dewpoint')) / given('pressure')),
    kilogramSlip,
  ],
  example: { inputs: { pressure: 85_000, dewpoint: 285.65 }, gives: 0.01066567, within: 1e-8 },
})
