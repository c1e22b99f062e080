import { expect, it } from 'vitest'
import { formulaeOf } from '#shared/marking/alternatives'
import { defaultConvention } from '#shared/thermo/conventions/index'
import type { Inputs } from '#shared/thermo/definition'
import { evaluateQuantity } from '#shared/thermo/evaluate'
import { findQuantity } from '#shared/thermo/registry'
import { describeWithShared, hasShared, sharedTable } from '../../../fixtures/sharedFolder'

/** Real soundings with the columns that their archive printed beside them (University of Wyoming; status: verified). */
const soundings = ['metpy_20110522_OUN_12Z', 'metpy_may22_sounding', 'wyo_72349_1976030400', 'wyo_82244_2012010100', 'wyo_BOI_2010120912', 'wyo_OUN_1999050400', 'wyo_OUN_2023052212']

function value(quantity: string, inputs: Inputs): number {
  const definition = findQuantity(quantity)
  const found = definition && evaluateQuantity(definition, inputs, defaultConvention.constants, undefined, formulaeOf(defaultConvention))
  return found?.is === 'value' ? found.value : NaN
}

describeWithShared('columns that a sounding archive printed', () => {
  const rows = hasShared ? soundings.flatMap(name => sharedTable(`checks/soundings/${name}_published_columns.csv`).map(row => ({ name, row }))) : []
  // floors of a test, never part of a band; half of the last printed digit comes on top. The archive takes RH and w with its enhancement factor.
  const columns: [string, string, (row: Record<string, string>) => number, (printed: number, pressure: number) => number][] = [
    ['relative humidity', 'rh_pct_published', ({ T, Td }) => 100 * value('relative-humidity', { temperature: Number(T), dewpoint: Number(Td) }), () => 0.25 + 0.5 + 0.5],
    ['mixing ratio', 'mixing_ratio_g_kg_published', ({ p, Td }) => 1000 * value('mixing-ratio', { pressure: Number(p), dewpoint: Number(Td) }), printed => 0.005 + 1.3 * 0.006 * printed],
    ['θ', 'theta_K_published', ({ p, T }) => value('potential-temperature', { pressure: Number(p), temperature: Number(T) }), (_printed, p) => 0.05 + 0.06 + 0.25 * Math.abs(Math.log(p / 100_000))],
    ['θe', 'theta_e_K_published', ({ p, T, Td }) => value('equivalent-potential-temperature', { pressure: Number(p), temperature: Number(T), dewpoint: Number(Td) }), (_printed, p) => 0.05 + 0.35 + 0.25 * Math.abs(Math.log(p / 100_000))],
    ['θv', 'theta_v_K_published', ({ p, T, Td }) => value('virtual-potential-temperature', { pressure: Number(p), temperature: Number(T), dewpoint: Number(Td) }), (_printed, p) => 0.05 + 0.08 + 0.25 * Math.abs(Math.log(p / 100_000))],
  ]
  it('are there', () => expect(rows.length).toBeGreaterThan(200))
  it.each(columns)('%s agrees in every row', (what, column, compute, allowed) => {
    let checked = 0, largest = 0
    const wrong: string[] = []
    for (const { name, row } of rows) {
      const printed = row[column]
      if (printed === undefined || printed === '' || row.dewpoint_degC === '' || Number(row.pressure_hPa) < 10) continue
      const state = { p: String(Number(row.pressure_hPa) * 100), T: String(Number(row.temperature_degC) + 273.15), Td: String(Number(row.dewpoint_degC) + 273.15) }
      const off = Math.abs(compute(state) - Number(printed)), room = allowed(Number(printed), Number(state.p))
      checked++
      largest = Math.max(largest, off / room)
      if (!(off <= room)) wrong.push(`${name} ${row.pressure_hPa} hPa ${row.temperature_degC}/${row.dewpoint_degC} °C: ${compute(state).toFixed(3)} for ${printed}`)
    }
    console.info(`${what}: ${checked} rows, ${wrong.length} outside; the farthest at ${largest.toFixed(2)} of what is allowed`)
    expect(checked).toBeGreaterThan(150)
    expect(wrong.slice(0, 8)).toEqual([])
  })
})
