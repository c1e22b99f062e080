import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { log } from '#shared/numerics/elementary'
import { defaultConvention } from '#shared/thermo/conventions/index'
import type { Inputs, QuantityDefinition } from '#shared/thermo/definition'
import { evaluateQuantity } from '#shared/thermo/evaluate'
import { findQuantity, quantities } from '#shared/thermo/registry'
import { uncertaintyBudget } from '#shared/thermo/uncertainty/budget'
import { correlationRoot, simulate, simulateQuantity } from '#shared/thermo/uncertainty/monteCarlo'
import { derivative, propagate } from '#shared/thermo/uncertainty/propagate'
import type { GivenCorrelation, GivenUncertainties } from '#shared/thermo/uncertainty/uncertainInputs'

const constants = defaultConvention.constants
function definitionOf(key: string): QuantityDefinition {
  const definition = findQuantity(key)
  if (!definition) throw new Error(key)
  return definition
}
const budget = (key: string, inputs: Inputs, u: GivenUncertainties, correlations: readonly GivenCorrelation[] = [], coverage = 0.95) => uncertaintyBudget(definitionOf(key), inputs, u, constants, { correlations, coverage })
const air: Inputs = { pressure: 101_325, temperature: 298.15 }
const layer: Inputs = { height: [100, 150, 200, 250, 300], temperature: [288.15, 287.75, 287.25, 286.85, 286.05] }

describe('examples of the docstrings', () => {
  it('give what they say', () => {
    expect(derivative(([x = 0]) => x * x, [{ value: 3, standard: 0.1 }], 0)).toBeCloseTo(6, 10)
    expect(propagate(([a = 0, b = 0]) => a - b, [{ value: 20, standard: 0.1 }, { value: 15, standard: 0.1 }], () => 1).standard).toBe(0)
    expect(budget('density', air, { pressure: { standard: 50 }, temperature: { standard: 0.2 } }).standard).toBeCloseTo(0.00099, 5)
  })
})

