import { mixingRatioFrom } from '../humidity'
import { pressureInput, temperatureInput } from '../moistInputs'
import { fineMoistSlip, moistQuantity, moistSlip } from '../moistQuantity'
import { mixingRatioStep } from '../moistTex'
import { fullSaturatedRate, saturatedRate } from '../saturatedRate'
import { zeroCelsius } from '../slips'
import { glossary } from '../sources'
import { texNumber, texQuantity } from '../tex'

/** Saturated (pseudo)adiabatic lapse rate at a temperature and a pressure. Formulae and source: `saturatedRate.ts`. */
export const saturatedAdiabaticLapseRateDefinition = moistQuantity({
  key: 'saturated-adiabatic-lapse-rate',
  name: 'saturated adiabatic lapse rate',
  symbol: 'Γm',
  unit: 'K/m', shownUnit: 'K/km', kind: 'difference',
  nearZero: 0.001,
  inputs: [pressureInput, temperatureInput],
  variants: [
    { key: 'approximate', label: 'without the heat capacity of the vapor', source: glossary('adiabatic lapse rate'), validity: 'saturated air over liquid water', knownError: '1 %', value: ({ given, air }) => saturatedRate(given('temperature'), given('pressure'), air) },
    { key: 'full', label: 'with the heat capacity of the vapor', source: glossary('moist-adiabatic lapse rate'), validity: 'saturated air over liquid water', knownError: '0.2 %', value: ({ given, air }) => fullSaturatedRate(given('temperature'), given('pressure'), 0, air) },
  ],
  constants: ['R', 'Rv', 'cp', 'g', 'cpv', 'latentHeat', 'cw', 'enhancementFactor'],
  inside: ['es', 'L'],
  notedAt: { es: given => [given('temperature')], L: given => [given('temperature')] },
  ask: 'The saturated (pseudo)adiabatic lapse rate Γm = −dT/dz at the temperature and the pressure, over liquid water; condensed water leaves at once.',
  working: ({ given, air, variant }, value) => {
    const T = given('temperature'), e = air.es(T), w = mixingRatioFrom(e, given('pressure'), air.epsilon), L = air.L(T)
    const a = L * w / (air.R * T), b = L * L * w * air.epsilon / (air.R * T * T)
    return [
      { ...mixingRatioStep('w_s', 'e_s', e, given('pressure'), air), text: 'Saturation mixing ratio' },
      { text: 'Latent heat', formula: 'L', filled: `L = ${texQuantity(L / 1000, 'kJ/kg', 6)}`, value: L, unit: 'J/kg' },
      variant === 'full'
        ? { text: 'With the heat capacity of the vapor', formula: '\\Gamma_m = g\\,\\frac{(1 + w_s)\\left(1 + \\frac{L w_s}{R T}\\right)}{c_p + w_s c_{pv} + \\frac{L^2 w_s (\\varepsilon + w_s)}{R T^2}}', filled: `\\Gamma_m = ${texQuantity(value * 1000, 'K/km')}` }
        : { text: 'The latent heat pays for part of the cooling', formula: '\\Gamma_m = g\\,\\frac{1 + \\frac{L w_s}{R T}}{c_p + \\frac{L^2 w_s \\varepsilon}{R T^2}}', filled: `\\Gamma_m = ${texNumber(air.g)} \\cdot \\frac{1 + ${texNumber(a)}}{${texNumber(air.cp, 6)} + ${texNumber(b)}} = ${texQuantity(value * 1000, 'K/km')}` },
    ]
  },
  slips: [
    moistSlip('sign', 'sign turned round', 'A lapse rate is positive where temperature falls with height.', ({ right }) => -right),
    moistSlip('per-meter', 'K m⁻¹ given as K km⁻¹', 'Your value is the rate per meter: multiply it by 1000 for the rate per kilometer.', ({ right }) => right / 1000),
    moistSlip('per-100-m', 'K per 100 m given as K km⁻¹', 'Your value is the rate per 100 m: multiply it by 10 for the rate per kilometer.', ({ right }) => right / 10),
    fineMoistSlip('dry-rate', 'Γd for Γm', 'This is the dry adiabatic lapse rate g/cp: saturated air cools less as it rises.', ({ air }) => air.g / air.cp),
    fineMoistSlip('six', '6 K km⁻¹ as a constant', 'This is a round number for the middle latitudes: Γm depends on temperature and pressure.', () => 0.006),
    fineMoistSlip('six-and-a-half', '6.5 K km⁻¹', 'This is the mean lapse rate of the standard atmosphere, which is no saturated rate.', () => 0.0065),
    moistSlip('celsius-for-kelvin', 'Celsius put in for kelvin', 'This comes from R T and R T² with the temperature in °C: they take kelvin.', ({ given, air }) => {
      const T = given('temperature'), t = T - zeroCelsius, w = mixingRatioFrom(air.es(T), given('pressure'), air.epsilon), L = air.L(T)
      return Math.abs(t) < 0.5 ? null : air.g * (1 + L * w / (air.R * t)) / (air.cp + L * L * w * air.epsilon / (air.R * t * t))
    }),
    fineMoistSlip('numerator', 'without 1 + Lw/RT', 'This comes without the term L w/(R T) in the numerator.', ({ given, air }) => {
      const T = given('temperature'), w = mixingRatioFrom(air.es(T), given('pressure'), air.epsilon), L = air.L(T)
      return air.g / (air.cp + L * L * w * air.epsilon / (air.R * T * T))
    }),
    fineMoistSlip('epsilon-left-out', 'without ε', 'This comes without ε in the denominator, which is R/Rv there.', ({ given, air }) => {
      const T = given('temperature'), w = mixingRatioFrom(air.es(T), given('pressure'), air.epsilon), L = air.L(T)
      return air.g * (1 + L * w / (air.R * T)) / (air.cp + L * L * w / (air.R * T * T))
    }),
  ],
  example: { inputs: { pressure: 100_000, temperature: 293.15 }, gives: 0.00431136, within: 1e-7 },
})
