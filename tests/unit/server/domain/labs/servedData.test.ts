import { describe, expect, it } from 'vitest'
import { labBody, type LabBody } from '../../../../../shared/schemas/lab'
import type { NumberStep } from '../../../../../shared/schemas/steps'
import { rowsOfLeg } from '../../../../../server/domain/shares/legs'
import { csvOf, servedText, serveFlight, serveRows as serveItem, type Flight } from '../../../../../server/domain/shares/servedData'

const serveRows = (given: Flight, item: { leg: 'up' | 'down' | 'all', lowM: number, highM: number }, of: LabBody) => serveItem(serveFlight(given, of), item)

const rate: NumberStep = {
  key: 'rate', kind: 'number', title: 'Rate', text: '', pointsMilli: 3000, quantity: 'layer-lapse-rate', variant: null, unit: 'K/km', digits: 3, granted: {}, slipMilli: 0, digitsMilli: 0, near: null,
  inputs: { temperature: { from: 'share', column: 'air-temperature', read: 'layer' }, height: { from: 'share', column: 'height', read: 'layer' } },
}
const body: LabBody = labBody.parse({ title: 'Rates', supply: [], steps: [rate] })

function flight(heights: number[], temperatures: number[], more: Partial<Flight> = {}): Flight {
  return {
    versionId: 'v', versionNo: 1, title: 'Flight', rootSha256: 'ab', heightDatum: 'ground', rowCount: heights.length, time: heights.map((_, row) => Date.UTC(2026, 9, 7, 13, 42, row * 2)),
    columns: [
      { name: 'height_m', quantity: 'height', unit: 'm', decimals: 1, role: 'value', values: heights },
      { name: 'temperature_c', quantity: 'air-temperature', unit: 'Cel', decimals: 1, role: 'value', values: temperatures },
    ],
    ...more,
  }
}

describe('legs', () => {
  it('turns at the first row of the greatest height', () => {
    const heights = [0, 10, 30, null, 30, 12, 1]
    expect(rowsOfLeg(heights, 'up')).toEqual([true, true, true, false, false, false, false])
    expect(rowsOfLeg(heights, 'down')).toEqual([false, false, false, false, true, true, true])
    expect(rowsOfLeg(heights, 'all')).toEqual([true, true, true, false, true, true, true])
  })
  it('keeps a sway on the way up in the way up', () => {
    expect(rowsOfLeg([0, 20, 15, 30, 5], 'up')).toEqual([true, true, true, true, false])
  })
})

describe('served rows', () => {
  it('uses the closed layer of the leg: rows on both bounds count (L8)', () => {
    const rows = serveRows(flight([50, 100, 150, 200, 250, 300, 350, 300, 200], [15, 15, 14.6, 14.1, 13.7, 12.9, 12, 12.5, 14]), { leg: 'up', lowM: 100, highM: 300 }, body)
    expect(rows.use).toEqual([false, true, true, true, true, true, false, false, false])
  })
  it('does not use a row that lacks a value a step needs', () => {
    const rows = serveRows(flight([100, 150, 200], [15, Number.NaN, 14.1]), { leg: 'all', lowM: 0, highM: 300 }, body)
    expect(rows.use).toEqual([true, false, true])
    expect(rows.columns[1]?.texts).toEqual(['15.0', '', '14.1'])
  })
  it('computes from the served digits, not from the stored precision (W20)', () => {
    const rows = serveRows(flight([100.04, 200.06], [14.96, 14.04]), { leg: 'all', lowM: 100, highM: 200.1 }, body)
    expect(rows.columns.map(column => column.values)).toEqual([[100, 200.1], [15, 14]])
    expect(rows.use).toEqual([true, true])
  })
  it('leaves out what holds a step’s answer and what no quantity names', () => {
    const given = flight([1, 2], [3, 4])
    const rows = serveRows({ ...given, columns: [...given.columns,
      { name: 'theta', quantity: 'potential-temperature', unit: 'K', decimals: 1, role: 'value', values: [300, 301] },
      { name: 'quality', quantity: 'height', unit: 'm', decimals: 0, role: 'quality', values: [0, 0] },
      { name: 'x', quantity: 'other', unit: '1', decimals: 0, role: 'value', values: [0, 0] }] },
    { leg: 'all', lowM: 0, highM: 9 }, { ...body, steps: [...body.steps, { ...rate, key: 'theta', quantity: 'potential-temperature' }] })
    expect(rows.columns.map(column => column.name)).toEqual(['height_m', 'temperature_c'])
  })
})

describe('digits and bytes', () => {
  it.each([[12.345, 2, '12.35'], [-0.04, 1, '0.0'], [Number.NaN, 1, ''], [0.1, null, '0.1'], [1013, 0, '1013']])('serves %d with %s decimals as "%s"', (value, decimals, text) => {
    // 12.345 is stored as 12.3450000000000006394…, so two decimals round it up
    expect(servedText(value, decimals)).toBe(text)
  })
  it('writes a head of comments, names with units, rows with a use column', () => {
    const rows = serveRows(flight([100, 350], [15, 12]), { leg: 'all', lowM: 0, highM: 300 }, body)
    expect(csvOf(['Lab: Rates\n=evil', 'Two'], rows)).toBe('# Lab: Rates\n# =evil\n# Two\nrow,time_utc,height_m [m],temperature_c [Cel],use\n1,2026-10-07T13:42:00Z,100.0,15.0,1\n2,2026-10-07T13:42:02Z,350.0,12.0,0\n')
  })
  it('makes no formula of a column’s name', () => {
    const given = flight([1], [2])
    const rows = serveRows({ ...given, columns: [{ ...given.columns[0]!, name: '=cmd|"x"' }, given.columns[1]!] }, { leg: 'all', lowM: 0, highM: 9 }, body)
    expect(csvOf([], rows).split('\n')[0]).toBe('row,time_utc,"\'=cmd|""x"" [m]",temperature_c [Cel],use')
  })
})