describe('propagation of uncertainty', () => {
  it('of a product is that of its relative parts (closed form)', () => {
    const { standard, parts } = budget('density', air, { pressure: { standard: 50 }, temperature: { standard: 0.2 } })
    const rho = 101_325 / (287 * 298.15)
    expect(standard).toBeCloseTo(rho * Math.sqrt((50 / 101_325) ** 2 + (0.2 / 298.15) ** 2), 12)
    expect(parts.map(part => part.input)).toEqual(['temperature', 'pressure'])
    expect(parts.reduce((sum, part) => sum + part.share, 0)).toBeCloseTo(1, 12)
  })
  it('doubling one input’s u doubles its part and leaves the others', () => {
    fc.assert(fc.property(fc.double({ min: 0.01, max: 2, noNaN: true }), fc.double({ min: 10, max: 300, noNaN: true }), (uT, up) => {
      const once = budget('potential-temperature', { pressure: 85_000, temperature: 288.15 }, { pressure: { standard: up }, temperature: { standard: uT } })
      const twice = budget('potential-temperature', { pressure: 85_000, temperature: 288.15 }, { pressure: { standard: up }, temperature: { standard: 2 * uT } })
      const part = (of: typeof once, input: string) => of.parts.find(one => one.input === input)?.standard ?? NaN
      expect(Math.abs(part(twice, 'temperature') / part(once, 'temperature') - 2)).toBeLessThan(1e-9)
      expect(Math.abs(part(twice, 'pressure') / part(once, 'pressure') - 1)).toBeLessThan(1e-9)
    }))
  })
  it('W24: a calibration error that both readings share cancels in their difference; without it they add in squares', () => {
    const inputs = { temperatureStart: 283.15, temperatureEnd: 308.15 }, u = { temperatureStart: { standard: 0.1 }, temperatureEnd: { standard: 0.1 } }
    expect(budget('isobaric-heat', inputs, u, [{ between: ['temperatureStart', 'temperatureEnd'], r: 1 }]).standard).toBe(0)
    expect(budget('isobaric-heat', inputs, u).standard).toBeCloseTo(1004 * 0.1 * Math.SQRT2, 6)
    // and in a lapse rate, whose rows come from one sensor
    expect(budget('lapse-rate-least-squares', layer, { temperature: { standard: 0.1 } }, [{ between: ['temperature', 'temperature'], r: 1 }]).standard).toBe(0)
    expect(budget('lapse-rate-least-squares', layer, { temperature: { standard: 0.1 } }).standard).toBeCloseTo(0.1 / Math.sqrt(25_000), 12)
  })
  it('correlations between two inputs enter with their sign', () => {
    const inputs = { temperatureStart: 283.15, temperatureEnd: 308.15 }, u = { temperatureStart: { standard: 0.3 }, temperatureEnd: { standard: 0.4 } }
    const at = (r: number) => budget('isobaric-heat', inputs, u, [{ between: ['temperatureEnd', 'temperatureStart'], r }]).standard / 1004
    expect(at(0)).toBeCloseTo(0.5, 9)
    expect(at(-1)).toBeCloseTo(0.7, 9)
    expect(at(1)).toBeCloseTo(0.1, 9)
  })
  it('each number of a series may have its own u', () => {
    const one = budget('lapse-rate-least-squares', layer, { temperature: { standard: [0.1, 0, 0, 0, 0.1] } })
    expect(one.standard).toBeCloseTo(0.1 * 100 * Math.SQRT2 / 25_000, 12)
    expect(() => budget('lapse-rate-least-squares', layer, { temperature: { standard: [0.1, 0.1] } })).toThrow('2 uncertainties for 5 values')
  })
  it('effective degrees of freedom by Welch and Satterthwaite, and k by Student’s t', () => {
    // GUM, H.1.6 (from memory): the parts of an end gauge's calibration, nm, and their degrees: 16.7, taken as 16
    const parts = [[25, 18], [9.7, 25.6], [2.9, 50], [16.6, 2]] as const
    const gauge = propagate(x => x.reduce((total, one) => total + one, 0), parts.map(([standard, degreesOfFreedom]) => ({ value: 0, standard, degreesOfFreedom })))
    expect(Math.abs((gauge.degreesOfFreedom ?? 0) - 16.7)).toBeLessThan(0.2)
    // two parts, by hand: 5⁴/(3⁴/4 + 4⁴/9)
    expect(propagate(([a = 0, b = 0]) => a + b, [{ value: 1, standard: 3, degreesOfFreedom: 4 }, { value: 1, standard: 4, degreesOfFreedom: 9 }]).degreesOfFreedom).toBeCloseTo(625 / (81 / 4 + 256 / 9), 6)
    const few = budget('density', air, { temperature: { standard: 0.2, degreesOfFreedom: 16 } }, [], 0.99)
    expect(few.degreesOfFreedom).toBeCloseTo(16, 9)
    expect(few.coverageFactor).toBeCloseTo(2.92, 2)
    expect(few.expanded).toBeCloseTo(few.coverageFactor * few.standard, 15)
    const correlated = budget('isobaric-heat', { temperatureStart: 283.15, temperatureEnd: 308.15 }, { temperatureStart: { standard: 0.1, degreesOfFreedom: 9 }, temperatureEnd: { standard: 0.1 } }, [{ between: ['temperatureStart', 'temperatureEnd'], r: 0.5 }])
    expect(correlated.degreesOfFreedom).toBeNull()
  })
  it('derivatives agree with closed forms, at the ends of a range as well', () => {
    const isothermal = budget('isothermal-work', { temperature: 293.15, pressureStart: 100_000, pressureEnd: 70_000 }, { temperature: { standard: 1 }, pressureStart: { standard: 10 }, pressureEnd: { standard: 10 } })
    const sensitivity = (name: string) => isothermal.parts.find(part => part.input === name)?.sensitivity ?? NaN
    expect(Math.abs(sensitivity('temperature') / (287 * log(1 / 0.7)) - 1)).toBeLessThan(1e-10)
    expect(Math.abs(sensitivity('pressureEnd') / (-287 * 293.15 / 70_000) - 1)).toBeLessThan(1e-10)
    expect(Math.abs(sensitivity('pressureStart') / (287 * 293.15 / 100_000) - 1)).toBeLessThan(1e-10)
    const [edge] = budget('pressure-at-height', { pressure: 100_000, heightDifference: 1000, meanVirtualTemperature: 350 }, { meanVirtualTemperature: { standard: 0.1 } }).parts
    const exact = 100_000 * Math.exp(-9.81 * 1000 / (287 * 350)) * 9.81 * 1000 / (287 * 350 * 350)
    expect(Math.abs((edge?.sensitivity ?? 0) / exact - 1)).toBeLessThan(1e-6)
  })
  it('refuses what cannot be: a negative u, an input that is none, correlations that contradict each other, a class', () => {
    expect(() => budget('density', air, { pressure: { standard: -1 } })).toThrow('pressure')
    expect(() => budget('density', air, { humidity: { standard: 1 } })).toThrow('humidity')
    expect(() => budget('density', air, { pressure: { standard: 1 } }, [{ between: ['pressure', 'temperature'], r: 0.5 }])).toThrow('temperature')
    expect(() => budget('density', air, { pressure: { standard: 1 }, temperature: { standard: 1 } }, [{ between: ['pressure', 'temperature'], r: 2 }])).toThrow('correlations from −1 to 1')
    expect(() => propagate(([a = 0, b = 0, c = 0]) => a + b + c, [{ value: 1, standard: 1 }, { value: 1, standard: 1 }, { value: 1, standard: 1 }], () => -0.9)).toThrow('cannot hold together')
    expect(() => budget('static-stability', { lapseRate: 0.0065 }, { lapseRate: { standard: 0.0001 } })).toThrow('no number')
  })
  it('is there for every quantity that gives a number: finite, zero without u, and proportional to u', () => {
    let tried = 0
    for (const definition of quantities.filter(one => one.kind !== 'class')) {
      const { inputs } = definition.example
      if (evaluateQuantity(definition, inputs, constants).is !== 'value') continue
      const names = definition.inputs.filter(input => !input.isForSlips && inputs[input.name] !== undefined)
      const u = (size: number): GivenUncertainties => Object.fromEntries(names.map(input => [input.name, { standard: size * (input.kind === 'temperature' ? 0.2 : 0.001 * (Array.isArray(inputs[input.name]) ? 1 : Math.abs(Number(inputs[input.name])))) }]))
      if (names.some(input => Array.isArray(inputs[input.name]))) continue
      tried++
      const none = uncertaintyBudget(definition, inputs, u(0), constants), once = uncertaintyBudget(definition, inputs, u(1e-3), constants), twice = uncertaintyBudget(definition, inputs, u(2e-3), constants)
      expect(none.standard, definition.key).toBe(0)
      expect(Number.isFinite(once.standard), definition.key).toBe(true)
      expect(Math.abs(twice.standard - 2 * once.standard), definition.key).toBeLessThanOrEqual(1e-6 * once.standard)
    }
    expect(tried).toBeGreaterThan(80)
  })
})

