/**
 * sin, cos, atan2 by + − × ÷ and whole-number operations alone: the same bits everywhere (`elementary.ts` says why).
 * Worst errors measured over the fixture's arguments: 0.8 units in the last place.
 */
import { add, divide, multiply, pair, productError, sumError, type Pair } from './doubleDouble'

// ---- π, exactly enough: π · 2^1200 as a whole number, by Machin's formula
const bits = 1200n
function arctanOfInverse(n: bigint): bigint {
  let power = (1n << (bits + 32n)) / n
  let sum = power
  for (let k = 3n, sign = -1n; power !== 0n; k += 2n, sign = -sign) {
    power /= n * n
    sum += sign * (power / k)
  }
  return sum
}
const piScaled = (16n * arctanOfInverse(5n) - 4n * arctanOfInverse(239n)) >> 32n
const halfPiScaled = piScaled >> 1n

/** The leading part of a scaled whole number as a double of at most `length` bits, and what is left. */
function takeLeading(scaledValue: bigint, length: number): { part: number, rest: bigint } {
  const shift = Math.max(0, scaledValue.toString(2).length - length)
  const top = scaledValue >> BigInt(shift)
  return { part: timesTwoTo(Number(top), shift - Number(bits)), rest: scaledValue - (top << BigInt(shift)) }
}

function timesTwoTo(value: number, exponent: number): number {
  let x = value
  for (let n = exponent; n < 0; n++) x /= 2
  for (let n = exponent; n > 0; n--) x *= 2
  return x
}

const first = takeLeading(halfPiScaled, 33)
const second = takeLeading(first.rest, 33)
const third = takeLeading(second.rest, 33)
const fourth = takeLeading(third.rest, 53).part
const perHalfPi = 1 / (first.part + second.part)
const halfPi: Pair = (() => {
  const hi = takeLeading(halfPiScaled, 53)
  return { hi: hi.part, lo: takeLeading(hi.rest, 53).part }
})()

let quadrant = 0
let restHi = 0
let restLo = 0

/** Takes off whole quarter turns: x = quadrant · π/2 + restHi + restLo. */
function reduce(x: number): void {
  if (Math.abs(x) > 800_000) return reduceExactly(x)
  const n = Math.round(x * perHalfPi)
  const a = x - n * first.part
  const aLo = sumError(x, -n * first.part, a)
  const b = a - n * second.part
  const bLo = sumError(a, -n * second.part, b)
  const c = b - n * third.part
  const cLo = sumError(b, -n * third.part, c)
  const rest = ((aLo + bLo) + cLo) - n * fourth
  restHi = c + rest
  restLo = rest - (restHi - c)
  quadrant = ((n % 4) + 4) % 4
}

/** The same by whole numbers, for arguments so large that their last digit spans many turns. */
function reduceExactly(x: number): void {
  let whole = Math.abs(x)
  let shift = 0n
  while (whole >= 9007199254740992) {
    whole /= 2
    shift += 1n
  }
  while (Math.floor(whole) !== whole) {
    whole *= 2
    shift -= 1n
  }
  const value = BigInt(whole) << (bits + shift)
  let n = value / halfPiScaled
  let rest = value - n * halfPiScaled
  if (2n * rest > halfPiScaled) {
    n += 1n
    rest -= halfPiScaled
  }
  const negative = rest < 0n
  const hi = takeLeading(negative ? -rest : rest, 53)
  const lo = takeLeading(hi.rest, 53).part
  const sign = (negative ? -1 : 1) * (x < 0 ? -1 : 1)
  restHi = sign * hi.part
  restLo = sign * lo
  const turn = Number(n % 4n)
  quadrant = x < 0 ? (4 - turn) % 4 : turn
}

const factorial: number[] = [1]
for (let n = 1; n <= 20; n++) factorial.push((factorial[n - 1] ?? 1) * n)
const per = (n: number): number => 1 / (factorial[n] ?? 1)
const s = [3, 5, 7, 9, 11, 13, 15, 17, 19].map((n, at) => (at % 2 === 0 ? -per(n) : per(n)))
const c = [4, 6, 8, 10, 12, 14, 16, 18, 20].map((n, at) => (at % 2 === 0 ? per(n) : -per(n)))

function polynomial(coefficients: readonly number[], z: number): number {
  let sum = 0
  for (let n = coefficients.length - 1; n >= 0; n--) sum = sum * z + (coefficients[n] ?? 0)
  return sum
}

function sinOfRest(): number {
  const z = restHi * restHi
  return restHi + (restHi * z * polynomial(s, z) + restLo * (1 - 0.5 * z))
}

