import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { DomainError } from '../../shared/errors'
import { refusalWords } from '../../shared/text'
import { readVersion } from '../../server/observations/readVersion'
import { refusedRows } from '../../server/domain/data/refusedRows'
import { openDataRoom, type DataRoom } from '../fixtures/dataRoom'
import { badFiles, capBytes, type BadFile } from './cases'

describe('every broken file has its verdict, and a refusal leaves nothing', () => {
  let room: DataRoom
  const cap = process.env.UPLOAD_MAX_BYTES
  beforeAll(async () => { process.env.UPLOAD_MAX_BYTES = String(200_000_000) })
  afterAll(() => {
    if (cap === undefined) delete process.env.UPLOAD_MAX_BYTES
    else process.env.UPLOAD_MAX_BYTES = cap
  })

  async function verdictOf(file: BadFile): Promise<void> {
    const { verdict } = file
    const before = await room.stored()
    const body = (async function* () { yield* file.bytes() })()
    if (verdict.at === 'upload') {
      const refused = await room.upload(file.name ?? 'record.csv', body).then(() => null, (error: unknown) => error)
      expect(refused).toBeInstanceOf(DomainError)
      const { code, facts } = refused as DomainError
      expect({ code, facts }).toMatchObject({ code: verdict.code, facts: verdict.facts ?? {} })
      expect(refusalWords[code].detail(facts)).not.toMatch(/undefined|NaN/)
      expect(await room.stored()).toEqual(before)
      return
    }
    const upload = await room.upload(file.name ?? 'record.csv', body)
    const recipe = file.said ? file.said(upload.guess.recipe) : upload.guess.recipe
    if (verdict.at === 'import') {
      const job = await room.importUpload(upload.id, recipe).catch((error: unknown) => {
        if (error instanceof DomainError) return { state: 'failed' as const, problem: { code: error.code, detail: refusalWords[error.code].detail(error.facts) } }
        throw error
      })
      expect(job.state).toBe('failed')
      expect(job.problem?.code).toBe(verdict.code)
      for (const fact of Object.values(verdict.facts ?? {})) expect(job.problem?.detail).toContain(String(fact))
      const { files, sources, ...rest } = await room.stored()
      expect(rest).toEqual({ chunks: before.chunks, uploads: before.uploads + 1, dataSets: before.dataSets, versions: before.versions, recipes: before.recipes })
      expect(files).toBe(sources)
      return
    }
    const job = await room.importUpload(upload.id, recipe)
    expect(job.problem).toBeNull()
    const set = job.dataSets[0]!
    expect({ taken: set.rowsTaken, refused: set.rowsRefused }).toEqual({ taken: verdict.taken, refused: verdict.refused })
    const version = await room.read.selectFrom('data_set_version').selectAll().where('id', '=', set.versionId).executeTakeFirstOrThrow()
    const rows = readVersion(room.observations, version.root_sha256)
    if (verdict.reasons) expect((await refusedRows(room.read, room.observations, { versionId: set.versionId, offset: 0, limit: 50 })).rows.map(row => row.reason)).toEqual(verdict.reasons)
    verdict.values?.forEach((values, n) => expect(rows.columns.map(column => column.values[n])).toEqual(values))
    if (verdict.times) expect([...rows.time].map(at => new Date(at).toISOString())).toEqual(verdict.times)
    if (verdict.name?.startsWith('file ')) expect(upload.name).toBe(verdict.name.slice(5))
    else if (verdict.name) expect(rows.columns[0]!.name).toBe(verdict.name)
  }

  beforeAll(async () => { room = await openDataRoom({ mostBytes: capBytes, isInThisThread: true }) })
  afterAll(() => room.remove())
  it.each(badFiles.map(file => [file.what, file] as const))('%s', async (_, file) => {
    if (file.verdict.at === 'upload' && file.verdict.code === 'file_too_large_unpacked') process.env.UPLOAD_MAX_BYTES = String(capBytes)
    try {
      await verdictOf(file)
    }
    finally {
      process.env.UPLOAD_MAX_BYTES = String(200_000_000)
    }
  }, 60_000)
})
