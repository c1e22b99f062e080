import { mixingRatioFrom } from '../humidity'
import { dewpointInput, pressureInput, temperatureInput } from '../moistInputs'
import { fineMoistSlip, moistQuantity, moistSlip } from '../moistQuantity'
import { fractionAsPercentSlip, swappedSlip } from '../moistSlips'
import { mixingRatioStep } from '../moistTex'
import { glossary } from '../sources'
import { texNumber, texQuantity } from '../tex'

/** Relative humidity as the ratio of mixing ratios w/wₛ, up to 3 % of it from e/eₛ: another quantity. Source: AMS Glossary, "relative humidity" (second definition). */
export const relativeHumidityByMixingRatioDefinition = moistQuantity({
  key: 'relative-humidity-by-mixing-ratio',
  name: 'relative humidity as the ratio of mixing ratios',
  symbol: 'w/ws',
  unit: '1', shownUnit: '%', kind: 'fraction',
  inputs: [pressureInput, temperatureInput, dewpointInput],
  variants: [{
    key: 'mixing-ratios', label: 'w/wₛ, ratio of mixing ratios', source: glossary('relative humidity', 'common practice'), validity: 'over liquid water, also below 0 °C', knownError: '0.1 of a percent by the formula of eₛ',
    value: ({ given, air }) => mixingRatioFrom(air.es(given('dewpoint')), given('pressure'), air.epsilon) / mixingRatioFrom(air.es(given('temperature')), given('pressure'), air.epsilon),
  }],
  constants: ['R', 'Rv', 'enhancementFactor'],
  inside: ['es'],
  notedAt: { es: given => [given('temperature'), given('dewpoint')] },
  remarks: (_hand, value) => [value > 1 + 1e-12 ? 'Supersaturated: the mixing ratio is above that of saturation over liquid water.' : null],
  ask: 'The relative humidity over liquid water as the ratio of mixing ratios w/ws, not of vapor pressures.',
  working: ({ given, air }, value) => {
    const e = air.es(given('dewpoint')), es = air.es(given('temperature')), p = given('pressure')
    return [
      { ...mixingRatioStep('w', 'e', e, p, air), text: 'Mixing ratio, with e = es(Td)' },
      { ...mixingRatioStep('w_s', 'e_s', es, p, air), text: 'Saturation mixing ratio at the temperature' },
      { text: 'Their ratio', formula: '\\mathit{RH} = \\frac{w}{w_s}', filled: `\\frac{${texNumber(1000 * mixingRatioFrom(e, p, air.epsilon))}}{${texNumber(1000 * mixingRatioFrom(es, p, air.epsilon))}} = ${texQuantity(value * 100, '%')}` },
    ]
  },
  slips: [
    fineMoistSlip('vapor-pressures', 'e/eₛ for w/wₛ', 'This is the ratio of vapor pressures; asked is that of mixing ratios.', ({ given, air }) => air.es(given('dewpoint')) / air.es(given('temperature'))),
    moistSlip('swapped', 'mixing ratios swapped', 'This is ws/w: the air holds w, and at saturation it would hold ws.', hand => swappedSlip.apply(hand)),
    fractionAsPercentSlip,
  ],
  example: { inputs: { pressure: 100_000, temperature: 303.15, dewpoint: 293.15 }, gives: 0.5396857, within: 1e-6 },
})
