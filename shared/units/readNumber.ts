/**
 * The number at the beginning of what was typed, and what is left for the unit.
 *
 * A comma is a decimal comma (`9,8`), except where it could as well group thousands (`1,013`): that is asked. With both a comma and a point the
 * last is the decimal one. Spaces and apostrophes group thousands where every group has three digits.
 */
import { fromDecimal, type Rational } from '../numerics/rational'

export type ReadNumber =
  | { is: 'number', value: Rational, digits: number, lastPlace: number, rest: string, isZero: boolean }
  | { is: 'ambiguous', readings: readonly string[] }
  | { is: 'not_a_number', why: string }

const mostDigits = 60
const mostExponent = 300

export function readNumber(text: string): ReadNumber {
  const match = /^([+-]?)\s*((?:\d[\d.,]*|[.,]\d[\d.,]*)(?:[ '](?=\d{3}(?!\d))\d{3}[\d.,]*)*)/.exec(text)
  if (!match) {
    const power = /^([+-]?)10\s*(?:\^|\*\*)/.test(text)
    return { is: 'not_a_number', why: power ? 'Write the number before the power of ten.' : 'There is no number at the beginning.' }
  }
  const [all, sign = '', body = ''] = match
  const mantissa = readMantissa(body)
  if ('readings' in mantissa) return { is: 'ambiguous', readings: mantissa.readings }
  if ('why' in mantissa) return { is: 'not_a_number', why: mantissa.why }
  let rest = text.slice(all.length)
  const raised = readExponent(rest, body)
  if ('why' in raised) return { is: 'not_a_number', why: raised.why }
  rest = rest.slice(raised.length)
  if (Math.abs(raised.exponent) > mostExponent) {
    return { is: 'not_a_number', why: raised.exponent > 0 ? 'The number is too large to be one: look at the power of ten.' : 'The number is too small to be one: look at the power of ten.' }
  }
  const { whole, decimals } = mantissa
  if (whole.length + decimals.length > mostDigits) return { is: 'not_a_number', why: `The number has more than ${mostDigits} digits.` }
  const value = fromDecimal(`${sign}${whole || '0'}.${decimals || '0'}e${raised.exponent}`)
  if (!value) return { is: 'not_a_number', why: 'This is not a number.' }
  const significant = (whole + decimals).replace(/^0+/, '')
  const isZero = value.numerator === 0n
  return { is: 'number', value, digits: isZero ? decimals.length + 1 : significant.length, lastPlace: raised.exponent - decimals.length, rest, isZero }
}

function readMantissa(body: string): { whole: string, decimals: string } | { readings: readonly string[] } | { why: string } {
  const text = body.replace(/[ ']/g, '_').replace(/[.,]$/, '')
  const points = text.split('.').length - 1
  const commas = text.split(',').length - 1
  const groups = (part: string) => /^\d{1,3}(?:[.,_]\d{3})+$/.test(part) && new Set(part.replace(/\d/g, '')).size === 1
  const plain = (part: string) => part.replace(/\D/g, '')
  const whole = (part: string) => (/^\d*$/.test(part) || groups(part) ? plain(part) : null)
  if (points > 0 && commas > 0) {
    const mark = text.lastIndexOf('.') > text.lastIndexOf(',') ? '.' : ','
    const [before = '', after = '', ...more] = text.split(mark)
    const digits = whole(before)
    if (more.length > 0 || digits === null || !/^\d*$/.test(after)) return { why: 'Points and commas do not go together as in a number.' }
    return { whole: digits, decimals: after }
  }
  const marks = points + commas
  if (marks === 0) {
    const digits = whole(text)
    return digits === null ? { why: 'The digits are not grouped as in a number.' } : { whole: digits, decimals: '' }
  }
  if (marks > 1) {
    return groups(text) ? { whole: plain(text), decimals: '' } : { why: 'Points and commas do not go together as in a number.' }
  }
  const mark = points === 1 ? '.' : ','
  const [before = '', after = ''] = text.split(mark)
  const digits = whole(before)
  if (digits === null || !/^\d*$/.test(after)) return { why: 'The digits are not grouped as in a number.' }
  const couldGroup = mark === ',' && /^[1-9]\d{0,2}$/.test(before) && after.length === 3
  if (couldGroup) return { readings: [`${before}${after}`, `${before}.${after}`] }
  return { whole: digits, decimals: after }
}

function readExponent(rest: string, body: string): { exponent: number, length: number } | { why: string } {
  const scientific = /^[eE]([+-]?\d{1,9})(?![\d.,])/.exec(rest)
  if (scientific) return { exponent: Number(scientific[1]), length: scientific[0].length }
  const times = /^\s*(?:×|x|X|\*|·)\s*10\s*(?:\^|\*\*)\s*[({]?\s*([+-]?\d{1,9})\s*[)}]?/.exec(rest) ?? /^\s*(?:×|x|X|\*|·)\s*10\s*([+-]\d{1,2})(?!\d)/.exec(rest)
  if (times) return { exponent: Number(times[1]), length: times[0].length }
  const flattened = /^\s*(?:×|x|X|·|\*)\s*10\d+/.exec(rest)
  if (flattened) return { why: 'The power of ten has lost its raised digit: write it as e6 or ×10^6.' }
  const bare = /^\s*(?:×|x|X|·|\*)\s*10(?![\d.,])/.exec(rest)
  if (bare) return { exponent: 1, length: bare[0].length }
  const alone = body === '10' ? /^\s?(?:\^|\*\*)\s*[({]?\s*([+-]?\d{1,9})\s*[)}]?/.exec(rest) : null
  if (alone) return { exponent: Number(alone[1]) - 1, length: alone[0].length }
  return { exponent: 0, length: 0 }
}
