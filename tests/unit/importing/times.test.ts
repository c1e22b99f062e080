import { describe, expect, it } from 'vitest'
import { Fields } from '../../../server/importing/fields'
import { readStamp, readTime, dateOfYear } from '../../../server/importing/stamp'
import { timeReader } from '../../../server/importing/times'
import { findZone } from '../../../server/importing/zone'
import type { ColumnRef, Recipe, TimeRecipe } from '../../../shared/schemas/data'

const iso = (at: number | undefined) => at === undefined ? 'none' : new Date(at).toISOString()
const wall = (text: string) => Date.parse(`${text}Z`)

/** Published clock changes: the zone database, as of 2026. */
describe('wall times of a zone', () => {
  const newYork = findZone('America/New_York')!
  it('has no instant in the hour that the clock skips (2013-03-10, 02 h, W10)', () => {
    expect(newYork.instantsOf(wall('2013-03-10T01:59:59'))).toHaveLength(1)
    expect(newYork.instantsOf(wall('2013-03-10T02:00:00'))).toEqual([])
    expect(newYork.instantsOf(wall('2013-03-10T02:59:59'))).toEqual([])
    expect(newYork.instantsOf(wall('2013-03-10T03:00:00')).map(iso)).toEqual(['2013-03-10T07:00:00.000Z'])
  })
  it('has two instants in the hour that stands twice (2013-11-03, 01 h, W10)', () => {
    expect(newYork.instantsOf(wall('2013-11-03T01:00:00')).map(iso)).toEqual(['2013-11-03T05:00:00.000Z', '2013-11-03T06:00:00.000Z'])
    expect(newYork.instantsOf(wall('2013-11-03T02:00:00')).map(iso)).toEqual(['2013-11-03T07:00:00.000Z'])
  })
  it('makes days of 1380 and 1500 minutes (W10)', () => {
    const midnight = (day: string) => newYork.instantsOf(wall(`${day}T00:00:00`))[0]!
    expect((midnight('2013-03-11') - midnight('2013-03-10')) / 60_000).toBe(1380)
    expect((midnight('2013-11-04') - midnight('2013-11-03')) / 60_000).toBe(1500)
  })
  it('changes by half an hour on Lord Howe Island and across the year\'s end in the south', () => {
    const howe = findZone('Australia/Lord_Howe')!
    expect(howe.instantsOf(wall('2026-04-05T01:45:00'))).toHaveLength(2)
    expect(howe.instantsOf(wall('2026-10-04T02:15:00'))).toHaveLength(0)
    expect(howe.instantsOf(wall('2026-12-31T23:59:59')).map(iso)).toEqual(['2026-12-31T12:59:59.000Z'])
  })
  it('reads fixed offsets and refuses what is no zone', () => {
    expect(findZone('UTC-07:00')!.instantsOf(wall('2018-10-14T00:00:00')).map(iso)).toEqual(['2018-10-14T07:00:00.000Z'])
    expect(findZone('UTC+05:45')!.instantsOf(wall('2018-10-14T05:45:00')).map(iso)).toEqual(['2018-10-14T00:00:00.000Z'])
    expect(findZone('Mars/Olympus')).toBeNull()
    expect(findZone('UTC+19')).toBeNull()
  })
})

describe('stamps', () => {
  it.each([
    ['2021-02-22T08:01:52+01:00', 'ymd', '2021-02-22T08:01:52.000Z', 3_600_000],
    ['2016-01-01 00:00 UTC', 'ymd', '2016-01-01T00:00:00.000Z', 0],
    ['2013-01-01T06:00:00Z', 'ymd', '2013-01-01T06:00:00.000Z', 0],
    ['10/14/2018 13:05', 'mdy', '2018-10-14T13:05:00.000Z', null],
    ['14.10.2018 13:05:07.25', 'dmy', '2018-10-14T13:05:07.250Z', null],
    ['20181014 1305', 'dmy', '2018-10-14T13:05:00.000Z', null],
    ['2016-12-31 24:00', 'ymd', '2017-01-01T00:00:00.000Z', null], // W9
    ['2016-02-29 12:00', 'ymd', '2016-02-29T12:00:00.000Z', null],
  ] as const)('%s', (text, order, shown, offsetMs) => {
    const stamp = readStamp(text, order)
    expect('problem' in stamp ? stamp.problem : [iso(stamp.wallMs), stamp.offsetMs]).toEqual([shown, offsetMs])
  })
  it.each(['', '2026-13-01 00:00', '2026-02-30 00:00', '2026-01-01 25:00', 'yesterday', '2026-01-01 12:60'])('%s is refused', (text) => {
    expect(readStamp(text, 'ymd')).toHaveProperty('problem')
  })
  it('day of the year counts from 1: 2016-12-31 is day 366 (W9)', () => {
    expect(dateOfYear(2016, 366)).toEqual({ wallMs: Date.UTC(2016, 11, 31) })
    expect(dateOfYear(2015, 366)).toHaveProperty('problem')
    expect(dateOfYear(2016, 0)).toHaveProperty('problem')
  })
  it('HHMM without leading zeros: 5 is five past midnight, 2400 the next day', () => {
    expect(readTime('5')).toMatchObject({ wallMs: 300_000 })
    expect(readTime('905')).toMatchObject({ wallMs: (9 * 60 + 5) * 60_000 })
    expect(readTime('2400')).toMatchObject({ wallMs: 86_400_000 })
  })
})

