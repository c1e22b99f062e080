import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { below, fraction, randomSource, seedFromHex, seedFromNumber, shuffled, splitmix64 } from '#shared/numerics/random'

describe('random numbers', () => {
  it('xoshiro128** gives the ten numbers of its authors\' program from the state 1, 2, 3, 4', () => {
    const source = randomSource([1, 2, 3, 4])
    expect(Array.from({ length: 10 }, source.next)).toEqual([11520, 0, 5927040, 70819200, 2031721883, 1637235492, 1287239034, 3734860849, 3729100597, 4258142804])
  })
  it('splitmix64 gives the five numbers published for the seed 1234567', () => {
    const next = splitmix64(1234567n)
    expect(Array.from({ length: 5 }, next)).toEqual([6457827717110365317n, 3203168211198807973n, 9817491932198370423n, 4593380528125082431n, 16408922859458223821n])
  })
  it('a seed is read from 32 hexadecimal digits, and nothing else', () => {
    expect(seedFromHex('00000001000000020000000300000004')).toEqual([1, 2, 3, 4])
    expect(() => seedFromHex('1234')).toThrow('32 hexadecimal digits')
  })
  it('the state of all zeros still moves', () => {
    const source = randomSource([0, 0, 0, 0])
    expect(new Set(Array.from({ length: 20 }, source.next)).size).toBeGreaterThan(10)
  })
  it('draws below a count without bias: chi-squared over 7 and over 3·2³⁰ within its 99.9 % bounds', () => {
    const source = randomSource(seedFromNumber(7))
    const counts = new Array<number>(7).fill(0)
    for (let n = 0; n < 70_000; n++) {
      const value = below(source, 7)
      counts[value] = (counts[value] ?? 0) + 1
    }
    expect(counts.reduce((sum, count) => sum + (count - 10_000) ** 2 / 10_000, 0)).toBeLessThan(22.46)
    // a plain remainder would put twice as many below 2³⁰ as in the other thirds
    const thirds = [0, 0, 0]
    for (let n = 0; n < 30_000; n++) {
      const third = Math.floor(below(source, 3 * 2 ** 30) / 2 ** 30)
      thirds[third] = (thirds[third] ?? 0) + 1
    }
    expect(thirds.reduce((sum, count) => sum + (count - 10_000) ** 2 / 10_000, 0)).toBeLessThan(13.82)
  })
  it('refuses to draw below nothing', () => {
    expect(() => below(randomSource([1, 2, 3, 4]), 0)).toThrow()
    expect(() => below(randomSource([1, 2, 3, 4]), 1.5)).toThrow()
  })
  it('a shuffle holds every number once', () => {
    fc.assert(fc.property(fc.integer({ min: 0, max: 1e9 }), fc.integer({ min: 0, max: 200 }), (seed, count) => {
      const order = shuffled(randomSource(seedFromNumber(seed)), count)
      expect([...order].sort((a, b) => a - b)).toEqual(Array.from({ length: count }, (_, at) => at))
    }))
  })
  it('fractions lie in [0, 1) and average a half', () => {
    const source = randomSource(seedFromNumber(11))
    let sum = 0
    for (let n = 0; n < 20_000; n++) {
      const value = fraction(source)
      expect(value >= 0 && value < 1).toBe(true)
      sum += value
    }
    expect(Math.abs(sum / 20_000 - 0.5)).toBeLessThan(0.01)
  })
})
