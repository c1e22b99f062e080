import { createServer, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { createApp, createRouter, toNodeListener } from 'h3'
import { afterAll, beforeAll, expect, it, vi } from 'vitest'
import { inTerm, smallDepartment } from '../../fixtures/smallDepartment'
import { climb, smallFlight } from '../../fixtures/smallFlight'
import { libraryTexts } from '../../../seeds/labs'
import tryRoute from '../../../server/api/shares/[shareId]/practice/index.post'
import { ensureConvention } from '../../../server/domain/labs/conventions'
import { createLab } from '../../../server/domain/labs/createLab'
import { readyLabs } from '../../../server/domain/labs/library/readyLabs'
import { postLab } from '../../../server/domain/labs/postLab'
import { loadRoles } from '../../../server/domain/people/loadActor'
import { closeImports, useObservations } from '../../../server/utils/useImports'
import { closeLimits, useComputingLimits } from '../../../server/utils/useLimits'
import { closeStores, openStores, useStores } from '../../../server/utils/useStores'
import { closed1004 } from '../../../shared/thermo/conventions/closed1004'

/** The route itself, over HTTP. What only a build has is set in its place: whose session it is, the clock, and the build that judges, which a practice does not use. */
let personId = ''
vi.mock('../../../server/utils/requireActor', () => ({
  findActor: () => loadRoles(useStores().read, { personId, displayName: '', email: '', seenAt: 0 }, Buffer.alloc(32), inTerm),
}))
vi.mock('../../../server/utils/now', () => ({ now: () => inTerm + 3_600_000 }))
vi.mock('../../../server/utils/useReference', () => ({ useReference: () => { throw new Error('A practice judges nothing that is kept.') } }))

let server: Server
let shareId: string
const dataDir = mkdtempSync(join(tmpdir(), 'tetherhouse-'))

beforeAll(async () => {
  process.env.DATA_DIR = dataDir
  const stores = await openStores()
  const department = await smallDepartment(stores)
  personId = department.people.first
  const { id } = await stores.write(trx => ensureConvention(trx, closed1004, inTerm))
  await stores.write(trx => trx.updateTable('course').set({ convention_revision_id: id, state: 'open' }).execute())
  const versionId = await smallFlight(stores, dataDir, { ownerCourseId: department.courseId, title: 'Before the sun', rows: climb(400, 4, -28, 8), actorId: department.asked.actorId }, inTerm)
  const body = { ...readyLabs(libraryTexts()).find(lab => lab.key === 'morning-inversion')!.body, supply: [{ versionId, leg: 'up' as const, lowM: 0, highM: 100 }] }
  const made = await createLab(stores, { ...department.asked, courseId: department.courseId, body }, inTerm)
  await postLab(stores, useObservations(), {
    ...department.asked, labId: made.id, seenVersion: made.version,
    posting: { sections: [{ sectionId: department.sectionA, opensLocal: '2026-10-14T08:00', dueLocal: '2026-10-23T17:00' }], attempts: 3, keep: 'best', feedback: 'after_release' },
  }, inTerm)
  shareId = (await stores.read.selectFrom('share').innerJoin('holder_member', 'holder_member.holder_id', 'share.holder_id').select('share.id').where('holder_member.membership_id', '=', department.members.first).executeTakeFirstOrThrow()).id
  server = createServer(toNodeListener(createApp().use(createRouter().post('/api/shares/:shareId/practice', tryRoute))))
  await new Promise<void>(listening => server.listen(0, '127.0.0.1', listening))
})
afterAll(async () => {
  await new Promise(closed => server.close(closed))
  await closeImports()
  closeLimits()
  await closeStores()
  rmSync(dataDir, { recursive: true, force: true })
})

const ask = () => fetch(`http://127.0.0.1:${(server.address() as AddressInfo).port}/api/shares/${shareId}/practice`, {
  method: 'POST', headers: { 'content-type': 'application/json' }, body: JSON.stringify({ stepKey: 'rate-ends', typed: { 'rate-ends': '6 K/km' } }),
})

it('counts a try with the questions to the calculator: 120 a minute from one account, and then it says so', async () => {
  expect((await ask()).status).toBe(200)
  for (let times = 1; times < 119; times++) await useComputingLimits().compute(personId)
  expect((await ask()).status).toBe(200)
  expect((await ask()).status).toBe(429)
})
