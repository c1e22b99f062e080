import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { openDatabase, type OpenDatabase } from '../../../server/db/open'
import type { AccessPage } from '#shared/schemas/departmentReplies'
import { listAccess } from '../../../server/domain/records/listAccess'
import { readVisit } from '../../../server/domain/records/readVisit'
import { buildWorld, type World } from '../../fixtures/world'

describe('what a visitor reads', () => {
  let stores: OpenDatabase
  let world: World
  let dataDir: string
  let role: { roleId: string, personId: string }
  const now = Date.now()

  beforeAll(async () => {
    dataDir = mkdtempSync(join(tmpdir(), 'tetherhouse-visit-'))
    stores = await openDatabase(dataDir)
    world = await buildWorld(stores, dataDir, now)
    const personId = world.people.visitor!.personId
    role = { personId, roleId: (await stores.read.selectFrom('department_role').select('id').where('person_id', '=', personId).executeTakeFirstOrThrow()).id }
  }, 120_000)
  afterAll(async () => {
    await stores.close()
    rmSync(dataDir, { recursive: true, force: true })
  })
  const logged = () => stores.read.selectFrom('access_log').selectAll().execute()
  const entries = () => stores.read.selectFrom('ledger_entry').select(['actor', 'facts_json']).where('action', '=', 'visit.read').execute()

  it('is the stated course alone, what was released in it, and nobody by name; each look is logged', async () => {
    const visit = await readVisit(stores, role, now)
    // The role was given until a day that is thirty days off; it is good to that day's end on the department's wall.
    expect(visit.lastDay).toBe(new Date(now + 30 * 86_400_000).toISOString().slice(0, 10))
    expect(visit.courses.map(course => course.title)).toEqual([expect.stringContaining(world.courseCanaries.main)])
    const postings = visit.courses[0]!.postings
    expect(postings.length).toBeGreaterThan(0)
    for (const posting of postings) expect(posting.title).toMatch(/^Released/)
    const pieces = postings.flatMap(posting => posting.pieces)
    expect(pieces.length).toBeGreaterThan(2)
    const text = JSON.stringify(visit)
    for (const person of Object.values(world.people)) expect([person.name, text.includes(person.canary), text.includes(person.email)]).toEqual([person.name, false, false])
    const pseudonyms = await stores.read.selectFrom('membership').select(['id', 'pseudonym']).execute()
    const shown = pieces.map(piece => pseudonyms.find(row => row.pseudonym === piece.pseudonym)!.id).toSorted()
    expect((await logged()).map(line => line.subject_membership_id).toSorted()).toEqual([...new Set(shown)])
    expect((await logged()).every(line => line.actor_person_id === role.personId)).toBe(true)
    expect(await entries()).toEqual([{ actor: role.roleId, facts_json: expect.stringContaining(`"people":${new Set(shown).size}`) }])
  })

  it('logs each further look, and enters the ledger once an hour', async () => {
    const lines = (await logged()).length
    await readVisit(stores, role, now + 60_000)
    expect((await logged()).length).toBe(2 * lines)
    expect(await entries()).toHaveLength(1)
    await readVisit(stores, role, now + 3_700_000)
    expect(await entries()).toHaveLength(2)
  })

  it('can be read by the admin: who looked at whose record, of whichever of the two, a page at a time, and stays as it stands', async () => {
    await readVisit(stores, role, now)
    const lines = await logged()
    const all: AccessPage['lines'] = []
    let page = await listAccess(stores.read, { personId: null, before: null })
    for (all.push(...page.lines); page.next !== null; all.push(...page.lines)) page = await listAccess(stores.read, { personId: null, before: page.next })
    expect(all.map(line => line.seq)).toEqual(lines.map(line => line.seq).toSorted((a, b) => b - a))
    expect(new Set(all.map(line => line.by))).toEqual(new Set([world.people.visitor!.name]))
    const owner = await stores.read.selectFrom('membership').innerJoin('person', 'person.id', 'membership.person_id').select(['person.id', 'person.display_name as name', 'membership.id as membershipId']).where('membership.id', '=', lines[0]!.subject_membership_id).executeTakeFirstOrThrow()
    const theirs = await listAccess(stores.read, { personId: owner.id, before: null })
    expect(theirs.lines.length).toBeGreaterThan(0)
    expect(theirs.lines.every(line => line.about === owner.name && line.route === 'GET /api/department/visit')).toBe(true)
    expect((await listAccess(stores.read, { personId: role.personId, before: null })).lines[0]?.seq).toBe(all[0]?.seq)
    expect((await listAccess(stores.read, { personId: 'nobody', before: null })).lines).toEqual([])
    expect(page.people.map(person => person.name)).toEqual(expect.arrayContaining([world.people.visitor!.name, owner.name]))
    expect(() => stores.raw.prepare('delete from access_log').run()).toThrow(/append-only/)
  })
})
