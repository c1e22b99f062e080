import { equivalentPotentialTemperature, equivalentShortcut } from '../equivalentPotential'
import { mixingRatioFrom } from '../humidity'
import { dewpointInput, pressureInput, temperatureInput } from '../moistInputs'
import { fineMoistSlip, foggy, moistQuantity } from '../moistQuantity'
import { celsiusAsKelvinSlip } from '../moistSlips'
import { inKelvin, mixingRatioStep } from '../moistTex'
import { pow } from '../../numerics/elementary'
import { texNumber } from '../tex'

/** θ exp[L w/(cp T)], with w and T of the parcel: the shortcut that many books print. Formula and source: `equivalentPotential.ts`; 0.1 to 16 K from θe. */
export const equivalentPotentialTemperatureShortcutDefinition = moistQuantity({
  key: 'equivalent-potential-temperature-shortcut',
  name: 'equivalent potential temperature by the shortcut θ exp(Lw/cpT)',
  symbol: 'θ exp(Lw/cpT)',
  unit: 'K', shownUnit: 'K', kind: 'temperature',
  inputs: [pressureInput, temperatureInput, dewpointInput],
  variants: [{ key: 'parcel', label: 'with the temperature of the parcel', source: { text: 'common practice: θ exp[L w/(cp T)] as textbooks print it', status: 'common practice' }, validity: 'as an approximation', knownError: '0.1 to 16 K below θe', value: ({ given, air }) => equivalentShortcut(given('temperature'), given('dewpoint'), given('pressure'), air) }],
  constants: ['R', 'Rv', 'cp', 'kappa', 'cpv', 'latentHeat', 'cw', 'enhancementFactor'],
  inside: ['es', 'L'],
  notedAt: { es: given => [given('dewpoint')], L: given => [given('temperature')] },
  remarks: ({ given }) => [foggy(given('temperature'), given('dewpoint'))],
  ask: 'The shortcut θ exp(Lw/cpT) for the equivalent potential temperature, with the mixing ratio and the temperature of the parcel itself.',
  working: ({ given, air }, value) => {
    const T = given('temperature'), theta = T * pow(100_000 / given('pressure'), air.kappa), w = mixingRatioFrom(air.es(given('dewpoint')), given('pressure'), air.epsilon), L = air.L(T)
    return [
      { ...mixingRatioStep('w', 'e', air.es(given('dewpoint')), given('pressure'), air), text: 'Mixing ratio, with e = es(Td)' },
      { text: 'Potential temperature', formula: '\\theta = T\\,(p_0/p)^{\\kappa}', filled: `\\theta = ${inKelvin(theta)}`, value: theta, unit: 'K' },
      { text: 'With the latent heat of all its vapor', formula: '\\theta \\exp\\frac{L\\,w}{c_p\\,T}', filled: `${texNumber(theta, 6)} \\exp\\frac{${texNumber(L, 6)} \\cdot ${texNumber(w)}}{${texNumber(air.cp, 6)} \\cdot ${texNumber(T, 6)}} = ${inKelvin(value)}` },
    ]
  },
  slips: [
    fineMoistSlip('bolton', 'Bolton’s θe', 'This is the equivalent potential temperature by Bolton’s formula: asked is the shortcut.', ({ given, air }) => equivalentPotentialTemperature(given('temperature'), given('dewpoint'), given('pressure'), air)),
    fineMoistSlip('theta', 'potential temperature', 'This is the potential temperature: the latent heat of the vapor is not in it.', ({ given, air }) => given('temperature') * pow(100_000 / given('pressure'), air.kappa)),
    fineMoistSlip('saturated', 'w at T for w at Td', 'This takes the saturation mixing ratio at the temperature.', ({ given, again }) => given('dewpoint') === given('temperature') ? null : again({ dewpoint: given('temperature') })),
    celsiusAsKelvinSlip,
  ],
  example: { inputs: { pressure: 85_000, temperature: 293.15, dewpoint: 291.15 }, gives: 349.3488, within: 0.0001 },
})
