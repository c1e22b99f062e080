/**
 * What people type into an entry, read as a value of the asked quantity: number and unit, in exact arithmetic, and told back in words.
 * Expected outcomes are values: nothing here throws for what was typed.
 */
import { compare, fromDouble, rational, times, toDecimal, toDouble, absolute, tenTo, type Rational } from '../numerics/rational'
import { describeDimension } from './dimension'
import { formatDecimal, formatUnit } from './formatQuantity'
import { nameNotAValue } from './notAValue'
import { plainText } from './plainText'
import { readNumber } from './readNumber'
import { readUnit } from './readUnit'
import { fromSi, getUnit, isCommensurable, toSi, type Unit } from './ucum'

export interface Ask {
  /** UCUM code in which it is asked. */
  unit: string
  kind: 'temperature' | 'difference' | 'ratio' | 'fraction' | 'class'
  /** As in a sentence: "lapse rate of the layer". */
  quantityName: string
}

export interface ReadValue {
  typed: string
  reading: 'ok' | 'class' | 'none' | 'not_reached' | 'not_defined' | 'empty' | 'unreadable' | 'wrong_dimension' | 'ambiguous'
  valueSi: number | null
  decimal: string | null
  unitUcum: string | null
  digits: number | null
  halfUnitSi: number | null
  message: string
}

const longest = 200
/** Digits to which an exact value without an end is kept: far beyond the 1e-9 to which edges are rounded. */
const kept = 40

