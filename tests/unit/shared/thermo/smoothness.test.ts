/** Every number of every quantity: an input times 1 + 1e-6 moves it smoothly, on seeded states and not on the worked example alone. */
import { describe, expect, it } from 'vitest'
import { formulaeOf } from '#shared/marking/alternatives'
import { defaultConvention } from '#shared/thermo/conventions/index'
import type { Inputs, QuantityDefinition } from '#shared/thermo/definition'
import { evaluateQuantity } from '#shared/thermo/evaluate'
import { quantities } from '#shared/thermo/registry'
import { randomSource, seedFromNumber } from '#shared/numerics/random'
import { plausibleInputs } from '../../../fixtures/marking/questions'

const { constants } = defaultConvention, formulae = formulaeOf(defaultConvention)
/** So many states that have a value, of so many tried: on some there is no such level. */
const states = (definition: QuantityDefinition): number => (definition.key.includes('-parcel-') ? 2 : 6)
const mostTried = 60

function valueOf(definition: QuantityDefinition, inputs: Inputs): number | null {
  try {
    const found = evaluateQuantity(definition, inputs, constants, undefined, formulae)
    return found.is === 'value' ? found.value : null
  }
  catch {
    // a step beyond the range of an input
    return null
  }
}

/** One input, or the middle row of a series, times a factor. */
function moved(inputs: Inputs, name: string, factor: number): Inputs {
  const given = inputs[name]
  if (typeof given === 'number') return { ...inputs, [name]: given * factor }
  if (!Array.isArray(given)) return inputs
  const middle = Math.floor(given.length / 2)
  return { ...inputs, [name]: given.map((one: number, at) => (at === middle ? one * factor : one)) }
}

/**
 * How far f(x + 2h) − 2 f(x + h) + f(x) is from 0, over what a smooth function may leave: next to nothing beside the step itself and rounding.
 * A value that jumps, or that is solved for with too little care, leaves a hundred times as much.
 */
function roughness(at: number, one: number, two: number, size: number, bend: number): number {
  const first = one - at, next = two - one
  return Math.abs(next - first) / (bend * Math.max(Math.abs(first), Math.abs(next)) + (bend === bendOfSeries ? 5e-6 : 2e-10) * size)
}
/** What a smooth function may bend by over such a step. A row of temperature moves by 3e-4 K, which is no longer little beside residuals of 0.1 K. */
const bendOfNumber = 1e-3, bendOfSeries = 0.03

const numbers = quantities.filter(one => one.kind !== 'class' && one.inputs.length > 0)

describe('an input times 1 + 1e-6 moves the result smoothly', () => {
  it.each(numbers.map(one => [one.key, one] as const))('%s', (_key, definition) => {
    let checked = 0, found = 0
    const rough: string[] = []
    for (let seed = 1; seed <= mostTried && found < states(definition); seed++) {
      const inputs = plausibleInputs(definition, randomSource(seedFromNumber(4000 + seed)))
      const at = valueOf(definition, inputs)
      if (at === null) continue
      found++
      for (const { name, isForSlips, shape } of definition.inputs) {
        if (inputs[name] === undefined || isForSlips) continue
        const [one, two] = [1 + 1e-6, 1 + 2e-6].map(factor => valueOf(definition, moved(inputs, name, factor)))
        if (one === null || two === null || one === undefined || two === undefined) continue
        checked++
        // a direction next to north comes back as 360°
        const size = Math.max(Math.abs(at), definition.nearZero ?? 0, definition.kind === 'temperature' ? 273.15 : 0)
        if (!(roughness(at, one, two, size, shape === 'series' ? bendOfSeries : bendOfNumber) <= 1)) rough.push(`${name} (seed ${seed}): ${at}, ${one - at}, ${two - one}`)
      }
    }
    expect(rough).toEqual([])
    expect(checked).toBeGreaterThan(0)
  })
  it('and the measure sees a jump, and a solution of 1e-5 only', () => {
    expect(roughness(290, 290, 290.1, 290, bendOfSeries)).toBeGreaterThan(10)
    expect(roughness(290, 290.000_29, 290.000_29 * 2 - 290 + 1e-5, 290, bendOfNumber)).toBeGreaterThan(10)
    expect(roughness(290, 290.000_29, 290.000_58, 290, bendOfNumber)).toBeLessThan(1)
  })
})
