import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { barStep, mostDots, swarm } from '../../../components/band/classSwarm'

const box = { unit: 40, reach: 2.4, dot: 8, width: 150 }
const distances = fc.array(fc.double({ min: -6, max: 6, noNaN: true }), { maxLength: 400 })

describe('a class against the band', () => {
  it('shows every student once: as a dot, in a bar, or off the scale', () => {
    fc.assert(fc.property(distances, (list) => {
      const drawn = swarm(list.map(distance => ({ distance })), box)
      const shown = drawn.dots.length + drawn.bars.reduce((sum, bar) => sum + bar.count, 0) + drawn.off.reduce((sum, off) => sum + off.count, 0)
      return shown === list.length
    }))
  })

  it('turns to bars above the most dots', () => {
    const many = Array.from({ length: mostDots + 1 }, (_, at) => ({ distance: (at % 20) / 10 - 1 }))
    expect(swarm(many, box).bars.length).toBeGreaterThan(0)
    expect(swarm(many.slice(1), box).dots).toHaveLength(mostDots)
  })

  it('keeps values on the edge with those within', () => {
    const many = Array.from({ length: 200 }, (_, at) => ({ distance: at % 2 === 0 ? 1 : -1 }))
    const drawn = swarm(many, box)
    expect(drawn.within).toBe(200)
    expect(drawn.bars.every(bar => bar.side === 'in')).toBe(true)
    expect(drawn.bars.every(bar => bar.from >= -1 - 1e-9 && bar.from + barStep <= 1 + 1e-9)).toBe(true)
  })

  it('never mixes within and outside in one bar or row', () => {
    fc.assert(fc.property(fc.array(fc.double({ min: -2.4, max: 2.4, noNaN: true }), { minLength: 130, maxLength: 300 }), (list) => {
      const drawn = swarm(list.map(distance => ({ distance })), box)
      const inBars = drawn.bars.filter(bar => bar.side === 'in').reduce((sum, bar) => sum + bar.count, 0)
      return inBars === drawn.within
    }))
  })

  it('keeps dots of a crowded row inside the width', () => {
    const drawn = swarm(Array.from({ length: 100 }, () => ({ distance: 0 })), box)
    expect(Math.max(...drawn.dots.map(dot => dot.x))).toBeLessThanOrEqual(150)
  })

  it('groups what is off the scale by slip, most first', () => {
    const drawn = swarm([{ distance: -9, slip: 'sign' }, { distance: -9, slip: 'sign' }, { distance: 5 }], box)
    expect(drawn.off).toEqual([{ slip: 'sign', side: 'below', count: 2 }, { slip: 'no slip found', side: 'above', count: 1 }])
  })
})
