import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { describeRoof } from '../../../server/domain/data/describeRoof'
import { describePlaces } from '../../../server/domain/people/describePlaces'
import type { Acting } from '../../../server/domain/people/actor'
import { openObservations, openObservationsWriter } from '../../../server/observations/chunks'
import { OpenDays, RecordWriter } from '../../../server/observations/recordWriter'
import { inTerm, postedLab, smallDepartment } from '../../fixtures/smallDepartment'
import { temporaryStores, type TemporaryStores } from '../../fixtures/temporaryStores'

let stores: TemporaryStores
let house: Awaited<ReturnType<typeof smallDepartment>>
beforeEach(async () => {
  stores = await temporaryStores()
  house = await smallDepartment(stores)
})
afterEach(() => stores.remove())

const acting = (role: Acting['role'], actorId: string, sectionIds: string[]): Acting => ({ role, actorId, courseId: house.courseId, sectionIds })
const first = () => acting('student', house.members.first, [house.sectionA])
const ask = (who: Acting, now = inTerm) => describePlaces(stores.read, { acting: who, courseId: house.courseId }, now)

describe('what waits at the places of a course', () => {
  it('counts a lab as due while it is open, not yet due, and nothing of it was handed in', async () => {
    const { labId } = await postedLab(stores, { courseId: house.courseId, title: 'Lapse rates', times: { [house.sectionA]: ['2026-10-12T08:00', '2026-10-16T17:00'] } })
    expect((await ask(first())).counts.due).toBe(1)
    expect((await ask(acting('student', house.members.second, [house.sectionB]))).counts.due).toBe(0)
    expect((await ask(first(), Date.parse('2026-10-11T12:00:00Z'))).counts.due).toBe(0)
    expect((await ask(first(), Date.parse('2026-10-17T12:00:00Z'))).counts.due).toBe(0)
    await handIn(labId)
    expect((await ask(first())).counts.due).toBe(0)
  })

  it('calls marks new for a week after they are released, and only for who handed in', async () => {
    const { labId, postings } = await postedLab(stores, { courseId: house.courseId, title: 'Lapse rates', times: { [house.sectionA]: ['2026-10-01T08:00', '2026-10-10T17:00'] } })
    await stores.write(trx => trx.updateTable('posting').set({ released_at: inTerm - 86_400_000 }).where('id', '=', postings[house.sectionA]!).execute())
    expect((await ask(first())).counts.fresh).toBe(0)
    await handIn(labId)
    expect((await ask(first())).counts.fresh).toBe(1)
    expect((await ask(first(), inTerm + 7 * 86_400_000)).counts.fresh).toBe(0)
    expect((await ask(acting('ta', house.members.ta, [house.sectionA]))).counts.fresh).toBe(0)
  })

  it('names the teaching week by the zone of the term', async () => {
    // Weeks of the small department begin on Monday 24 August 2026; 14 October lies in the eighth.
    expect((await ask(first())).week).toBe(8)
    expect((await ask(first(), Date.parse('2026-10-12T05:00:00Z'))).week).toBe(7) // still Sunday in Denver
    expect((await ask(first(), Date.parse('2026-11-25T18:00:00Z'))).week).toBeNull() // fall break
  })

  async function handIn(labId: string) {
    const member = house.members.first
    await stores.write(async (trx) => {
      await trx.insertInto('draw').values({ id: `draw-${labId}`, lab_id: labId, lab_revision_id: (await trx.selectFrom('lab_revision').select('id').where('lab_id', '=', labId).orderBy('no', 'desc').executeTakeFirstOrThrow()).id, algorithm: 'none', seed: Buffer.alloc(16), supply_json: '[]', supply_sha256: Buffer.alloc(32), made_at: inTerm }).execute()
      const set = await trx.insertInto('data_set').values({ id: `set-${labId}`, owner_course_id: null, kind: 'flight', title: 'Flight' }).returning('id').executeTakeFirstOrThrow()
      await trx.insertInto('data_set_version').values(versionOf(`version-${labId}`, set.id, Buffer.alloc(32, 2), inTerm)).execute()
      await trx.insertInto('holder').values({ id: `holder-${labId}`, lab_id: labId, kind: 'one' }).execute()
      await trx.insertInto('holder_member').values({ holder_id: `holder-${labId}`, membership_id: member, lab_id: labId }).execute()
      await trx.insertInto('share').values({ id: `share-${labId}`, lab_id: labId, holder_id: `holder-${labId}`, redraw: 0, draw_id: `draw-${labId}`, ordinal: 1, supply_no: 1, data_set_version_id: `version-${labId}`, inputs_json: '{}', served_sha256: Buffer.alloc(32), digest: Buffer.alloc(32), reason_digest: null }).execute()
      const chain = await trx.selectFrom('ledger_entry').select(['chain_id', 'seq']).executeTakeFirstOrThrow()
      const revision = await trx.selectFrom('lab_revision').select('id').where('lab_id', '=', labId).orderBy('no', 'desc').executeTakeFirstOrThrow()
      await trx.insertInto('submission').values({
        id: `submission-${labId}`, seq: 1, share_id: `share-${labId}`, attempt: 1, by_membership_id: member, lab_revision_id: revision.id, received_at: inTerm - 1000, due_at_applied: inTerm, late_units: 0, late_rule_json: '{"kind":"none"}', late_reason: '',
        claimed_sent_at: null, request_key: `key-${labId}`, body_sha256: Buffer.alloc(32), receipt_no: `R-${labId}`, ledger_chain: chain.chain_id, ledger_seq: chain.seq,
      }).execute()
    })
  }
})

