/** Numbers and units as TeX, for a trace. */
import type { TraceStep } from './definition'

export function texNumber(value: number, digits = 5): string {
  if (value === 0) return '0'
  const text = value.toPrecision(digits)
  const [mantissa = '0', exponent] = text.split('e')
  const short = mantissa.includes('.') ? mantissa.replace(/0+$/, '').replace(/\.$/, '') : mantissa
  if (exponent !== undefined) return `${short} \\times 10^{${Number(exponent)}}`
  const size = Math.abs(value)
  if (size < 1e-3) {
    const [small = '0', power = '0'] = value.toExponential(digits - 1).split('e')
    return `${small.includes('.') ? small.replace(/0+$/, '').replace(/\.$/, '') : small} \\times 10^{${Number(power)}}`
  }
  return short
}

/** In brackets where it is negative, so that a product or a difference can be read. */
export const texFactor = (value: number, digits = 5): string => (value < 0 ? `(${texNumber(value, digits)})` : texNumber(value, digits))

const units: Readonly<Record<string, string>> = {
  'K': 'K', 'Pa': 'Pa', 'hPa': 'hPa', 'm': 'm', 'km': 'km', 'kg': 'kg', '1': '', 'Cel': '{}^{\\circ}C',
  'J': 'J', 'kJ': 'kJ', 'J/kg': 'J\\,kg^{-1}', 'kJ/kg': 'kJ\\,kg^{-1}', 'K/m': 'K\\,m^{-1}', 'K/km': 'K\\,km^{-1}',
  's': 's', 'h': 'h', 'm/s': 'm\\,s^{-1}', 's-1': 's^{-1}', 's-2': 's^{-2}', 'K/s': 'K\\,s^{-1}', 'K/h': 'K\\,h^{-1}', 'deg': '{}^{\\circ}', 'rad': 'rad', 'mm': 'mm', 'g/kg': 'g\\,kg^{-1}', 'kg/kg': 'kg\\,kg^{-1}',
  'kg/m3': 'kg\\,m^{-3}', 'm3/kg': 'm^{3}\\,kg^{-1}', 'J/(kg.K)': 'J\\,kg^{-1}\\,K^{-1}', 'm/s2': 'm\\,s^{-2}', 'W/kg': 'W\\,kg^{-1}', 'Pa/s': 'Pa\\,s^{-1}', 'hPa/h': 'hPa\\,h^{-1}',
  'g/m3': 'g\\,m^{-3}', '%': '\\%', '1/K': 'K^{-1}',
}

export function texUnit(code: string): string {
  const known = units[code]
  if (known === undefined) throw new Error(`no TeX for the unit ${code}`)
  return known === '' ? '' : `\\,\\mathrm{${known}}`
}

export const texQuantity = (value: number, unit: string, digits = 5): string => `${texNumber(value, digits)}${texUnit(unit)}`

/** A line of the working that ends in its number; `shown` where people read it in another unit than SI. */
export function worked(text: string, formula: string, filled: string, value: number, unit: string, shown?: { value: number, unit: string }, digits = 6): TraceStep {
  return { text, formula, filled: `${filled} = ${texQuantity(shown?.value ?? value, shown?.unit ?? unit, digits)}`, value, unit }
}
