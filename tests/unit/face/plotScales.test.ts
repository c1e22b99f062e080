import { scaleLinear } from 'd3-scale'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { layerSide, profilePoints, profileScale, stepLevel, ticksOf } from '../../../components/plot/profileScale'
import { extentOf, nearestAt, pathOf, thinned, type Point } from '../../../components/plot/series'
import { instantText, rowsWithin, seriesPoints, timeTicks, turnedWindow, usualGap } from '../../../components/plot/timeScale'

const series = (values: (number | null)[]) => ({ key: 't', label: 'temperature', unit: 'Cel', digits: 2, values })

describe('a profile', () => {
  const heights = [0, 20, 10, null, 40]
  const scale = profileScale({ width: 520, height: 440, heights, main: [series([4, 5, 6, 7, 8])] })

  it('has height upward', () => expect(scale.y(40)).toBeLessThan(scale.y(0)))
  it('walks through levels by height, whatever the order of the rows', () => {
    expect(scale.order).toEqual([0, 2, 1, 4])
    expect(stepLevel(scale.order, 2, 1)).toBe(1)
    expect(stepLevel(scale.order, 4, 1)).toBe(4)
    expect(stepLevel(scale.order, null, 1)).toBe(0)
    expect(stepLevel([], null, 1)).toBeNull()
  })
  it('breaks the line where a height or a value is missing', () => {
    const points = profilePoints(heights, [4, null, 6, 7, Number.NaN], scale.x, scale.y)
    expect(points.map(point => point === null)).toEqual([false, true, false, true, true])
    expect(pathOf(points).match(/M/g)).toHaveLength(2)
  })
  it('stays drawable with one level, and with none', () => {
    for (const levels of [[120], []]) {
      const drawn = profileScale({ width: 300, height: 300, heights: levels, main: [series(levels.map(() => 5))] })
      expect(Number.isFinite(drawn.y(120)) && Number.isFinite(drawn.x(5))).toBe(true)
    }
  })
  it('keeps every value inside its axes', () => {
    fc.assert(fc.property(fc.array(fc.tuple(fc.double({ min: -80, max: 60, noNaN: true }), fc.double({ min: 0, max: 2000, noNaN: true })), { minLength: 1, maxLength: 60 }), fc.integer({ min: 280, max: 1400 }), (rows, width) => {
      const drawn = profileScale({ width, height: 400, heights: rows.map(row => row[1]), main: [series(rows.map(row => row[0]))], side: { ...series(rows.map(() => 50)), unit: '%' } })
      return rows.every(([value, height]) => drawn.x(value) >= drawn.left - 0.5 && drawn.x(value) <= drawn.right + 0.5 && drawn.y(height) >= drawn.top - 0.5 && drawn.y(height) <= drawn.bottom + 0.5)
    }))
  })
})

describe('ticks', () => {
  it.each([[-2, 0, ['−2.0', '−1.5', '−1.0', '−0.5', '0.0']], [0, 40, ['0', '10', '20', '30', '40']]] as const)('from %d to %d never say the same twice', (from, to, texts) => {
    expect(ticksOf(scaleLinear().domain([from, to]).range([0, 300]), 4).map(tick => tick.text)).toEqual(texts)
  })
})

describe('the name of a layer', () => {
  it('stands where it hides fewer readings', () => {
    const line = Array.from({ length: 40 }, (_, at) => ({ x: 420, y: 10 * at }))
    expect(layerSide(line, [100, 200], { left: 50, right: 450 })).toBe('left')
    expect(layerSide(line.map(point => ({ ...point, x: 80 })), [100, 200], { left: 50, right: 450 })).toBe('right')
  })
})

