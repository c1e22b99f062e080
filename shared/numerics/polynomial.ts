/**
 * A polynomial by least squares, and its standard errors: the normal equations of scaled powers in pairs of doubles, which hold twice the digits.
 *
 * Source: common practice. Agrees with NIST StRD (Pontius, quadratic; NoInt1, through the origin) to 1e-9 and better in the test.
 */
import { add, divide, multiply, pair, squareRoot, type Pair } from './doubleDouble'

export interface Polynomial {
  /** From the constant upwards. */
  coefficients: readonly number[]
  errors: readonly number[] | null
  residualDeviation: number | null
  count: number
}

const minus = (a: Pair): Pair => pair(-a.hi, -a.lo)
const root = (a: Pair): Pair => (a.hi > 0 ? squareRoot(a) : pair(0))
const value = (a: Pair): number => a.hi + a.lo

/**
 * Null where none is determined: fewer points than coefficients, or too few different x. With `throughOrigin` there is no constant term.
 * @example polynomialFit([0, 1, 2], [1, 2, 5], 2)?.coefficients // [1, 0, 1]
 */
export function polynomialFit(x: readonly number[], y: readonly number[], degree: number, throughOrigin = false): Polynomial | null {
  const count = x.length, first = throughOrigin ? 1 : 0, terms = degree + 1 - first
  if (count < terms || y.length !== count || terms < 1) return null
  const scale = Math.max(...x.map(Math.abs))
  if (!(scale > 0) || !Number.isFinite(scale)) return null
  const powers = x.map((one) => {
    const scaled = divide(pair(one), pair(scale))
    const row: Pair[] = [pair(1)]
    for (let n = 1; n <= degree; n++) row.push(multiply(row[n - 1] ?? pair(1), scaled))
    return row.slice(first)
  })
  const solved = solveNormal(powers, y.map(one => pair(one)), terms)
  if (!solved) return null
  const back = (at: number): Pair => {
    let factor = pair(1)
    for (let n = 0; n < at + first; n++) factor = multiply(factor, pair(scale))
    return factor
  }
  const coefficients = solved.solution.map((one, at) => value(divide(one, back(at))))
  let squares = pair(0)
  powers.forEach((row, at) => {
    let residual = pair(y[at] ?? 0)
    row.forEach((power, term) => { residual = add(residual, minus(multiply(power, solved.solution[term] ?? pair(0)))) })
    squares = add(squares, multiply(residual, residual))
  })
  const free = count - terms
  const deviation = free > 0 ? root(divide(squares, pair(free))) : null
  return {
    coefficients: throughOrigin ? [0, ...coefficients] : coefficients,
    errors: deviation && [...(throughOrigin ? [0] : []), ...solved.inverseDiagonal.map((one, at) => value(divide(multiply(deviation, root(one)), back(at))))],
    residualDeviation: deviation && value(deviation),
    count,
  }
}

/** The normal equations in pairs of doubles (32 digits), by elimination with pivots; scaled powers keep them from losing more than half of those. */
function solveNormal(rows: readonly (readonly Pair[])[], right: readonly Pair[], terms: number): { solution: Pair[], inverseDiagonal: Pair[] } | null {
  const at = (row: readonly Pair[] | undefined, column: number): Pair => row?.[column] ?? pair(0)
  // [A | b | I]
  const table: Pair[][] = Array.from({ length: terms }, (_, i) => {
    const line: Pair[] = []
    for (let j = 0; j < terms; j++) line.push(rows.reduce((sum, row) => add(sum, multiply(at(row, i), at(row, j))), pair(0)))
    line.push(rows.reduce((sum, row, n) => add(sum, multiply(at(row, i), right[n] ?? pair(0))), pair(0)))
    for (let j = 0; j < terms; j++) line.push(pair(i === j ? 1 : 0))
    return line
  })
  for (let i = 0; i < terms; i++) {
    const pivot = at(table[i], i)
    if (!(Math.abs(pivot.hi) > 1e-25)) return null
    table[i] = (table[i] ?? []).map(one => divide(one, pivot))
    for (let k = 0; k < terms; k++) {
      if (k === i) continue
      const factor = at(table[k], i)
      table[k] = (table[k] ?? []).map((one, j) => add(one, minus(multiply(factor, at(table[i], j)))))
    }
  }
  return { solution: table.map(line => at(line, terms)), inverseDiagonal: table.map((line, i) => at(line, terms + 1 + i)) }
}
