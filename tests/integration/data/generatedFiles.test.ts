import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { fileURLToPath } from 'node:url'
import { readVersion } from '../../../server/observations/readVersion'
import type { Recipe } from '../../../shared/schemas/data'
import { openDataRoom, type DataRoom } from '../../fixtures/dataRoom'

const generated = (name: string) => fileURLToPath(new URL(`../../fixtures/generated/${name}`, import.meta.url))

describe('files of the generator become data sets', () => {
  let room: DataRoom
  beforeAll(async () => { room = await openDataRoom() })
  afterAll(() => room.remove())

  const imported = async (name: string, change: (recipe: Recipe) => Recipe = recipe => recipe) => {
    const upload = await room.uploadFile(generated(name))
    const job = await room.importUpload(upload.id, change(upload.guess.recipe))
    expect(job.problem).toBeNull()
    const version = await room.read.selectFrom('data_set_version').selectAll().where('id', '=', job.dataSets[0]!.versionId).executeTakeFirstOrThrow()
    return { job, version, rows: readVersion(room.observations, version.root_sha256) }
  }

  it('takes every row of the roof logger\'s day, with the code for missing humidity', async () => {
    const { version, rows } = await imported('station-day.csv')
    expect([version.rows_read, version.rows_taken, version.rows_refused]).toEqual([1400, 1400, 0])
    const humidity = rows.columns.find(column => column.quantity === 'relative-humidity')!
    expect(humidity.values.filter(value => Number.isNaN(value)).length).toBe(12)
    expect(rows.columns.map(column => column.unitUcum)).toEqual(['Cel', '%', 'hPa', 'm/s', 'm/s', 'deg', 'W/m2', 'mm'])
  })

  it('keeps the doubled hour of the field station apart (W10): 25 hours of 12 readings', async () => {
    const { version, rows } = await imported('station-clock-change.csv', recipe => ({ ...recipe, zone: 'America/Chicago' }))
    expect([version.rows_read, version.rows_taken, version.rows_refused]).toEqual([300, 300, 0])
    expect(version.last_at! - version.first_at!).toBe(299 * 300_000)
    expect([...rows.time].every((at, n) => n === 0 || at - rows.time[n - 1]! === 300_000)).toBe(true)
  })

  it('takes a flight with its clock, heights and both legs', async () => {
    const { version, rows } = await imported('flight-morning.csv')
    expect([version.rows_read, version.rows_taken, version.rows_refused]).toEqual([463, 463, 0])
    const height = rows.columns.find(column => column.quantity === 'height')!
    const top = height.values.indexOf(Math.max(...height.values))
    expect(top).toBeGreaterThan(100)
    expect(top).toBeLessThan(400)
  })
})
