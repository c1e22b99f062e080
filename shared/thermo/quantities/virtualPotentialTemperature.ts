import { mixingRatioFrom, virtualTemperatureFrom } from '../humidity'
import { dewpointInput, pressureInput, temperatureInput } from '../moistInputs'
import { fineMoistSlip, moistQuantity, moistSlip, type Hand } from '../moistQuantity'
import { celsiusAsKelvinSlip } from '../moistSlips'
import { inKelvin, mixingRatioStep } from '../moistTex'
import { pow } from '../../numerics/elementary'
import { zeroCelsius } from '../slips'
import { glossary } from '../sources'
import { texNumber } from '../tex'

const wOf = ({ given, air }: Hand) => mixingRatioFrom(air.es(given('dewpoint')), given('pressure'), air.epsilon)
const exner = ({ given, air }: Hand) => pow(100_000 / given('pressure'), air.kappa)
const virtual = (hand: Hand, temperature = hand.given('temperature')) => hand.variant === 'linear' ? temperature * (1 + 0.61 * wOf(hand)) : virtualTemperatureFrom(temperature, wOf(hand), hand.air.epsilon)

/** Virtual potential temperature: θᵥ = Tᵥ (p₀/p)^κ. Source: AMS Glossary, "virtual potential temperature". */
export const virtualPotentialTemperatureDefinition = moistQuantity({
  key: 'virtual-potential-temperature',
  name: 'virtual potential temperature',
  symbol: 'θv',
  unit: 'K', shownUnit: 'K', kind: 'temperature',
  inputs: [pressureInput, temperatureInput, dewpointInput],
  variants: [
    { key: 'exact', label: 'with the exact virtual factor', source: glossary('virtual potential temperature'), validity: 'no liquid water in the air', knownError: 'κ 0.2854 to 0.286: 0.06 K at 700 hPa', value: hand => virtual(hand) * exner(hand) },
    { key: 'linear', label: 'with 1 + 0.61 w, as an approximation', source: glossary('virtual potential temperature', 'common practice'), validity: 'w below 20 g/kg', knownError: '0.13 K at 28 g/kg', value: hand => virtual(hand) * exner(hand) },
  ],
  constants: ['R', 'Rv', 'cp', 'kappa', 'enhancementFactor'],
  inside: ['es'],
  notedAt: { es: given => [given('dewpoint')] },
  ask: 'The virtual potential temperature θv of the air, with the exact virtual factor, referred to 1000 hPa.',
  working: (hand, value) => {
    const { given, air } = hand, Tv = virtual(hand)
    return [
      { ...mixingRatioStep('w', 'e', air.es(given('dewpoint')), given('pressure'), air), text: 'Mixing ratio, with e = es(Td)' },
      { text: 'Virtual temperature', formula: hand.variant === 'linear' ? 'T_v = T\\,(1 + 0.61\\,w)' : 'T_v = T\\,\\frac{1 + w/\\varepsilon}{1 + w}', filled: `T_v = ${inKelvin(Tv)}`, value: Tv, unit: 'K' },
      { text: 'Referred to 1000 hPa', formula: '\\theta_v = T_v\\left(\\frac{p_0}{p}\\right)^{\\kappa}', filled: `\\theta_v = ${texNumber(Tv, 6)}\\left(\\frac{1000}{${texNumber(given('pressure') / 100, 6)}}\\right)^{${texNumber(air.kappa)}} = ${inKelvin(value)}` },
    ]
  },
  slips: [
    fineMoistSlip('theta', 'potential temperature', 'This is the potential temperature: the vapor is not in it.', hand => hand.given('temperature') * exner(hand)),
    fineMoistSlip('virtual-only', 'virtual temperature', 'This is the virtual temperature: it is still to be referred to 1000 hPa.', hand => hand.given('pressure') === 100_000 ? null : virtual(hand)),
    fineMoistSlip('saturated', 'w at T for w at Td', 'This takes the saturation mixing ratio at the temperature: the dewpoint tells what the air holds.', ({ given, again }) => given('dewpoint') === given('temperature') ? null : again({ dewpoint: given('temperature') })),
    moistSlip('standard-pressure', '1013.25 hPa for 1000 hPa', 'This refers to 1013.25 hPa: θv refers to 1000 hPa.', ({ air, right }) => right * pow(1.01325, air.kappa)),
    moistSlip('celsius-for-kelvin', 'Celsius put in for kelvin', 'This is what comes out with the temperature in °C: Poisson’s relation takes kelvin.', hand => hand.given('temperature') === zeroCelsius ? null : zeroCelsius + virtual(hand, hand.given('temperature') - zeroCelsius) * exner(hand)),
    celsiusAsKelvinSlip,
  ],
  example: { inputs: { pressure: 95_900, temperature: 295.35, dewpoint: 292.15 }, gives: 301.5164, within: 0.0001 },
})
