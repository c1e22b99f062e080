import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { drawOrdinals } from '#shared/marking/draw'

const seeds = fc.stringMatching(/^[0-9a-f]{32}$/)

describe('the draw d1', () => {
  it('replays: the same seed and supply give the same draw, and more holders move nobody', () => {
    fc.assert(fc.property(seeds, fc.integer({ min: 1, max: 60 }), fc.integer({ min: 0, max: 200 }), (seed, supply, count) => {
      const first = drawOrdinals(seed, supply, count)
      expect(drawOrdinals(seed, supply, count + 25).slice(0, count)).toEqual(first)
      expect(first).toHaveLength(count)
    }))
  })
  it('gives every item once in each round, and never the same twice in a row', () => {
    fc.assert(fc.property(seeds, fc.integer({ min: 2, max: 40 }), (seed, supply) => {
      const drawn = drawOrdinals(seed, supply, supply * 5)
      for (let round = 0; round < 5; round++) expect([...drawn.slice(round * supply, (round + 1) * supply)].sort((a, b) => a - b)).toEqual(Array.from({ length: supply }, (_, at) => at))
      for (let k = 1; k < drawn.length; k++) expect(drawn[k]).not.toBe(drawn[k - 1])
    }))
  })
  it('is pinned: this draw is what it was when d1 was made', () => {
    expect(drawOrdinals('00112233445566778899aabbccddeeff', 7, 16)).toMatchInlineSnapshot(`
      [
        1,
        4,
        5,
        2,
        0,
        6,
        3,
        6,
        1,
        2,
        3,
        5,
        4,
        0,
        6,
        2,
      ]
    `)
  })
  it('differs from seed to seed, and refuses what is no draw', () => {
    expect(drawOrdinals('00112233445566778899aabbccddeefe', 30, 30)).not.toEqual(drawOrdinals('00112233445566778899aabbccddeeff', 30, 30))
    expect(drawOrdinals('0'.repeat(32), 1, 3)).toEqual([0, 0, 0])
    expect(() => drawOrdinals('12', 3, 3)).toThrow()
    expect(() => drawOrdinals('0'.repeat(32), 0, 3)).toThrow()
    expect(() => drawOrdinals('0'.repeat(32), 3, -1)).toThrow()
  })
})
