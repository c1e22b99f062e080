import type { z } from 'zod'
import { refuse } from '#shared/errors'
import { unitLabel } from '#shared/schemas/data'
import type { dataSetReply, VersionFacts } from '#shared/schemas/dataReplies'
import type { Read } from '../../db/writer'
import type { Observations } from '../../observations/chunks'
import { readRoot } from '../../observations/root'
import type { VersionMeta } from './publishVersions'
import { sourceNames, unnamed } from './sourceNames'

const iso = (at: number | null): string | null => at === null ? null : new Date(at).toISOString()

/** A data set with its versions, newest first, and what each says about itself. */
export async function describeDataSet(read: Read, observations: Observations, dataSetId: string): Promise<z.input<typeof dataSetReply>> {
  const set = await read.selectFrom('data_set').selectAll().where('id', '=', dataSetId).executeTakeFirst()
  if (!set) return refuse('not_found')
  const versions = await read.selectFrom('data_set_version').select('id').where('data_set_id', '=', dataSetId).orderBy('no', 'desc').execute()
  const facts: VersionFacts[] = []
  for (const { id } of versions) facts.push(await describeVersion(read, observations, id))
  return { id: set.id, title: set.title, kind: set.kind, isDepartmentWide: set.owner_course_id === null, versions: facts }
}

export async function describeVersion(read: Read, observations: Observations, versionId: string): Promise<VersionFacts> {
  const version = await read.selectFrom('data_set_version').selectAll().where('id', '=', versionId).executeTakeFirst()
  if (!version) return refuse('not_found')
  const columns = await read.selectFrom('data_column').selectAll().where('version_id', '=', versionId).where('role', 'in', ['value', 'quality']).orderBy('no').execute()
  const sources = await read.selectFrom('data_set_version_source as used').innerJoin('source_file', 'source_file.sha256', 'used.source_sha256')
    .select(['used.source_sha256', 'source_file.size']).where('used.version_id', '=', versionId).orderBy('used.ordinal').execute()
  const set = await read.selectFrom('data_set').select('owner_course_id').where('id', '=', version.data_set_id).executeTakeFirstOrThrow()
  const names = await sourceNames(read, sources.map(source => source.source_sha256), { courseId: set.owner_course_id, actorId: version.by_actor_id, madeAt: version.made_at })
  const meta = JSON.parse(version.meta_json) as Partial<VersionMeta>
  const root = readRoot(observations, version.root_sha256)
  return {
    id: version.id, no: version.no, cause: version.cause, reason: version.reason, madeAt: new Date(version.made_at).toISOString(), madeBy: await nameOf(read, version.by_actor_id), importer: version.importer,
    rowsRead: version.rows_read, rowsTaken: version.rows_taken, rowsRefused: version.rows_refused, firstAt: iso(version.first_at), lastAt: iso(version.last_at),
    rootSha256: version.root_sha256.toString('hex'), stepMs: root.stepMs, heightDatum: root.heightDatum, station: meta.station ?? '', zone: meta.zone ?? 'UTC', stampMeans: meta.stampMeans ?? 'instant', doubledRows: meta.doubledRows ?? 0,
    columns: columns.map(column => ({
      no: column.no, name: column.name, quantity: column.quantity, unit: column.unit_ucum, unitLabel: unitLabel(column.quantity, column.unit_ucum), decimals: column.decimals ?? 0,
      heightM: column.height_m, role: column.role === 'quality' ? 'quality' : 'value',
    })),
    sources: sources.map(source => ({ sha256: source.source_sha256.toString('hex'), size: source.size, name: names.get(source.source_sha256.toString('hex')) ?? unnamed })),
  }
}

async function nameOf(read: Read, actorId: string): Promise<string> {
  const member = await read.selectFrom('membership').leftJoin('person', 'person.id', 'membership.person_id').select(['person.display_name', 'membership.pseudonym']).where('membership.id', '=', actorId).executeTakeFirst()
  if (member) return member.display_name ?? member.pseudonym
  const role = await read.selectFrom('department_role').leftJoin('person', 'person.id', 'department_role.person_id').select(['person.display_name', 'department_role.pseudonym']).where('department_role.id', '=', actorId).executeTakeFirst()
  return role?.display_name ?? role?.pseudonym ?? 'unknown'
}
