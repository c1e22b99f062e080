/** Exact fractions of whole numbers: conversions and band edges carry no rounding of their own. */
export interface Rational { readonly numerator: bigint, readonly denominator: bigint }

function wholePower(base: bigint, exponent: number): bigint {
  let product = 1n
  for (let n = 0; n < exponent; n++) product *= base
  return product
}

const tens: bigint[] = [1n]
/** 10 to a whole number that is not negative. */
export function tenTo(exponent: number): bigint {
  for (let n = tens.length; n <= exponent; n++) tens.push((tens[n - 1] ?? 1n) * 10n)
  return tens[exponent] ?? 1n
}

function divisor(a: bigint, b: bigint): bigint {
  let [x, y] = [a < 0n ? -a : a, b]
  while (y !== 0n) [x, y] = [y, x % y]
  return x
}

export function rational(numerator: bigint, denominator = 1n): Rational {
  if (denominator === 0n) throw new Error('a fraction needs a denominator')
  const sign = denominator < 0n ? -1n : 1n
  const common = divisor(numerator, denominator * sign)
  return { numerator: sign * numerator / common, denominator: sign * denominator / common }
}

export const zero = rational(0n)
export const one = rational(1n)
export const plus = (a: Rational, b: Rational): Rational => rational(a.numerator * b.denominator + b.numerator * a.denominator, a.denominator * b.denominator)
export const minus = (a: Rational, b: Rational): Rational => rational(a.numerator * b.denominator - b.numerator * a.denominator, a.denominator * b.denominator)
export const times = (a: Rational, b: Rational): Rational => rational(a.numerator * b.numerator, a.denominator * b.denominator)
export const over = (a: Rational, b: Rational): Rational => rational(a.numerator * b.denominator, a.denominator * b.numerator)
export const absolute = (a: Rational): Rational => (a.numerator < 0n ? { numerator: -a.numerator, denominator: a.denominator } : a)

/** −1, 0 or 1. */
export function compare(a: Rational, b: Rational): number {
  const difference = a.numerator * b.denominator - b.numerator * a.denominator
  return difference < 0n ? -1 : difference > 0n ? 1 : 0
}

export function power(base: Rational, exponent: number): Rational {
  const size = Math.abs(exponent)
  return exponent >= 0
    ? rational(wholePower(base.numerator, size), wholePower(base.denominator, size))
    : rational(wholePower(base.denominator, size), wholePower(base.numerator, size))
}

/** A decimal such as -12.50e3; null where the text is none. At most 400 digits and an exponent of at most 400. */
export function fromDecimal(text: string): Rational | null {
  const match = /^([+-]?)(\d{0,200})(?:\.(\d{0,200}))?(?:[eE]([+-]?\d{1,6}))?$/.exec(text)
  if (!match) return null
  const [, sign = '', whole = '', decimals = '', exponent = '0'] = match
  if (whole + decimals === '') return null
  const shift = Number(exponent) - decimals.length
  if (Math.abs(shift) > 800) return null
  const digits = BigInt(`${sign === '-' ? '-' : ''}${whole}${decimals}`)
  return shift >= 0 ? rational(digits * tenTo(shift)) : rational(digits, tenTo(-shift))
}

const view = new DataView(new ArrayBuffer(8))

/** The exact value of a double. */
export function fromDouble(value: number): Rational {
  if (!Number.isFinite(value)) throw new Error(`${String(value)} is no fraction`)
  view.setFloat64(0, value)
  const bits = view.getBigUint64(0)
  const exponent = Number((bits >> 52n) & 0x7FFn)
  const fraction = bits & 0xFFFFFFFFFFFFFn
  const mantissa = exponent === 0 ? fraction : fraction | 0x10000000000000n
  const shift = Math.max(exponent, 1) - 1075
  const signed = value < 0 ? -mantissa : mantissa
  return shift >= 0 ? rational(signed << BigInt(shift)) : rational(signed, 1n << BigInt(-shift))
}

/** The nearest double. */
export function toDouble(value: Rational): number {
  if (value.numerator === 0n) return 0
  return Number(toDecimal(value, 40))
}

/** The exponent of the leading decimal digit: 0 for 9.8, 3 for 1013, −1 for 0.5. */
export function leadingExponent(value: Rational): number {
  const size = value.numerator < 0n ? -value.numerator : value.numerator
  if (size === 0n) return 0
  let guess = size.toString().length - value.denominator.toString().length
  // guess is right or one too high
  const atLeast = guess >= 0 ? compare({ numerator: size, denominator: value.denominator }, rational(tenTo(guess))) >= 0
    : compare({ numerator: size, denominator: value.denominator }, rational(1n, tenTo(-guess))) >= 0
  if (!atLeast) guess -= 1
  return guess
}

export type Rounding = 'down' | 'up' | 'half'

/** A whole multiple of 10^place as text: "9.80" for place −2. Down is towards −∞, up towards +∞, half away from zero. */
export function toPlace(value: Rational, place: number, rounding: Rounding = 'half'): string {
  const scaled = place <= 0 ? rational(value.numerator * tenTo(-place), value.denominator) : rational(value.numerator, value.denominator * tenTo(place))
  let whole = scaled.numerator / scaled.denominator
  const rest = scaled.numerator - whole * scaled.denominator
  if (rest !== 0n) {
    if (rounding === 'down' && rest < 0n) whole -= 1n
    if (rounding === 'up' && rest > 0n) whole += 1n
    if (rounding === 'half' && 2n * (rest < 0n ? -rest : rest) >= scaled.denominator) whole += rest < 0n ? -1n : 1n
  }
  const sign = whole < 0n ? '-' : ''
  let digits = (whole < 0n ? -whole : whole).toString()
  if (place >= 0) return `${sign}${digits}${whole === 0n ? '' : '0'.repeat(place)}`
  digits = digits.padStart(1 - place, '0')
  return `${sign}${digits.slice(0, place)}.${digits.slice(place)}`
}

/** A decimal without loss where it has one of at most `digits` significant digits, else rounded to so many. */
export function toDecimal(value: Rational, digits: number): string {
  const text = toPlace(value, leadingExponent(value) - digits + 1)
  return text.includes('.') ? text.replace(/0+$/, '').replace(/\.$/, '') : text
}
