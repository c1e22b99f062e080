/**
 * Pairs of doubles whose unevaluated sum carries about 106 bits. Only + − × ÷ and the square root, so every engine gives the same bits.
 * Source: Dekker (1971), Numer. Math. 18, 224–242 (sums and products without error); common practice.
 */
export interface Pair { readonly hi: number, readonly lo: number }

const splitter = 134217729 // 2²⁷ + 1

/** The error of a + b: a + b = sum + error, exactly. */
export function sumError(a: number, b: number, sum: number): number {
  const back = sum - a
  return (a - (sum - back)) + (b - back)
}

/** The error of a · b: a · b = product + error, exactly where neither is beyond 2⁹⁷⁰. */
export function productError(a: number, b: number, product: number): number {
  let scaled = splitter * a
  const aHi = scaled - (scaled - a), aLo = a - aHi
  scaled = splitter * b
  const bHi = scaled - (scaled - b), bLo = b - bHi
  return ((aHi * bHi - product) + aHi * bLo + aLo * bHi) + aLo * bLo
}

export const pair = (hi: number, lo = 0): Pair => ({ hi, lo })

function settle(hi: number, lo: number): Pair {
  const sum = hi + lo
  return { hi: sum, lo: lo - (sum - hi) }
}

export function add(a: Pair, b: Pair): Pair {
  const sum = a.hi + b.hi
  const low = a.lo + b.lo
  const first = settle(sum, sumError(a.hi, b.hi, sum) + low)
  return settle(first.hi, first.lo + sumError(a.lo, b.lo, low))
}

export function multiply(a: Pair, b: Pair): Pair {
  const product = a.hi * b.hi
  return settle(product, productError(a.hi, b.hi, product) + (a.hi * b.lo + a.lo * b.hi))
}

export function divide(a: Pair, b: Pair): Pair {
  const first = a.hi / b.hi
  const rest = add(a, multiply(pair(-first), b))
  const second = rest.hi / b.hi
  const left = add(rest, multiply(pair(-second), b))
  return add(settle(first, second), pair(left.hi / b.hi))
}

export function squareRoot(a: Pair): Pair {
  const root = Math.sqrt(a.hi)
  const rest = add(a, multiply(pair(-root), pair(root)))
  const better = add(pair(root), pair(rest.hi / (2 * root)))
  const left = add(a, multiply(pair(-better.hi, -better.lo), better))
  return add(better, pair(left.hi / (2 * root)))
}
