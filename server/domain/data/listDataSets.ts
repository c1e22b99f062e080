import type { DataSetLine } from '#shared/schemas/dataReplies'
import type { Read } from '../../db/writer'

const iso = (at: number | null): string | null => at === null ? null : new Date(at).toISOString()

/** The data sets that a course can use: its own, and those of the department; without a course, the department's alone. Newest first. */
export async function listDataSets(read: Read, courseId: string | null): Promise<DataSetLine[]> {
  const rows = await read.selectFrom('data_set')
    .innerJoin('data_set_version as version', 'version.data_set_id', 'data_set.id')
    .where(where => where.or([where('data_set.owner_course_id', 'is', null), ...(courseId === null ? [] : [where('data_set.owner_course_id', '=', courseId)])]))
    .where('version.no', '=', eb => eb.selectFrom('data_set_version as other').select(max => max.fn.max('other.no').as('no')).whereRef('other.data_set_id', '=', 'data_set.id'))
    .select(['data_set.id', 'data_set.title', 'data_set.kind', 'data_set.owner_course_id', 'version.id as versionId', 'version.no', 'version.rows_taken', 'version.rows_refused', 'version.first_at', 'version.last_at', 'version.made_at'])
    .orderBy('version.made_at', 'desc').orderBy('data_set.title').execute()
  if (rows.length === 0) return []
  const columns = await read.selectFrom('data_column').select(['version_id', 'quantity', 'no']).where('version_id', 'in', rows.map(row => row.versionId)).where('role', '=', 'value').orderBy('no').execute()
  const quantities = new Map<string, string[]>()
  for (const column of columns) {
    const list = quantities.get(column.version_id) ?? []
    if (!list.includes(column.quantity)) list.push(column.quantity)
    quantities.set(column.version_id, list)
  }
  return rows.map(row => ({
    id: row.id, title: row.title, kind: row.kind, isDepartmentWide: row.owner_course_id === null, versionId: row.versionId, versionNo: row.no, rows: row.rows_taken, refused: row.rows_refused,
    firstAt: iso(row.first_at), lastAt: iso(row.last_at), madeAt: new Date(row.made_at).toISOString(), quantities: quantities.get(row.versionId) ?? [],
  }))
}
