import type { Read } from '../../db/writer'
import type { Observations } from '../../observations/chunks'
import { readRows } from '../../observations/readRows'
import { readRoot } from '../../observations/root'
import { wallTimeAt } from '../terms/wallClock'

export interface RoofValue { quantity: string, value: number, unit: string, digits: number }
export interface RoofReading {
  /** The instant of the reading, ISO 8601. */
  at: string
  /** What a clock of the course's zone showed then; with the date, for a reading may be old. */
  wall: string
  values: RoofValue[]
}

/** What the running head has room for, in its order. */
const shown = ['air-temperature', 'relative-humidity', 'wind-speed', 'pressure'] as const
/** Rows looked back over for one that holds a temperature: a sensor may be silent for a while. */
const lookBack = 12

/** The last reading of the newest station record that a course may use: its own, or the department's. Null where there is none. */
export async function describeRoof(read: Read, observations: Observations, courseId: string): Promise<{ reading: RoofReading | null }> {
  const [version, course] = await Promise.all([
    read.selectFrom('data_set_version').innerJoin('data_set', 'data_set.id', 'data_set_version.data_set_id')
      .select(['data_set_version.root_sha256 as root', 'data_set_version.last_at as lastAt'])
      .where('data_set.kind', '=', 'station').where('data_set_version.last_at', 'is not', null)
      .where(eb => eb.or([eb('data_set.owner_course_id', 'is', null), eb('data_set.owner_course_id', '=', courseId)]))
      .orderBy('data_set_version.last_at', 'desc').orderBy('data_set_version.made_at', 'desc').executeTakeFirst(),
    read.selectFrom('course').innerJoin('term', 'term.id', 'course.term_id').select('term.zone').where('course.id', '=', courseId).executeTakeFirstOrThrow(),
  ])
  if (!version) return { reading: null }
  const { columns, rowCount } = readRoot(observations, version.root)
  const { rows } = readRows(observations, version.root, Math.max(0, rowCount - lookBack), lookBack)
  for (const row of rows.toReversed()) {
    // A flagged reading is not shown: the running head has no room to say why it is doubted.
    const values = shown.flatMap((quantity) => {
      const at = columns.findIndex((column, no) => column.quantity === quantity && !Number.isNaN(row.values[no]) && row.flags[no]?.length === 0)
      const column = columns[at]
      return column ? [{ quantity, value: row.values[at]!, unit: column.unitUcum, digits: Math.min(1, column.decimals) }] : []
    })
    if (values.some(value => value.quantity === 'air-temperature')) return { reading: { at: new Date(row.at).toISOString(), wall: wallTimeAt(row.at, course.zone), values } }
  }
  return { reading: null }
}