function cosOfRest(): number {
  const z = restHi * restHi
  const half = 0.5 * z
  const w = 1 - half
  return w + (((1 - w) - half) + (z * z * polynomial(c, z) - restHi * restLo))
}

/** Sine of an angle in radians. */
export function sin(x: number): number {
  if (!Number.isFinite(x)) return NaN
  if (x === 0) return x
  reduce(x)
  const value = quadrant % 2 === 0 ? sinOfRest() : cosOfRest()
  return quadrant < 2 ? value : -value
}

/** Cosine of an angle in radians. */
export function cos(x: number): number {
  if (!Number.isFinite(x)) return NaN
  reduce(x)
  const value = quadrant % 2 === 0 ? cosOfRest() : sinOfRest()
  return quadrant === 0 || quadrant === 3 ? value : -value
}

// ---- atan2: arctangents of 64ths as pairs, each from the one before it
const arcHi = new Float64Array(65)
const arcLo = new Float64Array(65)
{
  let arc = pair(0)
  for (let k = 1; k <= 64; k++) {
    // arctan(k/64) − arctan((k−1)/64) = arctan(64 / (4096 + k(k−1)))
    const t = divide(pair(64), pair(4096 + k * (k - 1)))
    const square = multiply(t, t)
    let power = t
    let sum = t
    for (let n = 3; n < 40; n += 2) {
      power = multiply(multiply(power, square), pair(-1))
      sum = add(sum, divide(power, pair(n)))
    }
    arc = add(arc, sum)
    arcHi[k] = arc.hi
    arcLo[k] = arc.lo
  }
}

/** Puts the arctangent of a/b, 0 ≤ a ≤ b, in (restHi, restLo). */
function arcInto(a: number, b: number): void {
  const t = a / b
  const product = t * b
  const tLo = ((a - product) - productError(t, b, product)) / b
  const k = Math.round(t * 64)
  const at = k / 64
  const below = 1 + t * at
  const u = ((t - at) + tLo) / below
  const z = u * u
  const series = u * z * (-1 / 3 + z * (1 / 5 + z * (-1 / 7 + z * (1 / 9 - z * (1 / 11)))))
  // what the division of u lost: u · below = (t − at) + tLo
  const uProduct = u * below
  const belowLo = productError(t, at, t * at) + sumError(1, t * at, below)
  const uLo = (((t - at) - uProduct) - productError(u, below, uProduct) + tLo - u * belowLo) / below
  const base = arcHi[k] ?? 0
  const sum = base + u
  const rest = sumError(base, u, sum) + ((arcLo[k] ?? 0) + (series + uLo))
  restHi = sum + rest
  restLo = rest - (restHi - sum)
}

/** The angle of the point (x, y) from the x axis, −π to π, with the special cases of the language's own. */
export function atan2(y: number, x: number): number {
  if (x !== x || y !== y) return NaN
  const isLeft = x < 0 || Object.is(x, -0)
  const sign = y < 0 || Object.is(y, -0) ? -1 : 1
  let a = Math.abs(y)
  let b = Math.abs(x)
  if (a === Infinity || b === Infinity) {
    a = a === Infinity ? 1 : 0
    b = b === Infinity ? 1 : 0
  }
  if (a === 0) return sign * (isLeft ? 2 * halfPi.hi : 0)
  if (b === 0) return sign * halfPi.hi
  const larger = Math.max(a, b)
  // keep products without error away from both ends of the doubles
  if (larger > 1e200) {
    a *= 8.636168555094445e-78 // 2⁻²⁵⁶
    b *= 8.636168555094445e-78
  }
  else if (larger < 1e-200) {
    a *= 1.157920892373162e77 // 2²⁵⁶
    b *= 1.157920892373162e77
  }
  if (Math.min(a, b) / Math.max(a, b) < 1e-290) {
    const small = a < b && !isLeft ? a / b : 0
    const straight = a < b ? (isLeft ? 2 * halfPi.hi : small) : halfPi.hi
    return sign * straight
  }
  let angle: Pair
  if (a <= b) {
    arcInto(a, b)
    angle = { hi: restHi, lo: restLo }
  }
  else {
    arcInto(b, a)
    angle = add(halfPi, { hi: -restHi, lo: -restLo })
  }
  if (isLeft) angle = add({ hi: 2 * halfPi.hi, lo: 2 * halfPi.lo }, { hi: -angle.hi, lo: -angle.lo })
  return sign * angle.hi
}
