/** Every coefficient of every empirical formula, planted wrong in the formula's own text: a published number has to see it. */
import { describe, expect, it } from 'vitest'
import { checkedFormulae, missesOf, type CheckedFormula } from '../../../fixtures/thermo/formulaChecks'
import { numbersBetween, withChanged, type NumberInText } from '../../../fixtures/thermo/changedSource'

/** 2 %, as with the constants; more where a term is so small that 2 % of it lie below every printed digit. */
const factors = [[0.98, 1.02], [0.9, 1.1], [0.5, 1.5], [-1, 3]] as const

async function seenAt(formula: CheckedFormula, number: NumberInText): Promise<number | null> {
  for (const [at, pair] of factors.entries()) {
    const misses = await Promise.all(pair.map(async factor => missesOf(formula, formula.find(await withChanged(formula.file, number, factor)))))
    if (misses.every(count => count > 0)) return at
  }
  return null
}

describe.each(checkedFormulae.map(formula => [formula.name, formula] as const))('%s', (_name, formula) => {
  const numbers = numbersBetween(formula.file, formula.from, formula.to)
  it('has coefficients, and gives every published number as it stands', async () => {
    expect(numbers.length).toBeGreaterThan(0)
    const [first] = numbers
    expect(first && missesOf(formula, formula.find(await withChanged(formula.file, first, 1)))).toBe(0)
  })
  it.each(numbers.map(number => [number.text, number] as const))('%s planted wrong turns a published check red', async (_text, number) => {
    const seen = await seenAt(formula, number)
    if (seen !== null && seen > 0) console.info(`${formula.name}: ${number.text} is seen at ${factors[seen]?.join(' and ')} times its value`)
    expect(seen).not.toBeNull()
  })
})
