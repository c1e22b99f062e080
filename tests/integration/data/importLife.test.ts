import { mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { text } from 'node:stream/consumers'
import { pathToFileURL } from 'node:url'
import SQLite from 'better-sqlite3'
import { afterAll, afterEach, beforeEach, describe, expect, it } from 'vitest'
import { cancelImport } from '../../../server/domain/data/cancelImport'
import { describeDataSet } from '../../../server/domain/data/describeDataSet'
import { ImportRunner } from '../../../server/domain/data/importRunner'
import { liveChunks } from '../../../server/domain/data/liveChunks'
import { refusedRows, refusedRowsCsv } from '../../../server/domain/data/refusedRows'
import { sourceBytes } from '../../../server/domain/data/sourceBytes'
import { judgeDays } from '../../../server/importing/quality/judgeDays'
import { importFile } from '../../../server/importing/importFile'
import { openObservationsWriter } from '../../../server/observations/chunks'
import { readVersion } from '../../../server/observations/readVersion'
import { OpenDays, RecordWriter } from '../../../server/observations/recordWriter'
import type { StoredColumn } from '../../../server/observations/root'
import { sweepChunks } from '../../../server/observations/sweep'
import { recipe as recipeSchema } from '../../../shared/schemas/data'
import { openDataRoom, type DataRoom } from '../../fixtures/dataRoom'

const scratch = mkdtempSync(join(tmpdir(), 'tetherhouse-import-'))
afterAll(() => rmSync(scratch, { recursive: true, force: true }))

const head = 'time,temp,rh\n'
const rowsOf = (count: number, every = 60) => Array.from({ length: count }, (_, n) => `${new Date(Date.UTC(2026, 0, 1) + n * every * 1000).toISOString().slice(0, 19).replace('T', ' ')},${(10 + Math.sin(n / 200) * 5).toFixed(2)},${(60 + (n % 7)).toFixed(1)}\n`).join('')

describe('the life of an import', () => {
  let room: DataRoom
  beforeEach(async () => { room = await openDataRoom() })
  afterEach(() => room.remove())

  it('the stored bytes by the stored recipe give the same root again', async () => {
    const upload = await room.uploadText('record.csv', `${head}${rowsOf(5000)}2026-02-01 00:00:00,bad,60\n`)
    const job = await room.importUpload(upload.id, upload.guess.recipe)
    const version = await room.read.selectFrom('data_set_version').selectAll().where('id', '=', job.dataSets[0]!.versionId).executeTakeFirstOrThrow()
    const kept = await room.read.selectFrom('recipe_revision').selectAll().where('id', '=', version.recipe_revision_id).executeTakeFirstOrThrow()
    const other = openObservationsWriter(join(scratch, 'again'))
    const again = await importFile({ source: room.files.read(Buffer.from(upload.sha256, 'hex')), recipe: recipeSchema.parse(JSON.parse(kept.body_json)), mostBytes: 1e9, observations: other })
    other.close()
    expect(again.records[0]!.rootSha256).toEqual(version.root_sha256)
    expect(again.records[0]!.refusals).toEqual(JSON.parse(version.meta_json).refusals)
  })

  it('a source has the name that its course gave it, whatever the same bytes are called elsewhere', async () => {
    const upload = await room.uploadText('record.csv', `${head}${rowsOf(50)}`)
    const { dataSets: [made] } = await room.importUpload(upload.id, upload.guess.recipe)
    const version = await room.read.selectFrom('data_set_version').select(['id', 'made_at', 'data_set_id']).where('id', '=', made!.versionId).executeTakeFirstOrThrow()
    const own = await room.read.selectFrom('upload').selectAll().where('id', '=', upload.id).executeTakeFirstOrThrow()
    expect(own.course_id).not.toBeNull()
    // the department had the same file before and has it again since, under names that are nobody else's business
    for (const [id, at] of [['before', own.at + 1], ['since', own.at + 1e9]] as const) {
      await room.write(trx => trx.insertInto('upload').values({ ...own, id, course_id: null, by_actor_id: room.asked.actorId, original_name: `${id}.csv`, at: Math.min(at, version.made_at) }).execute())
    }
    const source = await sourceBytes(room.read, room.files, { versionId: version.id, ordinal: 1 })
    expect([source.name, await text(source.stream)]).toEqual(['record.csv', `${head}${rowsOf(50)}`])
    const described = async (dataSetId: string) => (await describeDataSet(room.read, room.observations, dataSetId)).versions[0]?.sources[0]?.name
    expect(await described(version.data_set_id)).toBe('record.csv')
    // a data set of the department, made in this course: by its maker's name
    await room.write(trx => trx.updateTable('data_set').set({ owner_course_id: null }).where('id', '=', version.data_set_id).execute())
    await room.write(trx => trx.insertInto('upload').values({ ...own, id: 'others', by_actor_id: room.asked.actorId, original_name: 'others.csv', at: version.made_at }).execute())
    expect(await described(version.data_set_id)).toBe('record.csv')
  })

  it('the same rows give the same root and chunks whatever was in memory when, also when they come in no order', () => {
    const rows = Array.from({ length: 6000 }, (_, n) => ({ line: n + 2, at: Date.UTC(2026, 0, 1) + ((n * 1597) % 6000) * 600_000 }))
    const column: StoredColumn = { no: 0, name: 'temp', quantity: 'air-temperature', unitUcum: 'Cel', decimals: 1, heightM: null, role: 'value' }
    const written = (name: string, mostCells: number) => {
      const store = openObservationsWriter(join(scratch, name))
      store.begin()
      const writer = new RecordWriter(store, new OpenDays(mostCells), { kind: 'station', isInterval: false, heightDatum: 'unknown', columnCount: 1 })
      for (const { at, line } of rows) writer.add(at, line, Float64Array.of(line / 10))
      const { root, rowCount } = writer.finish([column], judgeDays([column], 'station'))
      store.commit()
      const all = readVersion(store, root)
      store.close()
      const db = new SQLite(join(scratch, name, 'observations.db'), { readonly: true })
      const chunks = db.prepare('select hex(sha256) from chunk order by 1').pluck().all()
      db.close()
      return { root, rowCount, chunks, time: [...all.time], lines: new Set(all.line).size }
    }
    const roomy = written('roomy', 1_500_000)
    const tight = written('tight', 2000) // about ten of 42 days at once
    expect(tight.root).toEqual(roomy.root)
    expect(tight.chunks).toEqual(roomy.chunks) // days that got more rows later left nothing behind
    expect([tight.rowCount, tight.lines]).toEqual([6000, 6000])
    expect(tight.time).toEqual([...tight.time].sort((a, b) => a - b))
  })

  it('a cancelled import leaves nothing, and the file can be imported afterwards', async () => {
    const upload = await room.uploadText('long.csv', head + rowsOf(400_000))
    const before = await room.stored()
    const jobId = await room.start(upload.id, upload.guess.recipe)
    const running = room.runner.enqueue(jobId)
    while ((room.runner.progress(jobId)?.rows ?? 0) === 0) await new Promise(resolve => setTimeout(resolve, 5))
    expect((await room.job(jobId)).state).toBe('running')
    await cancelImport(room, room.runner, { jobId })
    await running
    expect((await room.job(jobId)).state).toBe('cancelled')
    expect(await room.stored()).toEqual(before)
    expect((await room.importUpload(upload.id, upload.guess.recipe)).dataSets[0]!.rowsTaken).toBe(400_000)
  }, 60_000)

  it('one that waits can be cancelled before it begins', async () => {
    const upload = await room.uploadText('short.csv', head + rowsOf(10))
    const jobId = await room.start(upload.id, upload.guess.recipe)
    await cancelImport(room, room.runner, { jobId })
    await room.runner.enqueue(jobId)
    expect((await room.job(jobId)).state).toBe('cancelled')
    expect((await room.stored()).chunks).toBe(0)
  })

  it('the death of the worker fails its job, says so, and leaves nothing', async () => {
    const dying = join(scratch, 'dying.mjs')
    writeFileSync(dying, 'process.exit(9)\n')
    const runner = new ImportRunner({ stores: room, files: room.files, dataDir: room.dataDir, mostBytes: 1e9, now: () => Date.now(), workerFile: pathToFileURL(dying) })
    const upload = await room.uploadText('short.csv', head + rowsOf(10))
    const before = await room.stored()
    const jobId = await room.start(upload.id, upload.guess.recipe)
    await runner.enqueue(jobId)
    expect(await room.job(jobId)).toMatchObject({ state: 'failed', problem: { code: 'import_failed' } })
    expect(await room.stored()).toEqual(before)
    expect((await room.importUpload(upload.id, upload.guess.recipe)).state).toBe('done') // another one is none the worse
  })

  it('an import that an earlier process left in the middle has failed; one that waited goes on; loose chunks are swept', async () => {
    const upload = await room.uploadText('short.csv', head + rowsOf(10))
    const left = await room.start(upload.id, upload.guess.recipe)
    const waiting = await room.start(upload.id, { ...upload.guess.recipe, title: 'waited' })
    await room.write(trx => trx.updateTable('job').set({ state: 'leased' }).where('id', '=', left).execute())
    const loose = openObservationsWriter(room.dataDir)
    loose.putChunk('values', Buffer.from('left over'))
    loose.close()
    await room.runner.resume()
    await room.runner.enqueue('none') // behind all that resume queued
    expect((await room.job(left)).state).toBe('failed')
    expect((await room.job(waiting)).state).toBe('done')
    const live = await liveChunks(room.read)
    expect(sweepChunks(room.dataDir, live)).toBe(0) // nothing loose is left
    expect((await room.stored()).chunks).toBe(7) // two days (the row at 00:00 ends the day before, W8): values and flags each, two months, a root
  })

  it('the same request twice is one upload and one import; the same bytes twice are one file', async () => {
    const bytes = head + rowsOf(20)
    const first = await room.uploadText('a.csv', bytes)
    const second = await room.uploadText('b.csv', bytes)
    expect(second.sha256).toBe(first.sha256)
    expect(await room.stored()).toMatchObject({ files: 1, sources: 1, uploads: 2 })
    await room.importUpload(first.id, first.guess.recipe)
    await room.importUpload(second.id, first.guess.recipe)
    expect(await room.stored()).toMatchObject({ dataSets: 2, recipes: 1, chunks: 7 }) // two data sets share their chunks
  })

  it('an upload that breaks off leaves nothing', async () => {
    const broken = room.upload('cut.csv', (async function* () {
      yield Buffer.from(head)
      throw new Error('the line went dead')
    })())
    await expect(broken).rejects.toThrow('the line went dead')
    expect(await room.stored()).toMatchObject({ files: 0, uploads: 0 })
    expect(readdirSync(join(room.dataDir, 'files', 'incoming'))).toEqual([])
  })

  it('lists each refused row with line, column, text and reason, and hands them out without formulas', async () => {
    const upload = await room.uploadText('bad.csv', `${head}${rowsOf(20)}2026-01-02 00:00:00,=1+1,60\n2026-01-02 00:01:00,1.0,"<b>wet</b>"\n2026-01-02 00:02:00,-5+1,60\n2026-13-01 00:00:00,1,2\n2026-01-02 00:04:00\n`)
    const job = await room.importUpload(upload.id, upload.guess.recipe)
    expect(job.dataSets[0]).toMatchObject({ rowsTaken: 20, rowsRefused: 5 })
    const versionId = job.dataSets[0]!.versionId
    const { rows, total } = await refusedRows(room.read, room.observations, { versionId, offset: 0, limit: 10 })
    expect(total).toBe(5)
    expect(rows.map(row => [row.line, row.column, row.text])).toEqual([[22, 'temp', '=1+1'], [23, 'rh', '<b>wet</b>'], [24, 'temp', '-5+1'], [25, 'time', '2026-13-01 00:00:00'], [26, '', '2026-01-02 00:04:00']])
    expect((await refusedRows(room.read, room.observations, { versionId, offset: 3, limit: 1 })).rows.map(row => row.line)).toEqual([25])
    let csv = ''
    for await (const part of refusedRowsCsv(room.read, room.observations, versionId)) csv += part
    expect(csv.split('\r\n')[1]).toBe('22,temp,\'=1+1,"not a number, and not one of the missing codes of this column"')
    expect(csv).toContain('24,temp,\'-5+1')
  })

  it('a department\'s data set is for a technician to make', async () => {
    const upload = await room.uploadText('short.csv', head + rowsOf(10))
    await expect(room.start(upload.id, upload.guess.recipe, true)).rejects.toMatchObject({ code: 'not_allowed' })
  })
})
