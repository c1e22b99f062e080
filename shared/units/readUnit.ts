/**
 * A unit as people type it: `K/km`, `°C m^-1`, `J kg-1 K-1`, `J/(kg K)`, `K/100 m`, `K per km`, `kg⁻¹`.
 * After a slash, what is joined by a space or a dot stays below the line (J/kg K is J/(kg K)); where only the strict reading from left to right
 * fits what is asked, that one is taken.
 */
import { fromDecimal, one, over, power, times, zero, type Rational } from '../numerics/rational'
import { combine, isSame, none, type Dimension } from './dimension'
import { codeOfSymbol, composed } from './symbols'
import { findAtom, findUnit, type Unit } from './ucum'

type Token = { is: 'symbol', text: string } | { is: 'number', value: Rational, text: string } | { is: 'times' | 'over' | 'open' | 'close' } | { is: 'power', exponent: number }

interface Part { dimension: Dimension, factor: Rational, code: string }

export type ReadUnit = { ok: true, unit: Unit } | { ok: false, symbol: string }

const mostTokens = 40

/** Reads a unit; `asked` decides between readings that both make sense. */
export function readUnit(text: string, asked: Unit): ReadUnit {
  const tokens = split(text)
  if ('unknown' in tokens) return { ok: false, symbol: tokens.unknown }
  if (tokens.list.length === 0 || tokens.list.length > mostTokens) return { ok: false, symbol: text.trim() }
  const only = tokens.list.length === 1 ? tokens.list[0] : undefined
  if (only?.is === 'symbol') {
    const unit = soleUnit(only.text)
    return unit ? { ok: true, unit } : { ok: false, symbol: only.text }
  }
  const readings = [new Reader(tokens.list, true).read(), new Reader(tokens.list, false).read()].filter(reading => reading !== null)
  const failed = readings.find(reading => 'unknown' in reading)
  if (failed && 'unknown' in failed) return { ok: false, symbol: failed.unknown }
  const parts = readings.filter((reading): reading is Part => !('unknown' in reading))
  const best = parts.find(part => isSame(part.dimension, asked.dimension)) ?? parts[0]
  return best ? { ok: true, unit: { ...best, offset: zero } } : { ok: false, symbol: text.trim() }
}

function soleUnit(symbol: string): Unit | null {
  const several = Object.hasOwn(composed, codeOfSymbol(symbol) ?? symbol) ? composed[codeOfSymbol(symbol) ?? symbol] : undefined
  if (several) {
    const unit = findUnit(several.code)
    return unit ? { ...unit, factor: times(unit.factor, fromDecimal(several.factor) ?? one) } : null
  }
  const code = codeOfSymbol(symbol)
  return code === null ? null : findUnit(code)
}

