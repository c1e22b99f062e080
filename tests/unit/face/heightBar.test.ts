import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { bandTicks, inHalfWidths, largeBar, partText, placeWords, smallBar, standingOf, type ShownBand } from '../../../components/band/heightBar'

const band: ShownBand = {
  unit: 'K km^-1', center: 9.6, low: 9.4, high: 10.2, digits: 2, value: 9.7,
  parts: [{ key: 'granted', label: 'granted', below: 0.1, above: 0.1 }, { key: 'formulae', label: 'accepted formulae', below: 0.05, above: 0.45 }, { key: 'rounding', label: 'digits asked', below: 0.05, above: 0.05 }],
}

describe('the height bar', () => {
  it('counts an edge as within', () => {
    expect(standingOf(band, 9.4)).toBe('within')
    expect(standingOf(band, 10.2)).toBe('within')
    expect(standingOf(band, 9.399)).toBe('below')
    expect(standingOf(band, 10.201)).toBe('above')
  })

  it('puts the edges of an uneven band at −1 and 1, the worked value where it is', () => {
    expect(inHalfWidths(band, band.low)).toBeCloseTo(-1, 12)
    expect(inHalfWidths(band, band.high)).toBeCloseTo(1, 12)
    expect(inHalfWidths(band, band.center)).toBeCloseTo(-0.5, 12)
    const bar = smallBar(band, 46)
    expect(bar.low - bar.center).toBeLessThan(bar.center - bar.high)
  })

  it('draws higher values higher, and breaks the axis beyond the span', () => {
    const at = (value: number) => smallBar({ ...band, value }, 46).pointer
    expect(at(9.5)!.y).toBeGreaterThan(at(10)!.y)
    expect(at(20)!.off).toBe('up')
    expect(at(-9.6)!.off).toBe('down')
    expect(at(10.1)!.off).toBeNull()
    expect(smallBar({ ...band, value: null }, 46).pointer).toBeNull()
  })

  it('stays drawable where the band has no width', () => {
    const bar = smallBar({ center: 3, low: 3, high: 3, digits: 0, value: 3 }, 46)
    for (const y of [bar.high, bar.low, bar.center, bar.pointer!.y]) expect(Number.isFinite(y)).toBe(true)
    expect(bar.pointer!.isInside).toBe(true)
  })

  it('stacks the parts outward until they meet the edges', () => {
    const bar = largeBar(band, { height: 320 })
    expect(Math.min(...bar.blocks.map(block => block.y))).toBeCloseTo(bar.high, 6)
    expect(Math.max(...bar.blocks.map(block => block.y + block.height))).toBeCloseTo(bar.low, 6)
    const total = bar.blocks.reduce((sum, block) => sum + block.height, 0)
    expect(total).toBeCloseTo(bar.low - bar.high, 6)
  })

  it('keeps words a line apart, whatever the value and the slips are', () => {
    fc.assert(fc.property(fc.double({ min: -30, max: 30, noNaN: true }), fc.array(fc.double({ min: 8, max: 12, noNaN: true }), { maxLength: 3 }), (value, ghosts) => {
      const bar = largeBar({ ...band, value, ghosts: ghosts.map((ghost, no) => ({ label: `slip ${no}`, value: ghost })) }, { height: 420 })
      const lines = [bar.center, ...bar.lines.map(line => line.y)]
      const sorted = lines.toSorted((a, b) => a - b)
      return sorted.every((y, at) => at === 0 || y - sorted[at - 1]! >= 20.9)
    }))
  })

  it('labels ticks with as many decimals as their step has', () => {
    expect(bandTicks(8.6, 10.6).map(tick => tick.text)).toContain('9.5')
    expect(bandTicks(-12, 12).map(tick => tick.text)).toContain('−10')
  })

  it('says a part on one side or both', () => {
    expect(partText({ above: 0.1, below: 0.1 }, 2)).toBe('± 0.10')
    expect(partText({ above: 0.45, below: 0.05 }, 2)).toBe('+0.45 −0.05')
    expect(partText({ above: 0, below: 0.05 }, 2)).toBe('−0.05')
    expect(partText({ above: 0.0004, below: 0.0004 }, 2)).toBe('± 0.0004')
  })

  it('keeps words in the order of what they name, so that no leader crosses another', () => {
    fc.assert(fc.property(fc.double({ min: 9, max: 11, noNaN: true }), fc.array(fc.double({ min: 8, max: 12, noNaN: true }), { maxLength: 3 }), (value, ghosts) => {
      const { lines, center } = largeBar({ ...band, value, ghosts: ghosts.map((ghost, no) => ({ label: `slip ${no}`, value: ghost })) }, { height: 420 })
      const all = [...lines, { at: center, y: center }].toSorted((a, b) => a.y - b.y)
      return all.every((line, at) => at === 0 || line.at >= all[at - 1]!.at)
    }))
  })

  it('moves words away from the worked value, and no farther than a line', () => {
    expect(placeWords([{ at: 100, y: 100 }, { at: 101, y: 101 }, { at: 40, y: 40 }], 50).map(line => line.y)).toEqual([29, 100, 121])
  })
})
