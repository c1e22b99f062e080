import { equivalentPotentialTemperature } from '../equivalentPotential'
import { pressureInput, temperatureInput } from '../moistInputs'
import { fineMoistSlip, moistQuantity, moistSlip, type Hand } from '../moistQuantity'
import { celsiusAsKelvinSlip } from '../moistSlips'
import { inKelvin, mixingRatioStep } from '../moistTex'
import { pow } from '../../numerics/elementary'

const by = ({ given, air }: Hand, variant: string) => equivalentPotentialTemperature(given('temperature'), given('temperature'), given('pressure'), air, variant)

/** Saturation equivalent potential temperature: θe of air at the temperature if it were saturated. Formulae and sources: `equivalentPotential.ts`. */
export const saturationEquivalentPotentialTemperatureDefinition = moistQuantity({
  key: 'saturation-equivalent-potential-temperature',
  name: 'saturation equivalent potential temperature',
  symbol: 'θes',
  unit: 'K', shownUnit: 'K', kind: 'temperature',
  inputs: [pressureInput, temperatureInput],
  variants: [
    { key: 'bolton-39', label: 'Bolton’s equation 39', source: { text: 'Bolton (1980), Mon. Wea. Rev. 108, 1046–1053, Eq. 39', status: 'verified' }, validity: 'θe below 480 K', knownError: '0.02 K', value: hand => by(hand, 'bolton-39') },
    { key: 'bolton-43', label: 'Bolton’s equation 43', source: { text: 'Bolton (1980), Mon. Wea. Rev. 108, 1046–1053, Eq. 43', status: 'verified' }, validity: 'θe below 380 K', knownError: '0.3 K, 2 K above 420 K', value: hand => by(hand, 'bolton-43') },
  ],
  constants: ['R', 'Rv', 'cp', 'kappa', 'enhancementFactor'],
  inside: ['es'],
  notedAt: { es: given => [given('temperature')] },
  ask: 'The saturation equivalent potential temperature by Bolton’s formula: θe of the air if it were saturated over liquid water at its temperature.',
  working: ({ given, air, variant }, value) => [
    { ...mixingRatioStep('w_s', 'e_s', air.es(given('temperature')), given('pressure'), air), text: 'Saturation mixing ratio' },
    { text: 'Bolton’s formula with w in kg per kg; the condensation level is here, TL = T', formula: variant === 'bolton-43' ? '\\theta_{es} = T\\left(\\frac{p_0}{p}\\right)^{0.2854\\,(1 - 0.28\\,w_s)}\\exp\\left[\\left(\\frac{3376}{T} - 2.54\\right) w_s\\,(1 + 0.81\\,w_s)\\right]' : '\\theta_{es} = T\\left(\\frac{p_0}{p - e_s}\\right)^{\\kappa}\\exp\\left[\\left(\\frac{3036}{T} - 1.78\\right) w_s\\,(1 + 0.448\\,w_s)\\right]', filled: `\\theta_{es} = ${inKelvin(value)}` },
  ],
  slips: [
    fineMoistSlip('theta', 'potential temperature', 'This is the potential temperature: the latent heat of saturation is not in it.', ({ given, air }) => given('temperature') * pow(100_000 / given('pressure'), air.kappa)),
    moistSlip('standard-pressure', '1013.25 hPa for 1000 hPa', 'This refers to 1013.25 hPa: θe refers to 1000 hPa.', ({ air, right }) => right * pow(1.01325, air.kappa)),
    celsiusAsKelvinSlip,
  ],
  example: { inputs: { pressure: 50_000, temperature: 253.15 }, gives: 313.8347, within: 0.0001 },
})
