import { exp, pow } from '../../numerics/elementary'
import { saturationDefinition, saturationInput } from '../saturationDefinition'
import { overWaterForms, overIceForms } from '../saturation'
import { constantSlip, fineSlip, slip, zeroCelsius } from '../slips'

const celsius = (kelvins: number) => kelvins - zeroCelsius

/** Saturation vapor pressure over liquid water, supercooled below 0 °C. Formulae, sources and ranges: `saturation.ts`. */
export const saturationVaporPressureDefinition = saturationDefinition({
  key: 'saturation-vapor-pressure',
  name: 'saturation vapor pressure over liquid water',
  symbol: 'e_s',
  input: saturationInput([150, 375]),
  forms: overWaterForms,
  ask: 'The saturation vapor pressure over a plane surface of liquid water, also below 0 °C, where the water is supercooled.',
  slips: [
    fineSlip('ice-for-water', 'over ice for over water', 'This is the saturation vapor pressure over ice; asked is that over liquid water, also below 0 °C.', (inputs) => {
      const T = Number(inputs.temperature)
      return T < zeroCelsius ? overIceForms[0]?.pressure(T) ?? null : null
    }),
    slip('kelvin-for-celsius', 'kelvin put in for Celsius', 'This is what a formula in °C gives when the temperature goes in in kelvin.', (inputs) => {
      const T = Number(inputs.temperature)
      return 611.2 * exp(17.67 * T / (T + 243.5))
    }),
    slip('base-ten-for-e', 'power of ten for exp', 'This comes from coefficients that belong to exp, taken as a power of ten.', (inputs) => {
      const t = celsius(Number(inputs.temperature))
      return t === 0 ? null : 611.2 * pow(10, 17.67 * t / (t + 243.5))
    }),
    slip('e-for-base-ten', 'exp for power of ten', 'This comes from coefficients that belong to a power of ten (7.5 and 237.3), put into exp.', (inputs) => {
      const t = celsius(Number(inputs.temperature))
      return t === 0 ? null : 611 * exp(7.5 * t / (t + 237.3))
    }),
    constantSlip('sign-in-denominator', 'difference for sum in the denominator', 'This comes from a denominator that takes t away from its constant: the two are added.', (inputs) => {
      const t = celsius(Number(inputs.temperature))
      return t === 0 || t > 120 ? null : 611.2 * exp(17.67 * t / (243.5 - t))
    }),
  ],
  example: { inputs: { temperature: 293.15 }, gives: 2336.947, within: 0.001 },
})
