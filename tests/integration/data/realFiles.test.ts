import { afterAll, beforeAll, expect, it } from 'vitest'
import { readVersion, type VersionRows } from '../../../server/observations/readVersion'
import { readRoot } from '../../../server/observations/root'
import type { ColumnRecipe, Recipe } from '../../../shared/schemas/data'
import { openDataRoom, type DataRoom } from '../../fixtures/dataRoom'
import { describeWithShared, sharedFile } from '../../fixtures/sharedFolder'

/** Row counts are those that the folder's own list states; spot values were read in the files themselves. */
describeWithShared('real loggers\' files become data sets', () => {
  let room: DataRoom
  beforeAll(async () => { room = await openDataRoom() })
  afterAll(() => room.remove())

  interface Imported { id: string, title: string, read: number, taken: number, refused: number, firstAt: string, lastAt: string, rows: VersionRows, root: Buffer, meta: { doubledRows: number, commentLines: number } }

  async function imported(path: string, change: (recipe: Recipe) => Recipe = recipe => recipe): Promise<Imported[]> {
    const upload = await room.uploadFile(sharedFile(`data/${path}`))
    const job = await room.importUpload(upload.id, change(upload.guess.recipe))
    expect(job.problem).toBeNull()
    expect(job.state).toBe('done')
    return Promise.all(job.dataSets.map(async (set) => {
      const version = await room.read.selectFrom('data_set_version').selectAll().where('id', '=', set.versionId).executeTakeFirstOrThrow()
      expect(version.rows_read).toBe(version.rows_taken + version.rows_refused)
      return {
        id: set.id, title: set.title, read: version.rows_read, taken: version.rows_taken, refused: version.rows_refused, root: version.root_sha256, meta: JSON.parse(version.meta_json) as Imported['meta'],
        firstAt: version.first_at === null ? '' : new Date(version.first_at).toISOString(), lastAt: version.last_at === null ? '' : new Date(version.last_at).toISOString(), rows: readVersion(room.observations, version.root_sha256),
      }
    }))
  }
  const withUnits = (units: Readonly<Record<string, string>>) => (recipe: Recipe): Recipe => ({ ...recipe, columns: recipe.columns.map((column): ColumnRecipe => ({ ...column, unit: units[column.name] ?? column.unit })) })
  const column = (set: Imported, name: string) => set.rows.columns.find(one => one.name === name)!
  const at = (set: Imported, instant: string) => set.rows.time.indexOf(Date.parse(instant))

  it('Strasbourg: semicolons, decimal commas, a real clock change told by offsets', async () => {
    const [set] = await imported('station/strasbourg_10min_semicolon_decimalcomma_2021.csv', (recipe) => {
      expect(recipe).toMatchObject({ delimiter: ';', decimal: ',', headerRows: 1, kind: 'station' })
      return { ...recipe, columns: recipe.columns.map(one => one.name === 'wind_direction' ? { ...one, missingCodes: ['16'] } : one) }
    })
    expect([set!.read, set!.taken, set!.refused]).toEqual([16416, 16416, 0])
    expect(set!.firstAt).toBe('2021-02-22T07:01:52.000Z')
    expect(set!.lastAt).toBe('2021-08-14T14:29:46.000Z')
    expect(column(set!, 'temperature (*C)').values[0]).toBe(14.38)
    expect(column(set!, 'pressure (hPa)').values[1]).toBe(998.05)
    expect(column(set!, 'wind_direction').values.filter(value => Number.isNaN(value)).length).toBe(58)
    // one step back in time is marked; no row is lost to it
    expect(column(set!, 'humidity (%)').flags.some(bits => (bits & 4) !== 0)).toBe(true)
    // RH up to 175 % stays as it was and is marked beyond its range
    const most = column(set!, 'humidity (%)').values.reduce((a, b) => Math.max(a, b))
    expect(most).toBe(175)
    expect(column(set!, 'humidity (%)').flags[column(set!, 'humidity (%)').values.indexOf(175)]! & 1).toBe(1)
  })

  it('the same file by its unix seconds gives the same instants as by its dates', async () => {
    const [byDate] = await imported('station/strasbourg_10min_semicolon_decimalcomma_2021.csv')
    const [bySeconds] = await imported('station/strasbourg_10min_semicolon_decimalcomma_2021.csv', recipe => ({ ...recipe, time: { form: 'epoch', column: { name: 'timestamp', at: 0 }, unit: 's' } }))
    expect(bySeconds!.rows.time).toEqual(byDate!.rows.time)
    expect(bySeconds!.root).toEqual(byDate!.root)
  })

  const airports = withUnits({ temp: '[degF]', dewp: '[degF]', wind_speed: '[mi_i]/h', wind_gust: '[mi_i]/h', precip: '[in_i]', visib: '[mi_i]', pressure: 'mbar' })
  const byLocalTime = (recipe: Recipe): Recipe => ({
    ...airports(recipe), zone: 'America/New_York', stampMeans: 'instant', intervalS: null,
    time: { form: 'fields', year: { name: 'year', at: 1 }, month: { name: 'month', at: 2 }, day: { name: 'day', at: 3 }, hour: { name: 'hour', at: 4 }, minute: null, second: null },
  })

  it('three airports: a data set for each, and local columns agree with the UTC column over both clock changes (W10)', async () => {
    const local = await imported('station/three_airports_hourly_localtime_2013.csv', byLocalTime)
    const utc = await imported('station/three_airports_hourly_localtime_2013.csv', recipe => ({ ...airports(recipe), stampMeans: 'instant', intervalS: null }))
    expect(local.map(set => [set.title.split(', ').pop(), set.read, set.taken, set.refused])).toEqual([['EWR', 8703, 8703, 0], ['JFK', 8706, 8706, 0], ['LGA', 8706, 8706, 0]])
    expect(local.reduce((sum, set) => sum + set.read, 0)).toBe(26_115)
    local.forEach((set, n) => expect(set.root).toEqual(utc[n]!.root))
    expect(local[0]!.meta.doubledRows).toBe(6)
    const newark = local[0]!
    // 01 h stands twice on 3 November: 05:00Z and 06:00Z; 02 h of 10 March does not exist
    expect(at(newark, '2013-11-03T05:00:00Z')).toBeGreaterThan(0)
    expect(at(newark, '2013-11-03T06:00:00Z')).toBe(at(newark, '2013-11-03T05:00:00Z') + 1)
    expect(column(newark, 'temp').values[0]).toBe(39.02)
    expect(column(newark, 'wind_speed').values[0]).toBe(10.357019999999999)
    // a wind of 1048 mph is kept and marked
    const speeds = column(newark, 'wind_speed')
    const wildest = speeds.values.findIndex(value => value > 1000)
    expect(Math.round(speeds.values[wildest]!)).toBe(1048)
    expect(speeds.flags[wildest]! & 1).toBe(1)
    expect(local.map(set => column(set, 'temp').values.filter(value => Number.isNaN(value)).length).reduce((a, b) => a + b)).toBe(1)
  }, 60_000)

  it('a wall time that the clock skipped is refused with its reason', async () => {
    const upload = await room.uploadText('gap.csv', 'year,month,day,hour,temp\n2013,3,10,1,5.0\n2013,3,10,2,5.5\n2013,3,10,3,6.0\n')
    const job = await room.importUpload(upload.id, { ...upload.guess.recipe, zone: 'America/New_York', kind: 'station' })
    expect(job.dataSets[0]).toMatchObject({ rowsTaken: 2, rowsRefused: 1 })
  })

  it('one-minute record with quality columns: kPa, RH above 100 kept', async () => {
    const [set] = await imported('station/met_1min_20250619.csv')
    expect([set!.read, set!.taken, set!.refused]).toEqual([1440, 1440, 0])
    expect(column(set!, 'atmos_pressure').unitUcum).toBe('kPa')
    expect(column(set!, 'atmos_pressure').values[0]).toBe(98.39)
    expect(column(set!, 'rh_mean').values[2]).toBe(101.5)
    expect(column(set!, 'qc_rh_mean').role).toBe('quality')
    expect(set!.firstAt).toBe('2025-06-19T00:00:00.000Z')
  })

  it('tower: DATE and MST columns are UTC−7 all year; three temperatures at 2, 50 and 80 m', async () => {
    const [set] = await imported('station/tower_3heights_1min_20181014.csv')
    expect([set!.read, set!.taken, set!.refused]).toEqual([1440, 1440, 0])
    expect(set!.firstAt).toBe('2018-10-14T07:00:00.000Z')
    expect(set!.rows.columns.filter(one => one.quantity === 'air-temperature').map(one => one.heightM)).toEqual([2, 50, 80])
    expect(column(set!, 'Temperature @ 80m [deg C]').values[0]).toBe(-5.171)
    // the accumulating column falls back to 0 at midnight: kept, not turned into something negative (W16)
    expect([...column(set!, 'Global PSP (Accumulated) [kWhr/m^2]').values.slice(0, 2)]).toEqual([4.61923, 0])
  })

  it('campus: packed, split date and time, half a year of minutes with its gaps', async () => {
    const [set] = await imported('station/campus_1min_2013H2.csv.gz', recipe => ({ ...recipe, zone: 'America/New_York' }))
    expect(set!.read).toBe(156_631)
    expect(set!.taken + set!.refused).toBe(156_631)
    expect(set!.refused).toBe(0)
    expect(set!.firstAt).toBe('2013-07-02T04:00:00.000Z')
    expect(column(set!, 'press').values[0]).toBe(991)
    expect(readRoot(room.observations, set!.root).stepMs).toBe(60_000)
  }, 60_000)

  it('Kamloops: the cells say UTC and are UTC−8; the person\'s zone wins where the cells are not believed', async () => {
    const [believed] = await imported('station/kamloops_hourly_2016.csv')
    expect(believed!.firstAt).toBe('2016-01-01T00:00:00.000Z')
    const [set] = await imported('station/kamloops_hourly_2016.csv', recipe => ({ ...withUnits({ wind_spd: 'km/h', visib: 'km' })(recipe), zone: 'UTC-08:00', ignoresCellZone: true }))
    expect([set!.read, set!.taken, set!.refused]).toEqual([4368, 4368, 0])
    expect(set!.firstAt).toBe('2016-01-01T08:00:00.000Z')
    expect(column(set!, 'pressure').values[0]).toBe(99.95)
    expect(column(set!, 'wind_dir').unitUcum).toBe('10.deg')
    expect(column(set!, 'temp').values[0]).toBe(-9.1)
  })

  it('up and down: a comment line, no clock, both legs in the order of the file', async () => {
    const [set] = await imported('profiles/up_and_down_constructed.csv')
    expect([set!.read, set!.taken, set!.refused]).toEqual([373, 373, 0])
    expect(set!.meta.commentLines).toBe(1)
    expect(set!.rows.time.every(value => Number.isNaN(value))).toBe(true)
    const elapsed = column(set!, 'elapsed_s').values
    expect(elapsed.every((value, n) => n === 0 || value >= elapsed[n - 1]!)).toBe(true)
    expect(column(set!, 'height_m_msl').values[0]).toBe(491)
    expect(readRoot(room.observations, set!.root).heightDatum).toBe('sea level')
  })

  it('North Platte: no units in the head, a person says knots', async () => {
    const [set] = await imported('profiles/northplatte.csv', withUnits({ ws: '[kn_i]' }))
    expect([set!.read, set!.taken, set!.refused]).toEqual([71, 71, 0])
    expect(set!.rows.columns.map(one => `${one.quantity} ${one.unitUcum}`)).toEqual(['pressure hPa', 'height m', 'air-temperature Cel', 'dewpoint Cel', 'wind-direction deg', 'wind-speed [kn_i]'])
    expect(column(set!, 'ws').values[3]).toBe(31)
    expect(column(set!, 'altitude').values[70]).toBe(32_004)
  })

  it('keeps each source file byte for byte under its SHA-256, once', async () => {
    const sources = await room.read.selectFrom('source_file').selectAll().execute()
    const { createHash } = await import('node:crypto')
    const { readFileSync } = await import('node:fs')
    for (const source of sources) expect(createHash('sha256').update(readFileSync(room.files.pathOf(source.sha256))).digest()).toEqual(source.sha256)
    expect(sources.length).toBe(9) // eight real files and the one of the skipped hour, however often they were uploaded
  })
})
