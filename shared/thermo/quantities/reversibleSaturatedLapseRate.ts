import { mixingRatioFrom } from '../humidity'
import { mixingRatioInput, pressureInput, temperatureInput } from '../moistInputs'
import { moistQuantity, moistSlip, smallMoistSlip } from '../moistQuantity'
import { mixingRatioStep, inGrams } from '../moistTex'
import { fullSaturatedRate, saturatedRate } from '../saturatedRate'
import { glossary } from '../sources'
import { texQuantity } from '../tex'

/** Saturated lapse rate where the condensed water stays in the parcel: reversible. Formula and source: `saturatedRate.ts`. */
export const reversibleSaturatedLapseRateDefinition = moistQuantity({
  key: 'reversible-saturated-lapse-rate',
  name: 'reversible saturated adiabatic lapse rate',
  symbol: 'Γrm',
  unit: 'K/m', shownUnit: 'K/km', kind: 'difference',
  nearZero: 0.001,
  inputs: [pressureInput, temperatureInput, { ...mixingRatioInput, name: 'liquidWater', label: 'liquid water mixing ratio of the parcel', symbol: 'w_l', range: [0, 0.05] }],
  variants: [{ key: 'full', label: 'with the heat capacities of vapor and liquid', source: glossary('moist-adiabatic lapse rate'), validity: 'saturated air over liquid water', knownError: '0.2 %', value: ({ given, air }) => fullSaturatedRate(given('temperature'), given('pressure'), given('liquidWater'), air) }],
  constants: ['R', 'Rv', 'cp', 'g', 'cpv', 'latentHeat', 'cw', 'enhancementFactor'],
  inside: ['es', 'L'],
  notedAt: { es: given => [given('temperature')], L: given => [given('temperature')] },
  ask: 'The reversible saturated adiabatic lapse rate −dT/dz at the temperature and the pressure, over liquid water; condensed water stays in the parcel.',
  working: ({ given, air }, value) => {
    const e = air.es(given('temperature'))
    return [
      { ...mixingRatioStep('w_s', 'e_s', e, given('pressure'), air), text: 'Saturation mixing ratio' },
      { text: 'All the water of the parcel', formula: 'w_t = w_s + w_l', filled: `w_t = ${inGrams(mixingRatioFrom(e, given('pressure'), air.epsilon) + given('liquidWater'))}`, value: mixingRatioFrom(e, given('pressure'), air.epsilon) + given('liquidWater'), unit: '1' },
      { text: 'The water that stays is cooled too', formula: '\\Gamma_{rm} = g\\,\\frac{(1 + w_t)\\left(1 + \\frac{L w_s}{R T}\\right)}{c_p + w_s c_{pv} + w_l c_w + \\frac{L^2 w_s (\\varepsilon + w_s)}{R T^2}}', filled: `\\Gamma_{rm} = ${texQuantity(value * 1000, 'K/km')}` },
    ]
  },
  slips: [
    moistSlip('sign', 'sign turned round', 'A lapse rate is positive where temperature falls with height.', ({ right }) => -right),
    moistSlip('per-meter', 'K m⁻¹ given as K km⁻¹', 'Your value is the rate per meter: multiply it by 1000 for the rate per kilometer.', ({ right }) => right / 1000),
    // with little liquid as small as the spread of accepted formulae
    smallMoistSlip('pseudoadiabatic', 'condensed water left out', 'This is the pseudoadiabatic rate, of which the condensed water is no part: asked is the reversible one.', ({ given, air }) => saturatedRate(given('temperature'), given('pressure'), air)),
    moistSlip('dry-rate', 'Γd for Γm', 'This is the dry adiabatic lapse rate g/cp: saturated air cools less as it rises.', ({ air }) => air.g / air.cp),
  ],
  example: { inputs: { pressure: 70_000, temperature: 273.15, liquidWater: 0.006 }, gives: 0.005705015, within: 1e-8 },
})
