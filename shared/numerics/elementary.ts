/**
 * exp, log, log10, pow: by + − × ÷ and comparisons alone, so that a mark comes out the same on every engine and platform.
 * The language leaves `Math.exp` and its kin to the engine; they differ between releases and processors.
 *
 * exp: 128 powers of 2^(1/128) as pairs of doubles, and a short series. log: 91 logarithms as pairs, and a series in pairs; pow: exp of y · log x
 * with the logarithm in pairs. The tables are made at loading by the same operations. Worst errors measured over the fixture's arguments are
 * asserted in the test: exp 0.52, log 0.51, log10 0.52, pow 0.52 units in the last place (normal results).
 */
import { add, divide, multiply, pair, productError, squareRoot, sumError, type Pair } from './doubleDouble'

const steps = 128

/** The logarithm of 1 + t by 2 artanh(t / (2 + t)) in pairs. */
function pairedLog(numerator: number, denominator: number): Pair {
  const t = divide(pair(numerator - denominator), pair(numerator + denominator))
  const square = multiply(t, t)
  let power = t
  let sum = t
  for (let n = 3; n < 200; n += 2) {
    power = multiply(power, square)
    if (Math.abs(power.hi) < 1e-36) break
    sum = add(sum, divide(power, pair(n)))
  }
  return multiply(pair(2), sum)
}

export const ln2: Pair = pairedLog(2, 1)
const ln10: Pair = add(multiply(pair(3), ln2), pairedLog(10, 8))
const perLn10: Pair = divide(pair(1), ln10)

/** The leading `bits` of a double: products with small integers are then exact. */
function leading(value: number, bits: number): number {
  let scale = 1
  for (let n = bits; n < 53; n++) scale *= 2
  const big = value * (scale + 1)
  return big - (big - value)
}

// ---- powers of two, exactly: twoTo(n) for −1074 ≤ n ≤ 1023
const powers = new Float64Array(2098)
for (let n = 0, up = 1; n <= 1023; n++, up *= 2) powers[n + 1074] = up
for (let n = 0, down = 1; n <= 1074; n++, down /= 2) powers[1074 - n] = down
const twoTo = (n: number): number => powers[n + 1074] ?? 0

function scaled(value: number, n: number): number {
  if (n > 1023) return value * twoTo(1023) * twoTo(n - 1023)
  if (n < -1022) return value * twoTo(n + 54) * twoTo(-54)
  return value * twoTo(n)
}

// ---- exp
const rootHi = new Float64Array(steps)
const rootLo = new Float64Array(steps)
{
  let root = pair(2)
  for (let n = 1; n < steps; n *= 2) root = squareRoot(root)
  let power = pair(1)
  for (let j = 0; j < steps; j++) {
    rootHi[j] = power.hi
    rootLo[j] = power.lo
    power = multiply(power, root)
  }
}
const stepOf: Pair = { hi: ln2.hi / steps, lo: ln2.lo / steps }
const stepHi = leading(stepOf.hi, 32)
const stepLo = (stepOf.hi - stepHi) + stepOf.lo
const perStep = 1 / stepOf.hi

/** 1.5 · 2⁵²: added and taken off again it leaves the nearest whole number, without a call. */
const toWhole = 6755399441055744

/** e^r · 2^(whole/128) for a small r. */
function raised(r: number, whole: number): number {
  const series = r + r * r * (1 / 2 + r * (1 / 6 + r * (1 / 24 + r * (1 / 120 + r * (1 / 720)))))
  // in 32 bits, on which engines are quick: |whole| < 138,000
  const k = whole | 0
  const j = k & (steps - 1), n = k >> 7
  const root = rootHi[j] ?? 1, rest = rootLo[j] ?? 0
  if (n < -900 || n > 1000) return scaled(root + (rest + root * series), n)
  // a power of two changes no bit but the exponent's, so it can go in before the series is known
  const power = powers[n + 1074] ?? 0, scaledRoot = root * power
  return scaledRoot + (rest * power + scaledRoot * series)
}

/** exp(hi + lo) for |hi| < 746. */
function expOf(hi: number, lo: number): number {
  const whole = (hi * perStep + toWhole) - toWhole
  return raised(((hi - whole * stepHi) - whole * stepLo) + lo, whole)
}

/** e to the x. NaN gives NaN; beyond the doubles, Infinity or 0. */
export function exp(x: number): number {
  if (!(x < 709.782712893385)) return x !== x ? x : Infinity
  if (x < -745.14) return 0
  const whole = (x * perStep + toWhole) - toWhole
  return raised((x - whole * stepHi) - whole * stepLo, whole)
}

// ---- log
const least = 91, most = 181 // the nearest 128ths of √½ and √2
const logHi = new Float64Array(most + 1)
const logLo = new Float64Array(most + 1)
for (let k = least; k <= most; k++) {
  const value = k === steps ? pair(0) : pairedLog(k, steps)
  logHi[k] = value.hi
  logLo[k] = value.lo
}
const ln2Hi = leading(ln2.hi, 40)
const ln2Lo = (ln2.hi - ln2Hi) + ln2.lo