const base: Recipe = {
  title: 't', kind: 'station', encoding: 'utf-8', delimiter: ',', decimal: '.', comment: null, skipLines: 0, headerRows: 1, columns: [], time: { form: 'none' }, zone: 'UTC',
  ignoresCellZone: false, stampMeans: 'instant', intervalS: null, stationColumn: null, heightDatum: 'unknown',
}
const ref = (name: string, at: number): ColumnRef => ({ name, at })
function instants(time: TimeRecipe, rows: readonly (readonly string[])[], more: Partial<Recipe> = {}): string[] {
  const reader = timeReader({ ...base, time, ...more }, column => column.at)
  if ('unknownZone' in reader) throw new Error('zone')
  const fields = new Fields('utf-8')
  let previous: number | null = null
  return rows.map((cells) => {
    fields.fill(cells)
    const read = reader.read(fields, previous)
    if (!('at' in read)) return read.reason
    previous = read.at
    return iso(read.at)
  })
}

describe('instants by a recipe', () => {
  const stampColumn: TimeRecipe = { form: 'stamp', column: ref('t', 0), dateOrder: 'ymd' }
  it('a stamp at the interval\'s start is kept under its end (W7)', () => {
    expect(instants(stampColumn, [['2026-06-01 13:50']], { stampMeans: 'start', intervalS: 600 })).toEqual(['2026-06-01T14:00:00.000Z'])
    expect(instants(stampColumn, [['2026-06-01 14:00']], { stampMeans: 'end', intervalS: 600 })).toEqual(['2026-06-01T14:00:00.000Z'])
  })
  it('the doubled hour of a record by minutes comes out in order, newest last and newest first', () => {
    const twice = ['00:30', '01:00', '01:30', '01:00', '01:30', '02:00'].map(clock => [`2013-11-03 ${clock}`])
    const utc = ['04:30', '05:00', '05:30', '06:00', '06:30', '07:00'].map(clock => `2013-11-03T${clock}:00.000Z`)
    expect(instants(stampColumn, twice, { zone: 'America/New_York' })).toEqual(utc)
    expect(instants(stampColumn, [['2013-11-03 03:00'], ...twice.toReversed()], { zone: 'America/New_York' })).toEqual(['2013-11-03T08:00:00.000Z', ...utc.toReversed()])
  })
  it('the doubled hour is told apart with stamps at the start as well', () => {
    const twice = ['01:00', '01:30', '01:00', '01:30'].map(clock => [`2013-11-03 ${clock}`])
    expect(instants(stampColumn, twice, { zone: 'America/New_York', stampMeans: 'start', intervalS: 1800 })).toEqual(['05:30', '06:00', '06:30', '07:00'].map(clock => `2013-11-03T${clock}:00.000Z`))
  })
  it('cells that print a wrong zone are read in the person\'s, where told so', () => {
    expect(instants(stampColumn, [['2016-01-01 00:00 UTC']], { zone: 'UTC-08:00' })).toEqual(['2016-01-01T00:00:00.000Z'])
    expect(instants(stampColumn, [['2016-01-01 00:00 UTC']], { zone: 'UTC-08:00', ignoresCellZone: true })).toEqual(['2016-01-01T08:00:00.000Z'])
  })
  it('columns of year, month, day and hour; hour 24 is the next day', () => {
    const time: TimeRecipe = { form: 'fields', year: ref('y', 0), month: ref('m', 1), day: ref('d', 2), hour: ref('h', 3), minute: null, second: null }
    expect(instants(time, [['2013', '1', '31', '24'], ['2013', '2', '30', '1'], ['2013', '2', '3', '01:00']])).toEqual(['2013-02-01T00:00:00.000Z', 'month 2 of 2013 has no day 30', '2013-02-03T01:00:00.000Z'])
  })
  it('seconds since a start, with and without one', () => {
    const since = (startsAt: string | null): TimeRecipe => ({ form: 'elapsed', column: ref('s', 0), unit: 's', startsAt })
    expect(instants(since('2026-10-07 08:42'), [['0'], ['90.5']], { zone: 'America/Chicago' })).toEqual(['2026-10-07T13:42:00.000Z', '2026-10-07T13:43:30.500Z'])
    expect(() => instants(since(null), [['0']])).toThrow(RangeError) // no clock: NaN, which is no date
  })
})
