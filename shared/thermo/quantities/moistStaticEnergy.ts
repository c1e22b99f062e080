import { mixingRatioInput, temperatureInput } from '../moistInputs'
import { fineMoistSlip, moistQuantity, moistSlip } from '../moistQuantity'
import { zeroCelsius } from '../slips'
import { glossary } from '../sources'
import { texFactor, texNumber, texQuantity } from '../tex'

/** Moist static energy: h = cp T + g z + L q, with T in kelvin and z above the stated datum. Source: AMS Glossary, "moist static energy". */
export const moistStaticEnergyDefinition = moistQuantity({
  key: 'moist-static-energy',
  name: 'moist static energy',
  symbol: 'h',
  unit: 'J/kg', shownUnit: 'kJ/kg', kind: 'ratio',
  inputs: [
    temperatureInput,
    { name: 'heightAboveDatum', label: 'height above the datum', symbol: 'z', unit: 'm', shownUnit: 'm', kind: 'difference', shape: 'number', range: [-500, 30_000] },
    { ...mixingRatioInput, name: 'specificHumidity', label: 'specific humidity', symbol: 'q', range: [0, 0.1] },
  ],
  variants: [{ key: 'sum', label: 'cp T + g z + L q', source: glossary('moist static energy', 'common practice'), validity: 'hydrostatic air', knownError: '0.7 kJ kg⁻¹ by cp and L', value: ({ given, air }) => air.cp * given('temperature') + air.g * given('heightAboveDatum') + air.L(given('temperature')) * given('specificHumidity') }],
  constants: ['cp', 'g', 'cpv', 'latentHeat', 'cw'],
  inside: ['L'],
  notedAt: { L: given => [given('temperature')] },
  ask: 'The moist static energy cp T + g z + L q per kilogram, with T in kelvin, z above the datum and the specific humidity.',
  working: ({ given, air }, value) => {
    const T = given('temperature'), z = given('heightAboveDatum'), q = given('specificHumidity'), L = air.L(T)
    return [
      { text: 'Enthalpy, with T in kelvin', formula: 'c_p\\,T', filled: `${texNumber(air.cp / 1000, 6)} \\cdot ${texNumber(T, 6)} = ${texQuantity(air.cp * T / 1000, 'kJ/kg', 6)}`, value: air.cp * T, unit: 'J/kg' },
      { text: 'Geopotential', formula: 'g\\,z', filled: `${texNumber(air.g, 6)} \\cdot ${texFactor(z)} = ${texQuantity(air.g * z / 1000, 'kJ/kg', 6)}`, value: air.g * z, unit: 'J/kg' },
      { text: 'Latent heat, with q in kg per kg', formula: 'L\\,q', filled: `${texNumber(L / 1000, 6)} \\cdot ${texNumber(q)} = ${texQuantity(L * q / 1000, 'kJ/kg', 6)}`, value: L * q, unit: 'J/kg' },
      { text: 'Together', formula: 'h = c_p\\,T + g\\,z + L\\,q', filled: `h = ${texQuantity(value / 1000, 'kJ/kg', 6)}` },
    ]
  },
  slips: [
    moistSlip('celsius-for-kelvin', 'Celsius put in for kelvin', 'This counts the temperature from 0 °C: it is counted from 0 K. Differences are right, values are not.', ({ air, right }) => right - air.cp * zeroCelsius),
    fineMoistSlip('dry', 'without L q', 'This is the dry static energy: the latent heat of the vapor is missing.', ({ given, air }) => air.cp * given('temperature') + air.g * given('heightAboveDatum')),
    fineMoistSlip('without-height', 'without g z', 'This leaves out the geopotential g z.', ({ given, air, right }) => given('heightAboveDatum') === 0 ? null : right - air.g * given('heightAboveDatum')),
    moistSlip('grams', 'g kg⁻¹ put in for kg kg⁻¹', 'This is what comes out with the humidity in g per kg: the formula takes kg per kg.', ({ given, again }) => given('specificHumidity') === 0 ? null : again({ specificHumidity: 1000 * given('specificHumidity') })),
    moistSlip('joules-for-kilojoules', 'J given as kJ', 'Your number is in joules; the unit beside it says kilojoules.', ({ right }) => right * 1000),
    moistSlip('kilojoules-added', 'kJ and J added', 'This adds g z in joules to terms in kilojoules.', ({ given, air, right }) => given('heightAboveDatum') === 0 ? null : right + 999 * air.g * given('heightAboveDatum')),
  ],
  example: { inputs: { temperature: 298.15, heightAboveDatum: 500, specificHumidity: 0.012 }, gives: 333_548.6, within: 1 },
})
