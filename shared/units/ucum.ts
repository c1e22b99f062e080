/**
 * Units by their UCUM codes (ucum.org, case-sensitive), with exact factors to SI. Codes are what is stored and asked; what people type is
 * another language (`readUnit.ts`). Source of the factors: UCUM 2.1, table of base and derived unit atoms; exact by definition.
 */
import { fromDecimal, one, over, plus, minus, power, rational, times, zero, type Rational } from '../numerics/rational'
import { combine, isSame, none, type Dimension } from './dimension'

export interface Unit {
  /** UCUM code. */
  code: string
  dimension: Dimension
  /** SI value = number · factor + offset. */
  factor: Rational
  /** Not zero only for °C and °F as temperatures. */
  offset: Rational
}

interface Atom { dimension: Dimension, factor: Rational, offset?: Rational, takesPrefix?: true }

const decimal = (text: string): Rational => fromDecimal(text) ?? zero
const length: Dimension = [1, 0, 0, 0, 0], mass: Dimension = [0, 1, 0, 0, 0], time: Dimension = [0, 0, 1, 0, 0], temperature: Dimension = [0, 0, 0, 1, 0]
const pressure: Dimension = [-1, 1, -2, 0, 0], energy: Dimension = [2, 1, -2, 0, 0]
const foot = decimal('0.3048')
const fahrenheitStep = rational(5n, 9n)

const atoms: Readonly<Record<string, Atom>> = {
  'm': { dimension: length, factor: one, takesPrefix: true },
  'g': { dimension: mass, factor: decimal('0.001'), takesPrefix: true },
  's': { dimension: time, factor: one, takesPrefix: true },
  'K': { dimension: temperature, factor: one, takesPrefix: true },
  'mol': { dimension: [0, 0, 0, 0, 1], factor: one, takesPrefix: true },
  'Cel': { dimension: temperature, factor: one, offset: decimal('273.15') },
  '[degF]': { dimension: temperature, factor: fahrenheitStep, offset: times(decimal('459.67'), fahrenheitStep) },
  // a step of °F: a scale with an offset cannot stand in a compound
  '[degR]': { dimension: temperature, factor: fahrenheitStep },
  'Pa': { dimension: pressure, factor: one, takesPrefix: true },
  'bar': { dimension: pressure, factor: decimal('100000'), takesPrefix: true },
  'atm': { dimension: pressure, factor: decimal('101325') },
  'm[Hg]': { dimension: pressure, factor: decimal('133322'), takesPrefix: true },
  '[in_i\'Hg]': { dimension: pressure, factor: times(decimal('133322'), decimal('0.0254')) },
  '[psi]': { dimension: pressure, factor: over(times(decimal('0.45359237'), decimal('9.80665')), times(decimal('0.0254'), decimal('0.0254'))) },
  'J': { dimension: energy, factor: one, takesPrefix: true },
  'cal': { dimension: energy, factor: decimal('4.184'), takesPrefix: true },
  'W': { dimension: [2, 1, -3, 0, 0], factor: one, takesPrefix: true },
  'N': { dimension: [1, 1, -2, 0, 0], factor: one, takesPrefix: true },
  'Hz': { dimension: [0, 0, -1, 0, 0], factor: one, takesPrefix: true },
  'L': { dimension: [3, 0, 0, 0, 0], factor: decimal('0.001'), takesPrefix: true },
  'min': { dimension: time, factor: decimal('60') },
  'h': { dimension: time, factor: decimal('3600') },
  'd': { dimension: time, factor: decimal('86400') },
  '[ft_i]': { dimension: length, factor: foot },
  '[in_i]': { dimension: length, factor: decimal('0.0254') },
  '[mi_i]': { dimension: length, factor: decimal('1609.344') },
  '[nmi_i]': { dimension: length, factor: decimal('1852') },
  '[kn_i]': { dimension: [1, 0, -1, 0, 0], factor: over(decimal('1852'), decimal('3600')) },
  '[lb_av]': { dimension: mass, factor: decimal('0.45359237') },
  '%': { dimension: none, factor: decimal('0.01') },
  '[ppth]': { dimension: none, factor: decimal('0.001') },
  '[ppm]': { dimension: none, factor: decimal('0.000001') },
  'rad': { dimension: none, factor: one },
  // π to 40 digits: an angle in degrees is the one unit here whose factor is not exact
  'deg': { dimension: none, factor: over(decimal('3.141592653589793238462643383279502884197'), decimal('180')) },
}