describe('simulation', () => {
  const u = { temperature: { standard: 0.1 } }
  it('agrees with propagation where the quantity is straight in its inputs, with correlated rows too', () => {
    for (const correlations of [[], [{ between: ['temperature', 'temperature'] as const, r: 0.6 }]]) {
      const first = budget('lapse-rate-least-squares', layer, u, correlations)
      const simulated = simulateQuantity(definitionOf('lapse-rate-least-squares'), layer, u, constants, { correlations, trials: 20_000, seed: 3 })
      expect(Math.abs(simulated.standard / first.standard - 1)).toBeLessThan(0.02)
      expect(Math.abs(simulated.mean - first.value)).toBeLessThan(4 * first.standard / Math.sqrt(20_000))
      expect(Math.abs((simulated.symmetric.high - simulated.symmetric.low) / 2 / first.expanded - 1)).toBeLessThan(0.03)
    }
  })
  it('gives the same numbers for the same seed, and others for another', () => {
    const at = (seed: number) => simulateQuantity(definitionOf('lapse-rate-least-squares'), layer, u, constants, { trials: 500, seed })
    expect(at(5)).toEqual(at(5))
    expect(at(6).mean).not.toBe(at(5).mean)
  })
  it('the shortest interval of a skewed result is shorter than the one with equal tails', () => {
    let n = 0
    const count = 20_000
    const skewed = simulate(() => -log((n++ + 0.5) / count), count, 0.95)
    // of −ln x the shortest interval runs from 0 to −ln 0.05, the other from −ln 0.975 to −ln 0.025
    expect(skewed.shortest.high).toBeCloseTo(-log(0.05), 2)
    expect(skewed.shortest.low).toBeLessThan(0.001)
    expect(skewed.symmetric.low).toBeCloseTo(-log(0.975), 3)
    expect(skewed.symmetric.high).toBeCloseTo(-log(0.025), 2)
  })
  it('counts the trials without a value', () => {
    const near = simulateQuantity(definitionOf('hypsometric-thickness'), { pressureBottom: 90_000, pressureTop: 89_990, meanVirtualTemperature: 280 }, { pressureTop: { standard: 20 } }, constants, { trials: 2000 })
    expect(near.without).toBeGreaterThan(400)
    expect(near.without).toBeLessThan(900)
  })
  it('draws with the correlations that are asked, and refuses those that contradict each other', () => {
    const root = correlationRoot(2, () => 0.8) ?? []
    expect(root[1]?.[0]).toBeCloseTo(0.8, 12)
    expect(root[1]?.[1]).toBeCloseTo(0.6, 12)
    expect(correlationRoot(3, () => 0)).toBeNull()
    expect(() => correlationRoot(3, () => -0.9)).toThrow('cannot hold together')
    expect(correlationRoot(3, () => 1)?.map(row => row.map(one => Math.round(one)))).toEqual([[1], [1, 0], [1, 0, 0]])
  })
  it('refuses trials, seeds and coverages that are none', () => {
    for (const options of [{ trials: 10 }, { trials: 1e9 }, { seed: -1 }, { coverage: 1 }]) expect(() => simulateQuantity(definitionOf('density'), air, { pressure: { standard: 10 } }, constants, options)).toThrow()
  })
})
