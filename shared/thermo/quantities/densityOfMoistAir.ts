import { pressureInput, temperatureInput, vaporPressureInput } from '../moistInputs'
import { fineMoistSlip, moistQuantity, moistSlip } from '../moistQuantity'
import { glossary } from '../sources'
import { zeroCelsius } from '../slips'
import { texNumber, texQuantity } from '../tex'

/** Density of moist air: ρ = (p − e)/(R T) + e/(Rᵥ T). Source: AMS Glossary, "equation of state"; dry air and vapor as ideal gases, to 0.1 %. */
export const densityOfMoistAirDefinition = moistQuantity({
  key: 'density-of-moist-air',
  name: 'density of moist air',
  symbol: 'ρ',
  unit: 'kg/m3', shownUnit: 'kg/m3', kind: 'ratio',
  inputs: [pressureInput, temperatureInput, vaporPressureInput],
  variants: [{ key: 'ideal-gases', label: 'dry air and vapor as ideal gases', source: glossary('equation of state', 'common practice'), validity: '180–340 K, below 1200 hPa', knownError: '0.1 %', value: ({ given, air }) => (given('pressure') - given('vaporPressure')) / (air.R * given('temperature')) + given('vaporPressure') / (air.Rv * given('temperature')) }],
  constants: ['R', 'Rv'],
  ask: 'The density of the moist air, mass of dry air and vapor per volume.',
  working: ({ given, air }, value) => {
    const p = given('pressure'), e = given('vaporPressure'), T = given('temperature')
    return [
      { text: 'Density of the dry air, with its partial pressure', formula: '\\rho_d = \\frac{p - e}{R\\,T}', filled: `\\rho_d = \\frac{${texNumber(p - e, 7)}}{${texNumber(air.R)} \\cdot ${texNumber(T)}} = ${texQuantity((p - e) / (air.R * T), 'kg/m3')}`, value: (p - e) / (air.R * T), unit: 'kg/m3' },
      { text: 'Together with the vapor', formula: '\\rho = \\rho_d + \\frac{e}{R_v\\,T}', filled: `\\rho = ${texNumber((p - e) / (air.R * T))} + \\frac{${texNumber(e)}}{${texNumber(air.Rv)} \\cdot ${texNumber(T)}} = ${texQuantity(value, 'kg/m3')}` },
    ]
  },
  slips: [
    fineMoistSlip('dry', 'as if dry', 'This is the density of dry air at the pressure: the vapor, which is lighter, is not in it.', ({ given, air }) => given('pressure') / (air.R * given('temperature'))),
    fineMoistSlip('added', 'p in place of p − e', 'This adds the vapor to dry air at the whole pressure: the dry air has p − e.', ({ given, air }) => given('pressure') / (air.R * given('temperature')) + given('vaporPressure') / (air.Rv * given('temperature'))),
    moistSlip('celsius-for-kelvin', 'Celsius put in for kelvin', 'This is what comes out with the temperature in °C: the equation of state takes kelvin.', ({ given, right }) => given('temperature') === zeroCelsius ? null : right * given('temperature') / (given('temperature') - zeroCelsius)),
    moistSlip('hectopascal-for-pascal', 'hPa put in for Pa', 'This is what comes out with the pressures in hPa: they go in in pascal.', ({ right }) => right / 100),
    moistSlip('vapor-gas-constant', 'gas constant of vapor', 'This comes from the gas constant of water vapor for the whole air.', ({ given, air }) => given('pressure') / (air.Rv * given('temperature'))),
  ],
  example: { inputs: { pressure: 100_000, temperature: 298.15, vaporPressure: 2000 }, gives: 1.15981, within: 0.0001 },
})