const prefixes: Readonly<Record<string, Rational>> = {
  G: decimal('1000000000'), M: decimal('1000000'), k: decimal('1000'), h: decimal('100'), da: decimal('10'),
  d: decimal('0.1'), c: decimal('0.01'), m: decimal('0.001'), u: decimal('0.000001'), n: decimal('0.000000001'),
}

/** An atom with its prefix: km, hPa, Cel. Null where there is none. */
export function findAtom(code: string): Atom | null {
  const plain = Object.hasOwn(atoms, code) ? atoms[code] : undefined
  if (plain) return plain
  for (const [prefix, factor] of Object.entries(prefixes)) {
    if (!code.startsWith(prefix)) continue
    const rest = code.slice(prefix.length)
    const atom = Object.hasOwn(atoms, rest) ? atoms[rest] : undefined
    if (atom?.takesPrefix) return { dimension: atom.dimension, factor: times(factor, atom.factor) }
  }
  return null
}

const read = new Map<string, Unit | null>()

/**
 * A unit by its UCUM code; null where it is none. A temperature scale with an offset stands alone: K/km, not Cel/km.
 * @example findUnit('J/(kg.K)')
 */
export function findUnit(code: string): Unit | null {
  const known = read.get(code)
  if (known !== undefined) return known
  const unit = code.length <= 60 ? new CodeReader(code).unit() : null
  if (read.size < 1000) read.set(code, unit)
  return unit
}

/** A code that the product itself wrote. @throws {Error} where it is none */
export function getUnit(code: string): Unit {
  const unit = findUnit(code)
  if (!unit) throw new Error(`no unit has the code ${code}`)
  return unit
}

/** term := component (('.' | '/') component)*, strictly from left to right, as UCUM has it. */
class CodeReader {
  private at = 0
  constructor(private readonly code: string) {}

  unit(): Unit | null {
    if (this.code === '1') return { code: '1', dimension: none, factor: one, offset: zero }
    const whole = findAtom(this.code)
    if (whole) return { code: this.code, dimension: whole.dimension, factor: whole.factor, offset: whole.offset ?? zero }
    const result = this.term()
    return result && this.at === this.code.length ? { code: this.code, ...result, offset: zero } : null
  }

  private term(): { dimension: Dimension, factor: Rational } | null {
    let sign = 1
    if (this.code[this.at] === '/') {
      sign = -1
      this.at++
    }
    let dimension: Dimension = none
    let factor = one
    for (;;) {
      const part = this.component()
      if (!part) return null
      dimension = combine(dimension, part.dimension, sign)
      factor = sign > 0 ? times(factor, part.factor) : over(factor, part.factor)
      const operator = this.code[this.at]
      if (operator !== '.' && operator !== '/') return { dimension, factor }
      sign = operator === '/' ? -1 : 1
      this.at++
    }
  }

  private component(): { dimension: Dimension, factor: Rational } | null {
    if (this.code[this.at] === '(') {
      this.at++
      const inner = this.term()
      if (!inner || this.code[this.at] !== ')') return null
      this.at++
      return inner
    }
    const rest = this.code.slice(this.at)
    const digits = /^\d{1,9}/.exec(rest)?.[0]
    if (digits !== undefined) {
      this.at += digits.length
      return digits === '0'.repeat(digits.length) ? null : { dimension: none, factor: decimal(digits) }
    }
    const match = /^(\[[A-Za-z_']+\]|%|[A-Za-z]+(?:\[[A-Za-z_']+\])?)([+-]?\d)?/.exec(rest)
    if (!match) return null
    const [all, symbol = '', exponentText] = match
    const atom = findAtom(symbol)
    if (!atom || atom.offset) return null
    const exponent = exponentText === undefined ? 1 : Number(exponentText)
    if (exponent === 0) return null
    this.at += all.length
    return { dimension: combine(none, atom.dimension, exponent), factor: power(atom.factor, exponent) }
  }
}

/** A number in a unit as an exact SI value; a difference leaves the offset out. */
export function toSi(value: Rational, unit: Unit, isDifference: boolean): Rational {
  const scaled = times(value, unit.factor)
  return isDifference ? scaled : plus(scaled, unit.offset)
}

export function fromSi(value: Rational, unit: Unit, isDifference: boolean): Rational {
  return over(isDifference ? value : minus(value, unit.offset), unit.factor)
}

export const isCommensurable = (a: Unit, b: Unit): boolean => isSame(a.dimension, b.dimension)
