/** Values with units for reading: parts for a page, and one line of text. */
import { fromDouble, leadingExponent, rational, tenTo, toPlace, type Rational } from '../numerics/rational'

export interface UnitPart { symbol: string, exponent: number }
export interface FormattedQuantity { number: string, unit: readonly UnitPart[], text: string }

const minusSign = '−'
const raised = ['⁰', '¹', '²', '³', '⁴', '⁵', '⁶', '⁷', '⁸', '⁹']
const shownSymbols: Readonly<Record<string, string>> = {
  'Cel': '°C', '[degF]': '°F', '[degR]': '°F', '[ft_i]': 'ft', '[in_i]': 'in', '[mi_i]': 'mi', '[nmi_i]': 'nmi', '[kn_i]': 'kt', 'm[Hg]': 'mHg', 'mm[Hg]': 'mmHg', '[in_i\'Hg]': 'inHg', '[psi]': 'psi', '[lb_av]': 'lb', '[ppth]': '‰', '[ppm]': 'ppm', 'deg': '°', 'um': 'µm',
}

/** A UCUM code as factors with exponents: J/(kg.K) → J, kg⁻¹, K⁻¹. */
export function unitParts(code: string): readonly UnitPart[] {
  const parts: UnitPart[] = []
  let sign = 1
  const signs: number[] = []
  let pending = 1
  for (const token of code.match(/\[[^\]]+\]|[A-Za-z%]+(?:\[[^\]]+\])?[+-]?\d?|\[[^\]]+\][+-]?\d?|\d+|[()./]/g) ?? []) {
    if (token === '(') {
      signs.push(sign)
      sign *= pending
      pending = 1
    }
    else if (token === ')') sign = signs.pop() ?? 1
    else if (token === '/') pending = -1
    else if (token === '.') pending = 1
    else {
      const match = /^(.*?)([+-]?\d)?$/.exec(token)
      const symbol = /^\d+$/.test(token) ? token : match?.[1] ?? token
      const exponent = /^\d+$/.test(token) ? 1 : Number(match?.[2] ?? 1)
      if (token !== '1') parts.push({ symbol: shownSymbols[symbol] ?? symbol, exponent: exponent * sign * pending })
      pending = 1
    }
  }
  return parts
}

/** A unit in one line: K km⁻¹. */
export function formatUnit(code: string): string {
  return unitParts(code).map(({ symbol, exponent }) => (exponent === 1 ? symbol : `${symbol}${exponent < 0 ? '⁻' : ''}${[...String(Math.abs(exponent))].map(digit => raised[Number(digit)] ?? '').join('')}`)).join(' ')
}

/** A number to a place or to significant digits, with a minus sign; powers of ten only where the number is very large or small. */
export function formatDecimal(value: Rational, to: { place: number } | { digits: number }): string {
  const exponent = leadingExponent(value)
  const place = 'place' in to ? to.place : exponent - to.digits + 1
  const isPlain = value.numerator === 0n || (exponent < 7 && exponent > -5)
  if (isPlain) return toPlace(value, place).replace('-', minusSign)
  const digits = Math.max(1, Math.min(12, exponent - place + 1))
  const scale = rational(tenTo(Math.abs(exponent)))
  const mantissa = exponent >= 0 ? rational(value.numerator, value.denominator * scale.numerator) : rational(value.numerator * scale.numerator, value.denominator)
  const power = [...String(Math.abs(exponent))].map(digit => raised[Number(digit)] ?? '').join('')
  return `${toPlace(mantissa, 1 - digits).replace('-', minusSign)}×10${exponent < 0 ? '⁻' : ''}${power}`
}

/**
 * A double in a unit, to significant digits.
 * @example formatQuantity(-9.6, 'K/km', 2).text // "−9.6 K km⁻¹"
 */
export function formatQuantity(value: number, unit: string, digits = 3): FormattedQuantity {
  const number = formatDecimal(fromDouble(value), { digits })
  const text = formatUnit(unit)
  return { number, unit: unitParts(unit), text: text === '' ? number : `${number} ${text}` }
}
