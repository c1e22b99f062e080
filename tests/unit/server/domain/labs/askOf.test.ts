import { describe, expect, it } from 'vitest'
import type { AskedNumber } from '../../../../../shared/schemas/askedSteps'
import { defaultConvention } from '../../../../../shared/thermo/conventions'
import { findQuantity, quantities } from '../../../../../shared/thermo/registry'
import { askOf } from '../../../../../server/domain/labs/askOf'
import { edgeRow } from '../../../../../server/domain/labs/rowsOfLayer'
import type { ServedRows } from '../../../../../server/domain/shares/loadedShare'

const column = (name: string, quantity: string, unit: string, values: (number | null)[]) => ({ name, quantity, unit, decimals: 1, texts: values.map(value => value === null ? '' : value.toFixed(1)), values })
const rows = (heights: (number | null)[], use: boolean[]): ServedRows => ({ columns: [column('height_m', 'height', 'm', heights), column('t_c', 'air-temperature', 'Cel', heights.map(() => 15)), column('p_hpa', 'pressure', 'hPa', heights.map(() => 980))], use, times: heights.map(() => ''), count: heights.length })
const share = { item: { leg: 'down' as const, lowM: -20, highM: 300 }, heightDatum: 'launch point', rows: rows([310, 300, 120, 40, 40, -20], [false, true, true, true, true, true]) }

function ask(quantity: string, more: Partial<AskedNumber>, of: typeof share | null = share): string {
  const definition = findQuantity(quantity)
  if (!definition) throw new Error(quantity)
  return askOf({ key: 's', kind: 'number', title: 'S', text: '', pointsMilli: 1000, quantity, variant: null, inputs: {}, unit: definition.shownUnit, digits: 3, granted: {}, slipMilli: 0, digitsMilli: 0, near: null, block: null, divisions: {}, accuracy: null, ...more }, definition, defaultConvention, { rate: 'Lapse rate' }, of)
}

describe('the ask', () => {
  it('pins quantity and sign, columns, rows, bounds, datum, leg and digits of a fit', () => {
    const text = ask('lapse-rate-least-squares', { unit: 'K/km', inputs: { height: { from: 'share', column: 'height', read: 'layer' }, temperature: { from: 'share', column: 'air-temperature', read: 'layer' } } })
    for (const part of ['positive where temperature falls with height', 'column height_m, every row with use = 1', 'column t_c, every row with use = 1', '−20 m to 300 m above the launch point, both bounds included', 'the way down', '5 of 6 rows', 'Answer in K km⁻¹, to at least 3 significant digits.']) expect(text).toContain(part)
    expect(text).not.toContain('Constants')
  })
  it('names the row of an edge, the first of equals (L9)', () => {
    expect(edgeRow(rows([40, 40, 50], [true, true, true]), 'lowest')).toBe(0)
    expect(ask('density', { inputs: { pressure: { from: 'share', column: 'pressure', read: 'highest' }, temperature: { from: 'share', column: 'air-temperature', read: 'lowest' } } })).toContain('in the lowest row with use = 1 (row 6)')
  })
  it('prints the constants that enter, with units, and no input that only a slip knows', () => {
    const text = ask('potential-temperature', { unit: 'K', digits: 4, inputs: { pressure: { from: 'text', value: 850, unit: 'hPa' }, temperature: { from: 'text', value: 20, unit: 'Cel' }, stationPressure: { from: 'text', value: 975, unit: 'hPa' } } })
    for (const part of ['850 hPa', '20 °C', 'cp = 1004 J kg⁻¹ K⁻¹', 'R = 287 J kg⁻¹ K⁻¹', 'p₀ = 1000 hPa', 'Answer in K, to 0.01 K or finer.']) expect(text).toContain(part)
    expect(text).not.toContain('975')
    expect(text).not.toMatch(/slip/i)
  })
  it('takes an earlier result by its title, and asks a class by its words', () => {
    const text = ask('static-stability', { unit: '1', inputs: { lapseRate: { from: 'step', key: 'rate' } } })
    expect(text).toContain('your result of “Lapse rate”')
    expect(text).toContain('Answer with one of: stable, dry-neutral, superadiabatic.')
    expect(text).not.toContain('significant')
  })
  it('says without a share what holds for all of them', () => {
    const text = ask('lapse-rate-end-points', { unit: 'K/km', inputs: { height: { from: 'share', column: 'height', read: 'layer' }, temperature: { from: 'share', column: 'air-temperature', read: 'layer' } } }, null)
    expect(text).toContain('the one of your data, both bounds included')
    expect(text).not.toMatch(/\d m to/)
  })
  it('names no slip in any quantity', () => {
    for (const definition of quantities) {
      const inputs = Object.fromEntries(definition.inputs.map(input => [input.name, { from: 'text' as const, value: 1, unit: input.unit }]))
      expect(ask(definition.key, { inputs })).not.toMatch(/slip/i)
    }
  })
})
