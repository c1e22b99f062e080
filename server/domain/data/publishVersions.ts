import { refuse } from '#shared/errors'
import type { Trx } from '../../db/writer'
import { importer, type ImportedFile } from '../../importing/importFile'
import { newId } from '../ids'
import { appendEntry, courseChain, digestOf } from '../ledger/appendEntry'
import type { ImportPayload } from './startImport'

export interface PublishedDataSet { id: string, versionId: string, title: string, rowsTaken: number, rowsRefused: number }

/** What a version says about how it was made; kept in `data_set_version.meta_json`. */
export interface VersionMeta {
  station: string
  zone: string
  stampMeans: string
  heightDatum: string
  /** Rows of a doubled hour told apart by their order, in the whole file. */
  doubledRows: number
  commentLines: number
  /** Chunks that list the refused rows, in order. */
  refusals: string[]
}

/**
 * Makes version 1 of a data set for each record of an imported file: recipe, data sets, versions, columns, sources and the
 * ledger's entry, all in one unit of work. The chunks are there already, so a version never names what is not stored.
 */
export async function publishVersions(trx: Trx, input: { jobId: string, payload: ImportPayload, sourceSha256: Buffer, file: ImportedFile }, now: number): Promise<PublishedDataSet[]> {
  const { payload, file, sourceSha256 } = input
  const job = await trx.selectFrom('job').select('state').where('id', '=', input.jobId).executeTakeFirst()
  if (job?.state !== 'leased') refuse('import_cancelled')
  const recipeId = await keepRecipe(trx, payload, now)
  const published: PublishedDataSet[] = []
  for (const record of file.records) {
    const dataSetId = newId(now)
    const versionId = newId(now)
    const title = record.station === '' ? payload.recipe.title : `${payload.recipe.title}, ${record.station}`
    const meta: VersionMeta = {
      station: record.station, zone: payload.recipe.zone, stampMeans: payload.recipe.stampMeans, heightDatum: payload.recipe.heightDatum,
      doubledRows: file.doubledRows, commentLines: file.commentLines, refusals: record.refusals,
    }
    await trx.insertInto('data_set').values({ id: dataSetId, owner_course_id: payload.ownerCourseId, kind: payload.recipe.kind, title }).execute()
    await trx.insertInto('data_set_version').values({
      id: versionId, data_set_id: dataSetId, no: 1, parent_id: null, cause: 'import', reason: 'Imported', root_sha256: record.rootSha256,
      rows_read: record.rowsRead, rows_taken: record.rowsTaken, rows_refused: record.rowsRefused, first_at: record.firstAt, last_at: record.lastAt,
      recipe_revision_id: recipeId, importer, meta_json: JSON.stringify(meta), by_actor_id: payload.actorId, made_at: now,
    }).execute()
    await trx.insertInto('data_set_version_source').values({ version_id: versionId, ordinal: 1, source_sha256: sourceSha256 }).execute()
    await trx.insertInto('data_column').values(record.columns.map(column => ({
      version_id: versionId, no: column.no, name: column.name, quantity: column.quantity, unit_ucum: column.unitUcum, decimals: column.decimals,
      height_m: column.heightM, role: column.role, sensor_accuracy_id: null,
    }))).execute()
    published.push({ id: dataSetId, versionId, title, rowsTaken: record.rowsTaken, rowsRefused: record.rowsRefused })
  }
  await appendEntry(trx, {
    chain: courseChain(payload.courseId), at: now, actor: payload.actorId, action: 'data:import',
    facts: {
      uploadId: payload.uploadId, source: sourceSha256.toString('hex'), recipe: recipeId, isDepartmentWide: payload.ownerCourseId === null,
      versions: file.records.map((record, n) => ({ dataSetId: published[n]!.id, versionId: published[n]!.versionId, root: record.rootSha256.toString('hex'), rowsRead: record.rowsRead, rowsTaken: record.rowsTaken, rowsRefused: record.rowsRefused })),
    },
  })
  await trx.updateTable('job').set({ state: 'done', done_units: file.rowsRead, all_units: file.rowsRead, result_json: JSON.stringify(published) }).where('id', '=', input.jobId).execute()
  return published
}

/** The same recipe is one revision, however often it is used. */
async function keepRecipe(trx: Trx, payload: ImportPayload, now: number): Promise<string> {
  const digest = digestOf(payload.recipe)
  const known = await trx.selectFrom('recipe_revision').select('id').where('digest', '=', digest).executeTakeFirst()
  if (known) return known.id
  const id = newId(now)
  await trx.insertInto('recipe_revision').values({ id, recipe_key: id, no: 1, body_json: JSON.stringify(payload.recipe), digest }).execute()
  return id
}