function split(text: string): { list: Token[] } | { unknown: string } {
  const list: Token[] = []
  let rest = text.trim().replace(/\b(degrees?|deg)\s*\.?\s*(C|F|K|Celsius|Fahrenheit|Kelvin)\b/gi, (_all, _deg: string, scale: string) => ({ C: '°C', F: '°F', K: 'K' }[scale.charAt(0).toUpperCase()] ?? scale)).replace(/°\s+(?=[CFK]\b)/g, '°')
  let spaced = false
  while (rest !== '') {
    const space = /^\s+/.exec(rest)?.[0]
    if (space !== undefined) {
      spaced = true
      rest = rest.slice(space.length)
      continue
    }
    const before = list[list.length - 1]
    const take = (length: number, token: Token) => {
      const starts = token.is === 'symbol' || token.is === 'number' || token.is === 'open'
      const joins = before !== undefined && (before.is === 'symbol' || before.is === 'number' || before.is === 'close' || before.is === 'power')
      if (starts && joins) list.push({ is: 'times' })
      list.push(token)
      rest = rest.slice(length)
      spaced = false
    }
    // an exponent: ^-1, **-1, -1 straight after or after a space, or a digit straight after a symbol
    const exponent = /^(?:\^|\*\*)\s*[({]?\s*([+-]?\d{1,2})\s*[)}]?/.exec(rest) ?? (before?.is === 'symbol' || before?.is === 'close' ? /^([+-]\s?\d{1,2})(?![\d.])/.exec(rest) : null) ?? (before?.is === 'symbol' && !spaced ? /^(\d)(?![\d.])/.exec(rest) : null)
    if (exponent && before && (before.is === 'symbol' || before.is === 'close' || before.is === 'number')) {
      const value = Number((exponent[1] ?? '').replace(/\s/g, ''))
      if (Math.abs(value) > 9) return { unknown: exponent[0] }
      take(exponent[0].length, { is: 'power', exponent: value })
      continue
    }
    const number = /^\d{1,9}(?:\.\d{1,6})?/.exec(rest)?.[0]
    if (number !== undefined) {
      const value = fromDecimal(number)
      if (!value || value.numerator === 0n) return { unknown: number }
      take(number.length, { is: 'number', value, text: number })
      continue
    }
    const word = /^per\b/i.exec(rest)?.[0]
    if (word !== undefined) {
      take(word.length, { is: 'over' })
      continue
    }
    const operator = { '/': 'over', '(': 'open', ')': 'close', '*': 'times', '·': 'times', '.': 'times' }[rest[0] ?? '']
    if (operator === 'over' || operator === 'open' || operator === 'close' || operator === 'times') {
      take(1, { is: operator })
      continue
    }
    const symbol = /^(?:\[[A-Za-z_']+\]|°?[\p{L}_µ]+(?:\[Hg\])?|°|%|‰)/u.exec(rest)?.[0]
    if (symbol === undefined) return { unknown: rest.slice(0, 20) }
    take(symbol.length, { is: 'symbol', text: symbol })
  }
  return { list }
}

/** expression := product ((over) product)*; below a slash, a product goes on over spaces and dots (`keepsBelow`). */
class Reader {
  private at = 0
  private unknown: string | null = null
  constructor(private readonly tokens: readonly Token[], private readonly keepsBelow: boolean) {}

  read(): Part | { unknown: string } | null {
    const part = this.expression()
    if (this.unknown !== null) return { unknown: this.unknown }
    return part && this.at === this.tokens.length ? part : null
  }

  private expression(): Part | null {
    let result: Part | null = this.tokens[this.at]?.is === 'over' ? { dimension: none, factor: one, code: '1' } : this.factor()
    while (result) {
      const operator = this.tokens[this.at]?.is
      if (operator !== 'times' && operator !== 'over') return result
      this.at++
      let next = this.factor()
      if (operator === 'over' && this.keepsBelow) {
        while (next && this.tokens[this.at]?.is === 'times') {
          this.at++
          const more = this.factor()
          next = more && join(next, more, 1)
        }
      }
      result = next && join(result, next, operator === 'over' ? -1 : 1)
    }
    return null
  }

  private factor(): Part | null {
    const token = this.tokens[this.at]
    if (!token) return null
    let part: Part | null = null
    if (token.is === 'open') {
      this.at++
      part = this.expression()
      if (this.tokens[this.at]?.is !== 'close') return null
      this.at++
    }
    else if (token.is === 'number') {
      this.at++
      part = { dimension: none, factor: token.value, code: token.text }
    }
    else if (token.is === 'symbol') {
      this.at++
      part = symbolPart(token.text)
      if (!part) this.unknown = token.text
    }
    const after = this.tokens[this.at]
    if (part && after?.is === 'power') {
      this.at++
      if (after.exponent === 0) return null
      const base = /[./]/.test(part.code) || /^\d/.test(part.code) ? `(${part.code})` : part.code
      return { dimension: combine(none, part.dimension, after.exponent), factor: power(part.factor, after.exponent), code: after.exponent === 1 ? part.code : `${base}${after.exponent}` }
    }
    return part
  }
}

function join(a: Part, b: Part, sign: 1 | -1): Part {
  const right = sign < 0 && /[./]/.test(b.code) ? `(${b.code})` : b.code
  return {
    dimension: combine(a.dimension, b.dimension, sign),
    factor: sign > 0 ? times(a.factor, b.factor) : over(a.factor, b.factor),
    code: `${a.code}${sign > 0 ? '.' : '/'}${right}`,
  }
}

/** Within a compound, °C is a step of temperature and therefore K, and °F one of the Rankine scale, which has the same degree. */
function symbolPart(symbol: string): Part | null {
  const code = codeOfSymbol(symbol)
  if (code === 'Cel') return { dimension: [0, 0, 0, 1, 0], factor: one, code: 'K' }
  if (code !== null) {
    const atom = findAtom(code === '[degF]' ? '[degR]' : code)
    if (atom) return { dimension: atom.dimension, factor: atom.factor, code: code === '[degF]' ? '[degR]' : code }
  }
  const unit = soleUnit(symbol)
  return unit ? { dimension: unit.dimension, factor: unit.factor, code: unit.code } : null
}