const words: readonly [RegExp, ReadValue['reading'], string][] = [
  [/^(?:none|there is none|no such level|does not exist|doesn'?t exist|nonexistent|no)$/i, 'none', 'none'],
  [/^(?:not reached|not-reached|never reached|not reached by the data|above the data|beyond the data)$/i, 'not_reached', 'not reached'],
  [/^(?:not defined|not-defined|undefined|n\.?d\.?|indeterminate)$/i, 'not_defined', 'not defined'],
]

/**
 * @example readQuantity('0.98 K/100 m', { unit: 'K/km', kind: 'difference', quantityName: 'lapse rate' }).message // "read as 9.8 K km⁻¹"
 */
export function readQuantity(typed: string, ask: Ask): ReadValue {
  const asked = getUnit(ask.unit)
  const example = exampleUnit(ask.unit)
  if (typed.length > longest) return failed(typed.slice(0, longest), 'unreadable', `Too long: at most ${longest} characters.`)
  const text = unwrap(plainText(typed))
  if (text === '') return failed(typed, 'empty', 'Nothing typed yet.')
  for (const [pattern, reading, shown] of words) {
    if (pattern.test(text.replace(/\.$/, ''))) return failed(typed, reading, `read as “${shown}”`)
  }
  const named = nameNotAValue(text)
  if (named !== null) return failed(typed, 'unreadable', named)
  if (/±|\+\/-|\+-/.test(text)) return failed(typed, 'unreadable', 'Type the value alone, without ± and what follows it.')
  const number = readNumber(text)
  if (number.is === 'ambiguous') return failed(typed, 'ambiguous', `${text.split(' ')[0] ?? text} can be ${number.readings.join(' or ')}: type one of them.`)
  if (number.is === 'not_a_number') return failed(typed, 'unreadable', `Not read: ${number.why} Type a number and its unit, such as ${example}.`)
  const rest = number.rest.trim().replace(/[.;,]+$/, '')
  if (/^[-–]\s*[\d.,]/.test(rest)) return failed(typed, 'unreadable', 'Not read: this looks like a range or a sum. Type one value.')
  if (/^[+/]?\s*[\d.,]+(?![\d.,]*\s*[\p{L}(°])/u.test(rest) || /^\^/.test(rest)) return failed(typed, 'unreadable', 'Not read: type one value, not a calculation.')

  let unit = asked
  if (rest === '') {
    const question = bareQuestion(ask, number.value, text)
    if (question !== null) return failed(typed, 'ambiguous', question)
  }
  else {
    const read = readUnit(rest, asked)
    if (!read.ok) return failed(typed, 'unreadable', `“${read.symbol.slice(0, 40)}” is not a unit that can be read here. Type the unit like ${example}.`)
    if (!isCommensurable(read.unit, asked)) {
      return failed(typed, 'wrong_dimension', `${rest} is ${describeDimension(read.unit.dimension)}; the ${ask.quantityName} is ${describeDimension(asked.dimension)}, such as ${example}.`)
    }
    unit = read.unit
  }
  return accepted(typed, ask, asked, unit, number)
}

function accepted(typed: string, ask: Ask, asked: Unit, unit: Unit, number: { value: Rational, digits: number, lastPlace: number }): ReadValue {
  const isDifference = ask.kind !== 'temperature'
  const exactSi = toSi(number.value, unit, isDifference)
  const valueSi = toDouble(exactSi)
  if (!Number.isFinite(valueSi)) return failed(typed, 'unreadable', 'The number is too large to be one: look at the power of ten.')
  if (valueSi === 0 && exactSi.numerator !== 0n) return failed(typed, 'unreadable', 'The number is too small to be one: look at the power of ten.')
  if (ask.kind === 'temperature' && valueSi < 0) return failed(typed, 'unreadable', 'Below absolute zero: look at the sign and the unit.')
  const exact = fromSi(exactSi, asked, isDifference)
  const half = times(tenPower(number.lastPlace), rational(1n, 2n))
  const halfSi = absolute(times(half, unit.factor))
  const isConverted = compare(exact, number.value) !== 0
  const shown = isConverted
    ? formatDecimal(exact, ask.kind === 'temperature' ? { place: Math.min(0, number.lastPlace - 1) } : { digits: Math.min(12, Math.max(2, number.digits)) })
    : formatDecimal(number.value, number.digits > 12 ? { digits: 12 } : { place: Math.min(0, number.lastPlace) })
  return {
    typed,
    reading: 'ok',
    valueSi,
    decimal: toDecimal(exact, kept),
    unitUcum: unit.code,
    digits: number.digits,
    halfUnitSi: toDouble(halfSi),
    message: `read as ${shown}${ask.unit === '1' ? '' : ` ${formatUnit(ask.unit)}`}`,
  }
}

const tenPower = (place: number): Rational => (place >= 0 ? rational(tenTo(place)) : rational(1n, tenTo(-place)))

/** A bare number has the asked unit, except where a habit gives it another: °C or K, a fraction or a percentage. */
function bareQuestion(ask: Ask, value: Rational, number: string): string | null {
  if (ask.kind === 'temperature') return `${number}: in °C or in K? Type the unit with it.`
  if (ask.kind === 'fraction') {
    const isSmall = compare(absolute(value), fromDouble(1)) <= 0
    if (ask.unit !== '%' || isSmall) return `${number}: a fraction or a percentage? Type ${number} % or ${formatDecimal(times(value, rational(100n)), { digits: 4 })} %.`
  }
  return null
}

const exampleUnit = (code: string): string => (code === '1' ? 'a plain number' : formatUnit(code))

function failed(typed: string, reading: ReadValue['reading'], message: string): ReadValue {
  return { typed, reading, valueSi: null, decimal: null, unitUcum: null, digits: null, halfUnitSi: null, message }
}

/** What a notebook or a sheet wraps around a value: np.float64(9.77), [9.77], '9.77, Γ = 9.77. */
function unwrap(text: string): string {
  let inner = text
  for (let n = 0; n < 3; n++) {
    inner = inner
      .replace(/^(?:(?:np|numpy|torch|decimal)\.)?(?:float\d*|int\d*|double|array|asarray|tensor|Decimal|Quantity)\(\s*(.*?)\s*(?:,\s*dtype=[\w.]+)?\)$/i, '$1')
      .replace(/^\[\s*([^[\],;]*)\s*\]$/, '$1')
      .replace(/^["'“”](.*?)["'“”]?$/, '$1')
      .trim()
  }
  return inner.replace(/^[\p{L}_][\p{L}\p{N}_()]{0,30}\s*[=≈]\s*(?=[-+.,\d])/u, '').replace(/^[=≈~]\s*(?=[-+.,\d\s]+)/, '').replace(/^(?:about|approx\.?|ca\.?)\s+/i, '').trim()
}
