import { expect, it } from 'vitest'
import { judgeDays } from '../../../server/importing/quality/judgeDays'
import { flagBit, type StoredColumn } from '../../../server/observations/root'

const minute = 60_000
const column = (quantity: string, unitUcum: string): StoredColumn => ({ no: 0, name: 'x', quantity, unitUcum, decimals: 1, heightM: null, role: 'value' })
const day = (values: readonly number[], minutes = values.map((_, n) => n), line = values.map((_, n) => n + 2)) => ({ time: Float64Array.from(minutes, at => at * minute), line: Float64Array.from(line), columns: [Float64Array.from(values)] })
const marks = (quantity: string, unit: string, ...args: Parameters<typeof day>) => [...judgeDays([column(quantity, unit)], 'station')(day(...args))[0]!]

it('marks what lies beyond the plausible range, edges allowed, in any unit (Zahumensky 2004)', () => {
  expect(marks('air-temperature', 'Cel', [-80, 60, 60.1, -80.1], [0, 10, 20, 30])).toEqual([0, 0, 1, 1])
  expect(marks('air-temperature', '[degF]', [140, 140.2], [0, 10])).toEqual([0, 1])
  expect(marks('wind-speed', '[mi_i]/h', [167.7, 1048.4], [0, 10])).toEqual([0, 1])
  expect(marks('wind-direction', '45.deg/2', [16, 17], [0, 10])).toEqual([0, 1])
})
it('leaves night radiation of −3 W/m² unmarked (W14) and RH of 101 in fog', () => {
  expect(marks('global-radiation', 'W/m2', [-3, -30], [0, 10])).toEqual([0, 1])
  expect(marks('relative-humidity', '%', [101.5, 175], [0, 10])).toEqual([0, 1])
})
it('marks a jump from one minute to the next, and compares nothing across a gap or a missing value', () => {
  const step = flagBit('step')
  expect(marks('air-temperature', 'Cel', [10, 13, 16.1, 16.2])).toEqual([0, 0, step, 0])
  expect(marks('air-temperature', 'Cel', [10, 20], [0, 5])).toEqual([0, 0])
  expect(marks('air-temperature', 'Cel', [10, Number.NaN, 20])).toEqual([0, 0, 0])
  expect(marks('air-temperature', 'K', [283.15, 286.25])).toEqual([0, step])
})
it('marks a clock that stepped back, but not a file with the newest row first', () => {
  const order = flagBit('order')
  expect(marks('pressure', 'hPa', [1000, 1000, 1000, 1000], [0, 1, 2, 3], [2, 4, 3, 5])).toEqual([0, 0, order, 0])
  expect(marks('pressure', 'hPa', [1000, 1000, 1000], [0, 1, 2], [9, 8, 7])).toEqual([0, 0, 0])
})
it('marks a time that stands twice, across midnight too', () => {
  const judge = judgeDays([column('pressure', 'hPa')], 'station')
  judge(day([1000, 1000], [0, 1]))
  expect([...judge(day([1000, 1000], [1, 2]))[0]!]).toEqual([flagBit('duplicate'), 0])
})
it('judges nothing of a flight but its range', () => {
  expect([...judgeDays([column('air-temperature', 'Cel')], 'flight')(day([10, 30, -99, -101], [0, 1, 1, 0]))[0]!]).toEqual([0, 0, 0, 1])
})
