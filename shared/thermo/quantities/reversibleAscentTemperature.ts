import { mixingRatioFrom } from '../humidity'
import { pressureInput, temperatureInput } from '../moistInputs'
import { fineMoistSlip, moistQuantity, moistSlip } from '../moistQuantity'
import { kelvinAsCelsiusSlip } from '../moistSlips'
import { inCelsius, inGrams } from '../moistTex'
import { pseudoadiabaticTemperature } from '../pseudoadiabat'
import { pow } from '../../numerics/elementary'
import { reversibleTemperature } from '../reversiblePath'

/** Temperature after a reversible saturated change of pressure: the condensed water stays. Formula and source: `reversiblePath.ts`. */
export const reversibleAscentTemperatureDefinition = moistQuantity({
  key: 'reversible-ascent-temperature',
  name: 'temperature after reversible ascent of saturated air',
  symbol: 'T',
  unit: 'K', shownUnit: 'Cel', kind: 'temperature',
  inputs: [
    { ...pressureInput, name: 'pressureStart', label: 'pressure at the start', symbol: 'p₁' },
    { ...temperatureInput, label: 'temperature at the start, saturated and without liquid water', range: [200, 320] },
    { ...pressureInput, name: 'pressureEnd', label: 'pressure at the end', symbol: 'p₂' },
  ],
  variants: [{
    key: 'moist-entropy', label: 'moist entropy kept', source: { text: 'Emanuel (1994), Atmospheric Convection, Eq. 4.5.9', status: 'from memory' }, validity: 'saturated air over liquid water', knownError: '0.1 K',
    value: ({ given, air }) => reversibleTemperature(given('temperature'), given('pressureStart'), given('pressureEnd'), mixingRatioFrom(air.es(given('temperature')), given('pressureStart'), air.epsilon), air),
  }],
  constants: ['R', 'Rv', 'cp', 'cw', 'cpv', 'latentHeat', 'enhancementFactor'],
  inside: ['es', 'L'],
  notedAt: { es: given => [given('temperature')], L: given => [given('temperature')] },
  remarks: ({ given }) => [given('pressureEnd') > given('pressureStart') ? 'The end lies below the start, where the air has no liquid water to evaporate: it would warm dry-adiabatically.' : null],
  ask: 'The temperature of saturated air after it is lifted reversibly, over liquid water; condensed water stays in the parcel and is cooled with it.',
  working: ({ given, air }, value) => {
    const water = mixingRatioFrom(air.es(given('temperature')), given('pressureStart'), air.epsilon)
    return [
      { text: 'All the water of the parcel: saturation at the start', formula: 'w_t = w_s(T_1, p_1)', filled: `w_t = ${inGrams(water)}`, value: water, unit: '1' },
      { text: 'The temperature at the end that keeps the moist entropy, found by a bracket', formula: '(c_p + w_t c_w) \\ln T - R \\ln(p - e_s) + \\frac{L w_s}{T} = \\text{const.}', filled: `T_2 = ${inCelsius(value)}` },
    ]
  },
  slips: [
    fineMoistSlip('pseudoadiabatic', 'along the pseudoadiabat', 'This leaves the condensed water behind: asked is the reversible ascent.', ({ given, air }) => pseudoadiabaticTemperature(given('temperature'), given('pressureStart'), given('pressureEnd'), air)),
    moistSlip('dry', 'dry adiabat', 'This goes along the dry adiabat: saturated air cools less as it rises.', ({ given, air }) => given('temperature') * pow(given('pressureEnd') / given('pressureStart'), air.kappa)),
    kelvinAsCelsiusSlip,
  ],
  example: { inputs: { pressureStart: 92_500, temperature: 278.15, pressureEnd: 70_000 }, gives: 264.3384, within: 0.0001 },
})