describe('the roof’s last reading', () => {
  const at = Date.parse('2026-10-14T15:55:00Z')

  it('is the last row of the newest station record that holds a temperature, unflagged, by the course’s clock', async () => {
    await keepStation('dept', null, [[at - 600_000, 8.2, 71.2, 0], [at - 300_000, 9.84, 70.4, 0], [at, 55, 69, 1]])
    const { reading } = await roof()
    expect(reading).toEqual({
      at: '2026-10-14T15:50:00.000Z', wall: '2026-10-14T09:50',
      values: [{ quantity: 'air-temperature', value: 9.84, unit: 'Cel', digits: 1 }, { quantity: 'relative-humidity', value: 70.4, unit: '%', digits: 1 }],
    })
  })

  it('leaves out what is missing and looks back past rows without a temperature', async () => {
    await keepStation('dept', null, [[at - 300_000, 7.5, Number.NaN, 0], [at, Number.NaN, 69, 0]])
    expect((await roof()).reading?.values.map(value => value.quantity)).toEqual(['air-temperature'])
  })

  it('shows nothing of another course’s station, and nothing where there is none', async () => {
    expect((await roof()).reading).toBeNull()
    await keepStation('other', 'elsewhere', [[at, 9, 70, 0]])
    expect((await roof()).reading).toBeNull()
    await keepStation('own', house.courseId, [[at - 900_000, 8, 70, 0]])
    expect((await roof()).reading?.values[0]?.value).toBe(8)
  })

  async function roof() {
    const observations = openObservations(stores.dataDir)
    try {
      return await describeRoof(stores.read, observations, house.courseId)
    }
    finally {
      observations.close()
    }
  }

  async function keepStation(id: string, owner: string | null, rows: [time: number, temperature: number, humidity: number, flag: number][]) {
    const writer = openObservationsWriter(stores.dataDir)
    const record = new RecordWriter(writer, new OpenDays(), { kind: 'station', isInterval: false, heightDatum: 'above ground', columnCount: 2 })
    writer.begin()
    rows.forEach(([time, temperature, humidity], line) => record.add(time, line + 2, Float64Array.of(temperature, humidity)))
    const column = { decimals: 2, heightM: 2, role: 'value' as const }
    const kept = record.finish(
      [{ no: 1, name: 'T', quantity: 'air-temperature', unitUcum: 'Cel', ...column }, { no: 2, name: 'RH', quantity: 'relative-humidity', unitUcum: '%', ...column }],
      day => [Uint8Array.from(day.time, time => rows.find(row => row[0] === time)?.[3] ?? 0), new Uint8Array(day.time.length)],
    )
    writer.commit()
    writer.close()
    await stores.write(async (trx) => {
      if (owner === 'elsewhere') {
        const course = await trx.selectFrom('course').selectAll().executeTakeFirstOrThrow()
        await trx.insertInto('course').values({ ...course, id: 'elsewhere', code: 'ATM 999' }).execute()
      }
      await trx.insertInto('data_set').values({ id: `station-${id}`, owner_course_id: owner, kind: 'station', title: 'Roof' }).execute()
      await trx.insertInto('data_set_version').values(versionOf(`kept-${id}`, `station-${id}`, kept.root, kept.lastAt)).execute()
    })
  }
})

const versionOf = (id: string, dataSetId: string, root: Buffer, lastAt: number | null) => ({
  id, data_set_id: dataSetId, no: 1, parent_id: null, cause: 'import' as const, reason: '', root_sha256: root, rows_read: 1, rows_taken: 1, rows_refused: 0, first_at: lastAt, last_at: lastAt,
  recipe_revision_id: null, importer: 'test', meta_json: '{}', by_actor_id: house.asked.actorId, made_at: inTerm,
})
