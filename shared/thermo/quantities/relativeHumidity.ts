import { dewpointInput, temperatureInput } from '../moistInputs'
import { fineMoistSlip, moistQuantity, moistSlip, supersaturated } from '../moistQuantity'
import { fractionAsPercentSlip, overIce, swappedSlip } from '../moistSlips'
import { saturationStep } from '../moistTex'
import { zeroCelsius } from '../slips'
import { wmoHumidity } from '../sources'
import { texNumber, texQuantity } from '../tex'

/** Relative humidity over liquid water: RH = e/eₛ(T) with e = eₛ(T_d). Source: WMO-No. 8, Annex 4.A, which takes the ratio of vapor pressures. */
export const relativeHumidityDefinition = moistQuantity({
  key: 'relative-humidity',
  name: 'relative humidity',
  symbol: 'RH',
  unit: '1', shownUnit: '%', kind: 'fraction',
  inputs: [temperatureInput, dewpointInput],
  variants: [{ key: 'vapor-pressures', label: 'e/eₛ, ratio of vapor pressures', source: wmoHumidity, validity: 'over liquid water, also below 0 °C', knownError: '0.1 of a percent by the formula of eₛ', value: ({ given, air }) => air.es(given('dewpoint')) / air.es(given('temperature')) }],
  constants: [],
  inside: ['es'],
  notedAt: { es: given => [given('temperature'), given('dewpoint')] },
  remarks: (_hand, value) => [supersaturated(value)],
  ask: 'The relative humidity over liquid water, also below 0 °C, as the ratio of vapor pressures e/es.',
  working: ({ given, air }, value) => {
    const e = air.es(given('dewpoint')), es = air.es(given('temperature'))
    return [
      saturationStep('e', 'T_d', given('dewpoint'), e, 'Vapor pressure: that of saturation at the dewpoint'),
      saturationStep('e_s', 'T', given('temperature'), es),
      { text: 'Their ratio', formula: '\\mathit{RH} = \\frac{e}{e_s}', filled: `\\mathit{RH} = \\frac{${texNumber(e / 100)}}{${texNumber(es / 100)}} = ${texQuantity(value * 100, '%')}` },
    ]
  },
  slips: [
    moistSlip('swapped', 'vapor pressures swapped', 'This is es/e: the air holds e, and at saturation it would hold es.', hand => swappedSlip.apply(hand)),
    moistSlip('celsius-ratio', 'ratio of temperatures in °C', 'This is Td/T in °C: the ratio is of vapor pressures.', ({ given }) => given('temperature') > zeroCelsius + 1 && given('dewpoint') !== given('temperature') ? (given('dewpoint') - zeroCelsius) / (given('temperature') - zeroCelsius) : null),
    moistSlip('kelvin-ratio', 'ratio of temperatures in kelvin', 'This is Td/T in kelvin: the ratio is of vapor pressures.', ({ given }) => given('dewpoint') === given('temperature') ? null : given('dewpoint') / given('temperature')),
    fineMoistSlip('five-per-kelvin', '5 % for each kelvin of T − Td', 'This is the rule of thumb of 5 % for each kelvin between temperature and dewpoint.', ({ given }) => given('temperature') - given('dewpoint') < 19 ? 1 - 0.05 * (given('temperature') - given('dewpoint')) : null),
    fineMoistSlip('ice-for-water', 'over ice for over water', 'This is relative to saturation over ice; relative humidity refers to liquid water, also below 0 °C.', (hand) => {
      const es = overIce(hand, hand.given('temperature'))
      return es === null ? null : hand.air.es(hand.given('dewpoint')) / es
    }),
    fractionAsPercentSlip,
  ],
  example: { inputs: { temperature: 303.15, dewpoint: 293.15 }, gives: 0.5504430, within: 1e-6 },
})
