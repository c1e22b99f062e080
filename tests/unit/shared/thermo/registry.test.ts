import { readdirSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { constantDefinitions } from '#shared/thermo/constants'
import { conventionFaults } from '#shared/thermo/conventions/closes'
import { conventions, defaultConvention } from '#shared/thermo/conventions/index'
import { evaluateQuantity, plainFormulae } from '#shared/thermo/evaluate'
import { findQuantity, quantities } from '#shared/thermo/registry'
import { findUnit, getUnit, isCommensurable } from '#shared/units/ucum'
import { randomSource, seedFromNumber } from '#shared/numerics/random'
import { slipRanges } from '#shared/marking/slips'
import { plausibleInputs, seededQuestion } from '../../../fixtures/marking/questions'

const constants = defaultConvention.constants
const formulae = { ...plainFormulae, variants: defaultConvention.variants }

describe('the registry', () => {
  it('lists every file of quantities/, under the key that its name spells', () => {
    const files = readdirSync(new URL('../../../../shared/thermo/quantities/', import.meta.url)).filter(name => name.endsWith('.ts'))
    const keys = files.map(name => name.replace(/\.ts$/, '').replace(/[A-Z]/g, letter => `-${letter.toLowerCase()}`))
    expect(quantities.map(one => one.key).sort()).toEqual(keys.sort())
  })
  it('has no key twice, and finds each', () => {
    expect(new Set(quantities.map(one => one.key)).size).toBe(quantities.length)
    for (const one of quantities) expect(findQuantity(one.key)).toBe(one)
    expect(findQuantity('toString')).toBeNull()
  })
})

describe.each(quantities.map(one => [one.key, one] as const))('%s', (_key, definition) => {
  it('repeats its example', () => {
    const outcome = evaluateQuantity(definition, definition.example.inputs, constants, defaultConvention.variants[definition.key], formulae)
    if (outcome.is === 'value') expect(Math.abs(outcome.value - Number(definition.example.gives))).toBeLessThanOrEqual(definition.example.within)
    else expect(outcome.is === 'class' ? outcome.key : outcome.is).toBe(definition.example.gives)
  })
  it('names units that there are, of one dimension inside and shown', () => {
    for (const { unit, shownUnit } of [definition, ...definition.inputs]) {
      expect(findUnit(shownUnit), shownUnit).not.toBeNull()
      expect(isCommensurable(getUnit(unit), getUnit(shownUnit))).toBe(true)
    }
  })
  it('has a trace for every variant whose last number is the value', () => {
    for (const variant of definition.variants) {
      const outcome = evaluateQuantity(definition, definition.example.inputs, constants, variant.key, formulae)
      const trace = definition.trace(definition.example.inputs, constants, variant.key, formulae)
      expect(trace.length).toBeGreaterThan(0)
      if (outcome.is === 'value') expect(trace[trace.length - 1]).toMatchObject({ value: outcome.value, unit: definition.unit })
      for (const step of trace) {
        expect(step.filled).not.toMatch(/NaN|undefined|Infinity/)
        expect((step.filled.match(/\{/g) ?? []).length).toBe((step.filled.match(/\}/g) ?? []).length)
      }
    }
  })
  it('names a source with its status for every variant, and only constants that conventions set', () => {
    for (const { source } of definition.variants) expect(source.text.length).toBeGreaterThan(10)
    for (const name of definition.constants) expect(name in constants || constantDefinitions.some(one => one.name === name && one.isOptional), name).toBe(true)
  })
  it('has slips that differ from the value and from each other', () => {
    expect(new Set(definition.slips.map(slip => slip.key)).size).toBe(definition.slips.length)
    let together = 0, made = 0
    for (let seed = 1; seed <= 20; seed++) {
      const { question } = seededQuestion(definition, seed)
      const outcome = evaluateQuantity(definition, question.inputs, constants)
      if (outcome.is !== 'value') continue
      const ranges = slipRanges(definition, question, question.inputs, outcome.value)
      for (const range of ranges) {
        made++
        if (ranges.some(other => other !== range && Math.abs(other.value - range.value) <= 1e-6 * Math.abs(range.value))) together++
      }
    }
    if (definition.slips.length > 0) expect(made).toBeGreaterThan(0)
    expect(together / Math.max(1, made)).toBeLessThan(0.05)
  })
  it('refuses what is missing, not a number or out of range, naming the input', () => {
    for (const input of definition.inputs) {
      const inputs = { ...plausibleInputs(definition, randomSource(seedFromNumber(3))), ...definition.example.inputs }
      const wrong = (value: number) => (input.shape === 'series' ? [value, value, value] : value)
      for (const value of [NaN, Infinity, -Infinity, input.range[1] * 2 + 1, input.range[0] - 1e9]) {
        expect(() => evaluateQuantity(definition, { ...inputs, [input.name]: wrong(value) }, constants), `${input.name} = ${value}`).toThrow(input.name)
      }
      if (!input.isOptional) {
        const without = Object.fromEntries(Object.entries(inputs).filter(([name]) => name !== input.name))
        expect(() => evaluateQuantity(definition, without, constants)).toThrow(`${input.name} is missing`)
      }
    }
    expect(() => evaluateQuantity(definition, { ...definition.example.inputs, nothing: 1 }, constants)).toThrow('nothing is not an input')
    expect(() => evaluateQuantity(definition, definition.example.inputs, constants, 'no-such')).toThrow('variant')
  })
})

describe('conventions', () => {
  it.each(conventions.map(one => [one.key, one] as const))('%s closes with every alternative', (_key, convention) => {
    expect(conventionFaults(convention)).toEqual([])
  })
  it.each(conventions.map(one => [one.key, one] as const))('%s names quantities and formulae that there are', (_key, convention) => {
    for (const variants of [convention.variants, ...convention.accepted.map(one => one.variants ?? {})]) {
      for (const [quantity, variant] of Object.entries(variants)) expect(findQuantity(quantity)?.variants.map(one => one.key) ?? [], quantity).toContain(variant)
    }
  })
  it('lets the value depend on the convention: θ of 20 °C at 850 hPa, by κ', () => {
    const theta = findQuantity('potential-temperature')
    const by = (key: string) => {
      const convention = conventions.find(one => one.key === key)
      const outcome = theta && convention ? evaluateQuantity(theta, { pressure: 85_000, temperature: 293.15 }, convention.constants, undefined, { variants: convention.variants, beyond: 'compute' }) : null
      return outcome?.is === 'value' ? outcome.value : NaN
    }
    // trap T3: 307.067 by 0.2854 … 307.093; 307.083 by 2/7
    expect(by('bolton-1980')).toBeCloseTo(293.15 * (1000 / 850) ** 0.2854, 9)
    expect(by('seven-halves')).toBeCloseTo(293.15 * (1000 / 850) ** (2 / 7), 9)
  })
  it('T9: 1004 / 717 / 287.05 does not close and is refused when it is saved', () => {
    const faults = conventionFaults({ constants: { ...constants, R: 287.05 }, accepted: [] })
    expect(faults).toHaveLength(1)
    expect(faults[0]).toContain('does not close: cp − cv is 287, R is 287.05')
  })
  it('refuses an alternative that does not close, a constant out of its range, and one that nothing uses', () => {
    expect(conventionFaults({ constants, accepted: [{ label: 'x', constants: { cp: 1005 } }] })[0]).toContain('The alternative "x" does not close')
    expect(conventionFaults({ constants: { ...constants, g: 98.1 }, accepted: [] })[0]).toContain('sets g to 98.1')
    expect(conventionFaults({ constants: { ...constants, foo: 1 }, accepted: [] })[0]).toContain('foo, which nothing uses')
    expect(conventionFaults({ constants: { ...constants, cp: NaN }, accepted: [] }).length).toBeGreaterThan(0)
  })
})
