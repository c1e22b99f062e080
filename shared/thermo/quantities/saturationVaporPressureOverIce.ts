import { exp, pow } from '../../numerics/elementary'
import { saturationDefinition, saturationInput } from '../saturationDefinition'
import { overIceForms, overWaterForms } from '../saturation'
import { fineSlip, slip, zeroCelsius } from '../slips'

const celsius = (kelvins: number) => kelvins - zeroCelsius

/** Saturation vapor pressure over ice. Formulae, sources and ranges: `saturation.ts`. */
export const saturationVaporPressureOverIceDefinition = saturationDefinition({
  key: 'saturation-vapor-pressure-over-ice',
  name: 'saturation vapor pressure over ice',
  symbol: 'e_i',
  input: saturationInput([110, 273.16]),
  forms: overIceForms,
  ask: 'The saturation vapor pressure over a plane surface of ice.',
  slips: [
    fineSlip('water-for-ice', 'over water for over ice', 'This is the saturation vapor pressure over supercooled water; asked is that over ice.', inputs => overWaterForms[0]?.pressure(Number(inputs.temperature)) ?? null),
    slip('kelvin-for-celsius', 'kelvin put in for Celsius', 'This is what a formula in °C gives when the temperature goes in in kelvin.', (inputs) => {
      const T = Number(inputs.temperature)
      return 611.2 * exp(22.46 * T / (T + 272.62))
    }),
    slip('base-ten-for-e', 'power of ten for exp', 'This comes from coefficients that belong to exp, taken as a power of ten.', (inputs) => {
      const t = celsius(Number(inputs.temperature))
      return t === 0 ? null : 611.2 * pow(10, 22.46 * t / (t + 272.62))
    }),
    slip('sign', 'sign of the temperature lost', 'This comes from a temperature without its minus sign.', (inputs) => {
      const t = celsius(Number(inputs.temperature))
      return t === 0 ? null : 611.2 * exp(22.46 * -t / (-t + 272.62))
    }),
  ],
  example: { inputs: { temperature: 263.15 }, gives: 259.892, within: 0.001 },
})
