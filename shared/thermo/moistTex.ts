/** Steps that the workings of moist air share. */
import type { TraceStep } from './definition'
import { mixingRatioFrom } from './humidity'
import type { MoistAir } from './moistAir'
import { texNumber, texQuantity } from './tex'

export const inHectopascal = (pressure: number, digits = 5): string => texQuantity(pressure / 100, 'hPa', digits)
export const inGrams = (ratio: number, digits = 5): string => texQuantity(ratio * 1000, 'g/kg', digits)
export const inCelsius = (temperature: number, digits = 5): string => texQuantity(temperature - 273.15, 'Cel', digits)
export const inKelvin = (temperature: number, digits = 6): string => texQuantity(temperature, 'K', digits)

/** e_s(T) or e = e_s(T_d), as the convention computes it. */
export const saturationStep = (symbol: string, of: string, temperature: number, pressure: number, text = 'Saturation vapor pressure over liquid water'): TraceStep => (
  { text, formula: `${symbol} = e_s(${of})`, filled: `${symbol} = e_s(${inCelsius(temperature)}) = ${inHectopascal(pressure)}`, value: pressure, unit: 'Pa' })

export const mixingRatioStep = (symbol: string, e: string, vaporPressure: number, pressure: number, air: MoistAir): TraceStep => {
  const w = mixingRatioFrom(vaporPressure, pressure, air.epsilon)
  return { text: 'Mixing ratio', formula: `${symbol} = \\varepsilon\\,\\frac{${e}}{p - ${e}}`, filled: `${symbol} = ${texNumber(air.epsilon)} \\cdot \\frac{${texNumber(vaporPressure / 100)}}{${texNumber(pressure / 100, 6)} - ${texNumber(vaporPressure / 100)}} = ${inGrams(w)}`, value: w, unit: '1' }
}
