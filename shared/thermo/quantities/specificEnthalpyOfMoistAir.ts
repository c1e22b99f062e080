import { constant } from '../constants'
import { mixingRatioInput, temperatureInput } from '../moistInputs'
import { moistQuantity, moistSlip } from '../moistQuantity'
import { zeroCelsius } from '../slips'
import { texFactor, texNumber, texQuantity } from '../tex'

/** Specific enthalpy of moist air, per kilogram of dry air and zero at 0 °C with liquid water: h = cp t + w (L₀ + cpv t). Source: ASHRAE Handbook – Fundamentals (2017), ch. 1, Eq. 30. */
export const specificEnthalpyOfMoistAirDefinition = moistQuantity({
  key: 'specific-enthalpy-of-moist-air',
  name: 'specific enthalpy of moist air',
  symbol: 'h',
  unit: 'J/kg', shownUnit: 'kJ/kg', kind: 'difference',
  nearZero: 1000,
  inputs: [temperatureInput, mixingRatioInput],
  variants: [{ key: 'constant-heats', label: 'cp t + w (L₀ + cpv t)', source: { text: 'ASHRAE Handbook – Fundamentals (2017), SI, ch. 1, Eq. 30; read in the documentation of PsychroLib', status: 'verified' }, validity: '−50 to 50 °C', knownError: '0.1 kJ kg⁻¹', value: ({ given, air, constants }) => air.cp * (given('temperature') - zeroCelsius) + given('mixingRatio') * (constant(constants, 'latentHeat') + air.cpv * (given('temperature') - zeroCelsius)) }],
  constants: ['cp', 'cpv', 'latentHeat'],
  ask: 'The specific enthalpy of the moist air per kilogram of dry air, counted from 0 °C with the water liquid.',
  working: ({ given, air, constants }, value) => {
    const t = given('temperature') - zeroCelsius, w = given('mixingRatio'), L0 = constant(constants, 'latentHeat')
    return [{ text: 'Dry air and vapor, with t in °C and L at 0 °C', formula: 'h = c_p\\,t + w\\,(L_0 + c_{pv}\\,t)', filled: `h = ${texNumber(air.cp / 1000)} \\cdot ${texFactor(t)} + ${texNumber(w)}\\,(${texNumber(L0 / 1000)} + ${texNumber(air.cpv / 1000)} \\cdot ${texFactor(t)}) = ${texQuantity(value / 1000, 'kJ/kg')}` }]
  },
  slips: [
    moistSlip('kelvin-for-celsius', 'kelvin put in for Celsius', 'This counts from 0 K: the enthalpy is counted from 0 °C.', ({ given, again }) => given('temperature') < 320 ? again({ temperature: given('temperature') + zeroCelsius }) : null),
    moistSlip('dry', 'without the vapor', 'This is cp t alone: the vapor’s part w (L + cpv t) is missing.', ({ given, air }) => given('temperature') === zeroCelsius ? null : air.cp * (given('temperature') - zeroCelsius)),
    moistSlip('latent-only', 'without cp t', 'This is the vapor’s part alone: cp t of the dry air is missing.', ({ given, air, right }) => given('temperature') === zeroCelsius ? null : right - air.cp * (given('temperature') - zeroCelsius)),
    moistSlip('joules-for-kilojoules', 'J given as kJ', 'Your number is in joules; the unit beside it says kilojoules.', ({ right }) => right * 1000),
    moistSlip('sign', 'sign turned round', 'The enthalpy is counted positive above 0 °C and for the vapor.', ({ right }) => -right),
  ],
  example: { inputs: { temperature: 313.15, mixingRatio: 0.0065 }, gives: 56_902.7, within: 1 },
})