describe('a line on a screen', () => {
  it('is never thinned of its spikes or its gaps', () => {
    const points: (Point | null)[] = Array.from({ length: 20_000 }, (_, at) => ({ x: at / 100, y: 50 }))
    points[7777] = { x: 77.77, y: -400 }
    points[12_000] = null
    const kept = thinned(points, 200)
    expect(kept.length).toBeLessThan(1000)
    expect(kept.some(point => point?.y === -400)).toBe(true)
    expect(kept.filter(point => point === null)).toHaveLength(1)
  })
  it('is left alone where it is short', () => {
    const points = [{ x: 1, y: 1 }, null, { x: 2, y: 2 }]
    expect(thinned(points, 100)).toEqual(points)
  })
  it('knows lowest and highest past missing values', () => {
    expect(extentOf([series([null, 3, Number.NaN, -2])])).toEqual([-2, 3])
    expect(extentOf([series([null])])).toBeNull()
  })
  it('finds the nearest of sorted numbers', () => {
    fc.assert(fc.property(fc.array(fc.integer({ min: 0, max: 1000 }), { minLength: 1, maxLength: 50 }), fc.integer({ min: -50, max: 1050 }), (list, value) => {
      const sorted = list.toSorted((a, b) => a - b)
      const best = Math.min(...sorted.map(one => Math.abs(one - value)))
      return Math.abs(sorted[nearestAt(sorted, value)]! - value) === best
    }))
  })
})

describe('time', () => {
  const minute = 60_000
  const start = Date.parse('2026-10-25T00:00:00Z')
  const times = Array.from({ length: 288 }, (_, at) => start + at * 5 * minute)

  it('takes a missing half hour for a gap and a jitter of seconds for none', () => {
    const withGap = [...times.slice(0, 40), ...times.slice(46)].map((time, at) => time + (at % 3) * 1000)
    const gap = usualGap(withGap)
    const points = seriesPoints(withGap, withGap.map(() => 1), [0, withGap.length], time => time, value => value, gap)
    expect(points.filter(point => point === null)).toHaveLength(1)
  })

  it('ticks at round hours of the zone, also over a clock change', () => {
    // Europe/London: 2026-10-25, 02:00 BST becomes 01:00 GMT (IANA time zone database, rule EU: last Sunday in October, 01:00 UTC).
    const ticks = timeTicks([start - 3 * 60 * minute, start + 9 * 60 * minute], 'Europe/London', 12)
    expect(ticks.map(tick => tick.text)).toEqual(['22:00', '23:00', '25 Oct', '01:00', '02:00', '03:00', '04:00', '05:00', '06:00', '07:00', '08:00', '09:00'])
    expect(ticks.find(tick => tick.text === '09:00')!.at).toBe(Date.parse('2026-10-25T09:00:00Z'))
    expect(ticks.find(tick => tick.text === '22:00')!.at).toBe(Date.parse('2026-10-24T21:00:00Z'))
  })

  it('says an instant by the clock of its zone', () => {
    expect(instantText(Date.parse('2026-07-01T12:05:00Z'), 'America/Denver', true)).toBe('1 Jul 2026 06:05')
    expect(instantText(Date.parse('2026-07-01T12:05:00Z'), 'UTC')).toBe('1 Jul 12:05')
  })

  it('keeps a row on either side of the window', () => {
    expect(rowsWithin(times, [times[10]!, times[20]!])).toEqual([9, 22])
    expect(rowsWithin(times, [times[0]!, times[287]!])).toEqual([0, 288])
    expect(rowsWithin([], [0, 1])).toEqual([0, 0])
  })

  it('never leaves the record, however it is turned', () => {
    const full = [start, start + 1440 * minute] as const
    fc.assert(fc.property(fc.array(fc.record({ by: fc.double({ min: -2, max: 2, noNaN: true }), zoom: fc.constantFrom(0.5, 1, 2) }), { maxLength: 30 }), (turns) => {
      const [from, to] = turns.reduce<readonly [number, number]>((window, turn) => turnedWindow(window, full, turn), full)
      return from >= full[0] - 1 && to <= full[1] + 1 && to - from >= 10 * minute - 1
    }))
  })
})
