import { equivalentPotentialTemperature, equivalentShortcut } from '../equivalentPotential'
import { mixingRatioFrom } from '../humidity'
import { boltonLclTemperature } from '../liftingCondensation'
import { dewpointInput, pressureInput, temperatureInput } from '../moistInputs'
import { fineMoistSlip, foggy, moistQuantity, moistSlip, type Hand } from '../moistQuantity'
import { celsiusAsKelvinSlip } from '../moistSlips'
import { inKelvin, mixingRatioStep } from '../moistTex'
import { exp, pow } from '../../numerics/elementary'
import { zeroCelsius } from '../slips'

const by = ({ given, air }: Hand, variant: string) => equivalentPotentialTemperature(given('temperature'), given('dewpoint'), given('pressure'), air, variant)
const wOf = ({ given, air }: Hand, T = given('dewpoint')) => mixingRatioFrom(air.es(T), given('pressure'), air.epsilon)
const bolton = (equation: string) => ({ text: `Bolton (1980), Mon. Wea. Rev. 108, 1046–1053, Eq. ${equation}`, status: 'verified' as const })

/** Equivalent potential temperature. Formulae and sources: `equivalentPotential.ts`. The shortcut θ exp(Lw/cpT) is another quantity. */
export const equivalentPotentialTemperatureDefinition = moistQuantity({
  key: 'equivalent-potential-temperature',
  name: 'equivalent potential temperature',
  symbol: 'θe',
  unit: 'K', shownUnit: 'K', kind: 'temperature',
  inputs: [pressureInput, temperatureInput, dewpointInput],
  variants: [
    { key: 'bolton-39', label: 'Bolton’s equation 39', source: bolton('39'), validity: 'θe below 480 K', knownError: '0.02 K', value: hand => by(hand, 'bolton-39') },
    { key: 'bolton-43', label: 'Bolton’s equation 43', source: bolton('43'), validity: 'θe below 380 K', knownError: '0.3 K, 2 K above 420 K', value: hand => by(hand, 'bolton-43') },
  ],
  constants: ['R', 'Rv', 'cp', 'kappa', 'cpv', 'latentHeat', 'cw', 'enhancementFactor'],
  // the latent heat enters slips alone: the shortcut is as wide as those that are taught
  inside: ['es', 'L'],
  notedAt: { es: given => [given('dewpoint')] },
  remarks: ({ given }) => [foggy(given('temperature'), given('dewpoint'))],
  ask: 'The equivalent potential temperature θe by Bolton’s formula, with the temperature at the condensation level, referred to 1000 hPa; not θ exp(Lw/cpT).',
  working: (hand, value) => {
    const { given, air, variant } = hand
    const T = given('temperature'), Td = Math.min(given('dewpoint'), T), e = air.es(given('dewpoint')), TL = Td < T ? boltonLclTemperature(T, Td) : T
    const formula = variant === 'bolton-43'
      ? '\\theta_e = T\\left(\\frac{p_0}{p}\\right)^{0.2854\\,(1 - 0.28\\,w)}\\exp\\left[\\left(\\frac{3376}{T_L} - 2.54\\right) w\\,(1 + 0.81\\,w)\\right]'
      : '\\theta_e = T\\left(\\frac{p_0}{p - e}\\right)^{\\kappa}\\left(\\frac{T}{T_L}\\right)^{0.28\\,w}\\exp\\left[\\left(\\frac{3036}{T_L} - 1.78\\right) w\\,(1 + 0.448\\,w)\\right]'
    return [
      { ...mixingRatioStep('w', 'e', e, given('pressure'), air), text: 'Mixing ratio, with e = es(Td)' },
      { text: 'Temperature at the condensation level', formula: 'T_L = \\frac{1}{\\frac{1}{T_d - 56} + \\frac{\\ln(T/T_d)}{800}} + 56', filled: `T_L = ${inKelvin(TL)}`, value: TL, unit: 'K' },
      { text: 'Bolton’s formula, with w in kg per kg', formula, filled: `\\theta_e = ${inKelvin(value)}` },
    ]
  },
  slips: [
    fineMoistSlip('shortcut', 'θ exp(Lw/cpT)', 'This is the shortcut θ exp(Lw/cpT), with the temperature of the parcel: asked is Bolton’s formula with that of the condensation level.', ({ given, air }) => equivalentShortcut(given('temperature'), given('dewpoint'), given('pressure'), air)),
    fineMoistSlip('at-parcel', 'temperature of the parcel for that at the level', 'This takes the temperature of the parcel in place of that at its condensation level.', (hand) => {
      const T = hand.given('temperature'), w = wOf(hand)
      return hand.given('dewpoint') >= T ? null : T * pow(100_000 / hand.given('pressure'), 0.2854 * (1 - 0.28 * w)) * exp((3376 / T - 2.54) * w * (1 + 0.81 * w))
    }),
    fineMoistSlip('saturated', 'w at T for w at Td', 'This takes the saturation mixing ratio at the temperature: that gives the saturation equivalent potential temperature.', ({ given, again }) => given('dewpoint') === given('temperature') ? null : again({ dewpoint: given('temperature') })),
    fineMoistSlip('theta', 'potential temperature', 'This is the potential temperature: the latent heat of the vapor is not in it, or all but vanishes by w in kg per kg in a formula that takes g per kg.', ({ given, air }) => given('temperature') * pow(100_000 / given('pressure'), air.kappa)),
    moistSlip('standard-pressure', '1013.25 hPa for 1000 hPa', 'This refers to 1013.25 hPa: θe refers to 1000 hPa.', ({ air, right }) => right * pow(1.01325, air.kappa)),
    moistSlip('celsius-exponential', 'Celsius put in for kelvin in the exponential', 'This comes from the shortcut with the temperature in °C in the exponential.', (hand) => {
      const t = hand.given('temperature') - zeroCelsius, value = hand.given('temperature') * pow(100_000 / hand.given('pressure'), hand.air.kappa) * exp(Math.min(50, hand.air.L(hand.given('temperature')) * wOf(hand) / (hand.air.cp * t)))
      return t > 3 && value < 1e6 ? value : null
    }),
    celsiusAsKelvinSlip,
  ],
  example: { inputs: { pressure: 85_000, temperature: 293.15, dewpoint: 291.15 }, gives: 353.9419, within: 0.0001 },
})
