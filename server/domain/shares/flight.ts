import type { Read } from '../../db/writer'
import type { Observations } from '../../observations/chunks'
import { readVersion } from '../../observations/readVersion'
import { readRoot } from '../../observations/root'
import type { Flight } from './servedData'

export interface FlightRow { versionId: string, versionNo: number, dataSetId: string, title: string, rootSha256: Buffer, madeAt: number }

/** The flights that a course may ask about: its own, those of the courses it comes from, and the department's, each version. A foreign one is missing. */
export async function listFlightVersions(read: Read, courseId: string): Promise<FlightRow[]> {
  const owners = await lineOf(read, courseId)
  return read.selectFrom('data_set_version').innerJoin('data_set', 'data_set.id', 'data_set_version.data_set_id')
    .select(['data_set_version.id as versionId', 'data_set_version.no as versionNo', 'data_set.id as dataSetId', 'data_set.title', 'data_set_version.root_sha256 as rootSha256', 'data_set_version.made_at as madeAt'])
    .where('data_set.kind', '=', 'flight').where(eb => eb.or([eb('data_set.owner_course_id', 'in', owners), eb('data_set.owner_course_id', 'is', null)]))
    .orderBy('data_set.title').orderBy('data_set_version.no', 'desc').execute()
}

const oldestTerm = 30

/** A course and its predecessors, term by term: a lab that was carried over still asks about their flights. */
async function lineOf(read: Read, courseId: string): Promise<string[]> {
  const line = [courseId]
  while (line.length < oldestTerm) {
    const row = await read.selectFrom('course').select('ancestor_id').where('id', '=', line[line.length - 1] ?? '').executeTakeFirst()
    if (!row?.ancestor_id || line.includes(row.ancestor_id)) break
    line.push(row.ancestor_id)
  }
  return line
}

/** Reads a flight's rows from the observations. */
export function readFlight(observations: Observations, row: Pick<FlightRow, 'versionId' | 'versionNo' | 'title' | 'rootSha256'>): Flight {
  const root = readRoot(observations, row.rootSha256)
  const { columns, time, rowCount } = readVersion(observations, row.rootSha256)
  return {
    versionId: row.versionId, versionNo: row.versionNo, title: row.title, rootSha256: row.rootSha256.toString('hex'), heightDatum: root.heightDatum, time, rowCount,
    columns: columns.map(column => ({ name: column.name, quantity: column.quantity, unit: column.unitUcum, decimals: column.decimals, role: column.role, values: column.values, flags: column.flags })),
  }
}
