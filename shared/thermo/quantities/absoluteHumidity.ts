import { temperatureInput, vaporPressureInput } from '../moistInputs'
import { moistQuantity, moistSlip } from '../moistQuantity'
import { glossary } from '../sources'
import { zeroCelsius } from '../slips'
import { texNumber, texQuantity } from '../tex'

/** Absolute humidity, mass of vapor per volume: ρᵥ = e/(Rᵥ T). Source: AMS Glossary, "absolute humidity"; vapor as an ideal gas to 0.2 %. */
export const absoluteHumidityDefinition = moistQuantity({
  key: 'absolute-humidity',
  name: 'absolute humidity',
  symbol: 'ρv',
  unit: 'kg/m3', shownUnit: 'g/m3', kind: 'ratio',
  inputs: [temperatureInput, vaporPressureInput],
  variants: [{ key: 'ideal-gas', label: 'e/(Rv T)', source: glossary('absolute humidity'), validity: 'vapor at less than 100 hPa', knownError: '0.2 %', value: ({ given, air }) => given('vaporPressure') / (air.Rv * given('temperature')) }],
  constants: ['Rv'],
  ask: 'The absolute humidity of the air, mass of vapor per volume of air.',
  working: ({ given, air }, value) => [{ text: 'Equation of state of the vapor, with e in pascal and T in kelvin', formula: '\\rho_v = \\frac{e}{R_v\\,T}', filled: `\\rho_v = \\frac{${texNumber(given('vaporPressure'))}}{${texNumber(air.Rv)} \\cdot ${texNumber(given('temperature'))}} = ${texQuantity(value * 1000, 'g/m3')}` }],
  slips: [
    moistSlip('celsius-for-kelvin', 'Celsius put in for kelvin', 'This is what comes out with the temperature in °C: the equation of state takes kelvin.', ({ given, right }) => given('temperature') === zeroCelsius ? null : right * given('temperature') / (given('temperature') - zeroCelsius)),
    moistSlip('dry-gas-constant', 'gas constant of dry air', 'This comes from the gas constant of dry air: the vapor has its own.', ({ air, right }) => right * air.Rv / air.R),
    moistSlip('hectopascal-for-pascal', 'hPa put in for Pa', 'This is what comes out with the vapor pressure in hPa: it goes in in pascal.', ({ right }) => right / 100),
    moistSlip('kilogram-for-gram', 'kg m⁻³ given as g m⁻³', 'Your number is in kg m⁻³; the unit beside it says g m⁻³.', ({ right }) => right / 1000),
  ],
  example: { inputs: { temperature: 293.15, vaporPressure: 2336.947 }, gives: 0.01727378, within: 1e-8 },
})
