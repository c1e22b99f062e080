import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { defaultConvention } from '../../../shared/thermo/conventions'
import { dayOfTerm, demoCalendar } from '../../../seeds/calendar'
import { libraryTexts } from '../../../seeds/labs'
import { Observing } from '../../../seeds/observing'
import { ensureConvention } from '../../../server/domain/labs/conventions'
import { beginLab } from '../../../server/domain/labs/library/beginLab'
import { proofRun } from '../../../server/domain/labs/proof/proofRun'
import { openObservations, type Observations } from '../../../server/observations/chunks'
import { demoFlight } from '../../fixtures/demoFlight'
import { inTerm as now, smallDepartment } from '../../fixtures/smallDepartment'
import { temporaryStores, type TemporaryStores } from '../../fixtures/temporaryStores'

let stores: TemporaryStores
let observations: Observations
let department: Awaited<ReturnType<typeof smallDepartment>>
const texts = libraryTexts()

beforeAll(async () => {
  stores = await temporaryStores()
  department = await smallDepartment(stores)
  const { id } = await stores.write(trx => ensureConvention(trx, defaultConvention, now))
  await stores.write(trx => trx.updateTable('course').set({ convention_revision_id: id }).execute())
  const { running } = demoCalendar(Date.UTC(2026, 11, 1, 18))
  const days = [2, 5, 8].map(week => dayOfTerm(running, week, 3))
  const observing = new Observing(running.name, dayOfTerm(running, 1, 1), dayOfTerm(running, 9, 1), days)
  for (const [which, date] of days.entries()) {
    for (const file of observing.flights(date, 21 + 3 * which)) await demoFlight(stores, stores.dataDir, { ownerCourseId: department.courseId, file, actorId: department.asked.actorId }, now)
  }
  observations = openObservations(stores.dataDir)
})
afterAll(async () => {
  observations.close()
  await stores.remove()
})

describe('a ready lab on the flights of a term', () => {
  it.each([...texts.keys()])('%s is taken with shares, and its proof run finds nothing that would have to be settled before the posting', async (key) => {
    const made = await beginLab(stores, observations, { ...department.asked, courseId: department.courseId, memberships: [], texts, beginning: { from: 'library', key } }, now)
    expect(made.shares).toBeGreaterThanOrEqual(3)
    const proof = await proofRun(stores.read, observations, made.id)
    expect(proof.reds.map(red => `${red.kind}: ${red.text}`)).toEqual([])
    expect(proof).toMatchObject({ problems: [], isReady: true })
    expect(proof.shares).toHaveLength(made.shares)
  }, 120_000)
})
