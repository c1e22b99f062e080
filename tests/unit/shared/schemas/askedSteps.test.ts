import { describe, expect, it } from 'vitest'
import { askedSteps } from '../../../../shared/schemas/askedSteps'
import { labBody } from '../../../../shared/schemas/lab'

const layer = (column: string) => ({ from: 'share', column, read: 'layer' })
const of = (...steps: unknown[]) => labBody.parse({ title: 'T', supply: [], steps })
const fit = { key: 'line', kind: 'fit', title: 'The layer', inputs: { height: layer('height'), temperature: layer('air-temperature') }, parts: { slope: { pointsMilli: 2000 }, intercept: null, error: { pointsMilli: 1000 } } }
const table = {
  key: 'theta', kind: 'table', title: 'Levels', rows: 3, columns: [
    { key: 'a', title: 'θ', pointsMilli: 1000, quantity: 'potential-temperature', unit: 'K', inputs: { pressure: { from: 'share', column: 'pressure', read: 'row' }, temperature: { from: 'share', column: 'air-temperature', read: 'row' } } },
    { key: 'b', title: 'back', pointsMilli: 1000, quantity: 'temperature-from-potential-temperature', unit: 'Cel', inputs: { pressure: { from: 'share', column: 'pressure', read: 'row' }, potentialTemperature: { from: 'step', key: 'a' } } },
  ],
}

describe('what a lab asks', () => {
  it('is one entry for each number of a fit that has marks', () => {
    expect(askedSteps(of(fit)).map(step => [step.key, step.kind, step.pointsMilli])).toEqual([['line-slope', 'fit', 2000], ['line-error', 'fit', 1000]])
  })
  it('is one entry a cell of a table, its own row of the data and its own row’s other column put in, the column’s marks split whole (K14)', () => {
    const cells = askedSteps(of(table))
    expect(cells.map(cell => cell.key)).toEqual(['theta-1-a', 'theta-1-b', 'theta-2-a', 'theta-2-b', 'theta-3-a', 'theta-3-b'])
    expect(cells[3]).toMatchObject({ inputs: { pressure: { row: { no: 2, of: 3 } }, potentialTemperature: { from: 'step', key: 'theta-2-a' } }, block: { key: 'theta', part: 'back', row: 2 } })
    expect(cells.filter(cell => cell.key.endsWith('-a')).map(cell => cell.pointsMilli)).toEqual([334, 333, 333])
  })
  it('lets a later step go on from a part, and refuses one that is not there yet, and a key twice', () => {
    const after = { key: 'lift', kind: 'number', title: 'L', pointsMilli: 1, quantity: 'parcel-temperature-by-height', unit: 'Cel', inputs: { lapseRate: { from: 'step', key: 'line-slope' } } }
    expect(() => of(fit, after)).not.toThrow()
    expect(() => of(after, fit)).toThrow('earlier step')
    expect(() => of(fit, { ...after, inputs: {}, key: 'line-slope' })).toThrow('Two steps have this key')
  })
  it('refuses a choice without a right option, and with two where one can be chosen', () => {
    const choice = (...right: boolean[]) => ({ key: 'c', kind: 'choice', title: 'C', pointsMilli: 1, options: right.map((isRight, at) => ({ key: 'abc'[at], text: 'x', isRight })) })
    expect(() => of(choice(false, false))).toThrow('which option is right')
    expect(() => of(choice(true, true))).toThrow('One option is right here')
    expect(() => of({ ...choice(true, true), isSeveral: true })).not.toThrow()
  })
  it('refuses a table with two columns of one key, whose cells would be one', () => {
    const twice = { ...table, columns: table.columns.map(column => ({ ...column, key: 'a', inputs: {} })) }
    expect(labBody.safeParse({ title: 'T', supply: [], steps: [twice] }).error?.issues.map(issue => [issue.path.join('.'), issue.message])).toContainEqual(['steps.0.columns', 'Two columns have the same key.'])
    expect(() => of({ ...twice, columns: twice.columns.map((column, at) => ({ ...column, key: `a${at}` })) })).not.toThrow()
  })
  it('is at most 200 entries, cells of tables and parts of fits counted', () => {
    const [column] = table.columns
    const cells = (key: string, rows: number, columns: number) => ({ ...table, key, rows, columns: Array.from({ length: columns }, (_, at) => ({ ...column, key: `c${at}` })) })
    const full = [cells('one', 24, 5), cells('two', 13, 6), fit]
    expect(askedSteps(of(...full))).toHaveLength(200)
    expect(labBody.safeParse({ title: 'T', supply: [], steps: [...full, cells('three', 1, 1)] }).error?.issues).toMatchObject([{ path: ['steps'], message: expect.stringContaining('at most 200 entries, and this one asks 201') }])
  })
})