const words = new Float64Array(1)
const halves = new Uint32Array(words.buffer)
words[0] = 1
const high = halves[1] === 0x3FF00000 ? 1 : 0

/** The logarithm's leading part and what is left: in an array, because a number that a module keeps in a variable is allocated anew at each change. */
const result = new Float64Array(2)

/** Puts log x in `result`, with about 66 good bits; x, positive and finite, stands in `words`, because a number that is handed to a function too large to be put into its caller is allocated too. */
function logIntoResult(): void {
  let e = 0
  let positive = words[0] ?? 0
  if (positive < 2.2250738585072014e-308) {
    positive *= 18014398509481984 // 2⁵⁴
    words[0] = positive
    e = -54
  }
  const power = ((halves[high] ?? 0) >>> 20) - 1023
  e = (e + power) | 0
  // exact: a power of two
  let m = positive * (powers[1074 - power] ?? 0)
  if (m > 1.4142135623730951) {
    m *= 0.5
    e = (e + 1) | 0
  }
  // the nearest 128th; what is added to is positive and exact, so that cutting off rounds
  const k = (m * steps + 0.5) | 0
  const c = k * (1 / steps)
  const d = m - c
  const r = d / c
  const rTop = leading27(r)
  const rLo = ((d - rTop * c) - (r - rTop) * c) / c
  const square = r * r
  const squareLo = productError(r, r, square) + 2 * r * rLo
  const series = square * r * (1 / 3 - r * (1 / 4 - r * (1 / 5 - r * (1 / 6 - r * (1 / 7 - r * (1 / 8 - r * (1 / 9 - r * (1 / 10))))))))
  const tableHi = logHi[k] ?? 0
  const a = e * ln2Hi + tableHi
  const aLo = sumError(e * ln2Hi, tableHi, a)
  const b = a + r
  const bLo = sumError(a, r, b)
  const half = -0.5 * square
  const sum = b + half
  const sumLo = sumError(b, half, sum)
  const rest = (((aLo + bLo) + sumLo) + (e * ln2Lo + (logLo[k] ?? 0))) + ((rLo - 0.5 * squareLo) + series)
  const leadingPart = sum + rest
  result[0] = leadingPart
  result[1] = rest - (leadingPart - sum)
}

function leading27(value: number): number {
  const big = value * 134217729
  return big - (big - value)
}

/** The natural logarithm. Below zero NaN, at zero −Infinity. */
export function log(x: number): number {
  if (!(x > 0)) return x === 0 ? -Infinity : NaN
  if (x === Infinity) return x
  words[0] = x
  logIntoResult()
  return result[0] ?? 0
}

/** The logarithm to base 10. */
export function log10(x: number): number {
  if (!(x > 0)) return x === 0 ? -Infinity : NaN
  if (x === Infinity) return x
  words[0] = x
  logIntoResult()
  const hi = result[0] ?? 0, lo = result[1] ?? 0
  const product = hi * perLn10.hi
  return product + (productError(hi, perLn10.hi, product) + (hi * perLn10.lo + lo * perLn10.hi))
}

/** x to the y, with the special cases of the language's own. Short, so that engines put it into the formula that calls it. */
export function pow(x: number, y: number): number {
  if (!(x > 0 && x < Infinity && y > -Infinity && y < Infinity) || y === 0 || y === 1 || x === 1) return specialPower(x, y)
  return powerOf(x, y)
}

/** x to the y for a positive finite x and a finite y. */
function powerOf(x: number, y: number): number {
  words[0] = x
  logIntoResult()
  const hi = result[0] ?? 0
  const exponent = y * hi
  if (exponent > 709.79) return Infinity
  if (exponent < -745.2) return 0
  return expOf(exponent, productError(y, hi, exponent) + y * (result[1] ?? 0))
}

/** Powers of what is not positive and finite, and those that need no computing. */
function specialPower(x: number, y: number): number {
  if (y === 0) return 1
  if (x !== x || y !== y) return NaN
  if (y === Infinity || y === -Infinity) {
    const size = Math.abs(x)
    if (size === 1) return NaN
    return (size > 1) === (y > 0) ? Infinity : 0
  }
  const isWhole = Math.abs(y) >= 9007199254740992 || Math.floor(y) === y
  const isOdd = isWhole && Math.abs(y) < 9007199254740992 && Math.abs(y % 2) === 1
  const isNegative = x < 0 || Object.is(x, -0)
  const size = Math.abs(x)
  const sign = isNegative && isOdd ? -1 : 1
  if (size === 0) return y > 0 ? sign * 0 : sign * Infinity
  if (size === Infinity) return y > 0 ? sign * Infinity : sign * 0
  if (isNegative && !isWhole) return NaN
  if (size === 1) return sign
  if (y === 1) return x
  return sign * powerOf(size, y)
}
