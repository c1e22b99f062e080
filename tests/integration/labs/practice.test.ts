import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { labBody, type LabBody } from '../../../shared/schemas/lab'
import { closed1004 } from '../../../shared/thermo/conventions/closed1004'
import { libraryTexts } from '../../../seeds/labs'
import { bindingProblems } from '../../../server/domain/labs/bindingProblems'
import { ensureConvention } from '../../../server/domain/labs/conventions'
import { createLab } from '../../../server/domain/labs/createLab'
import { readyLabs } from '../../../server/domain/labs/library/readyLabs'
import { practicedSteps } from '../../../server/domain/labs/practice/practicedSteps'
import { readPractice } from '../../../server/domain/labs/practice/readPractice'
import { tryPractice } from '../../../server/domain/labs/practice/tryPractice'
import { postLab } from '../../../server/domain/labs/postLab'
import { prepareLab } from '../../../server/domain/labs/prepareLab'
import { loadShare } from '../../../server/domain/shares/loadShare'
import { readWork } from '../../../server/domain/submissions/readWork'
import { openObservations, type Observations } from '../../../server/observations/chunks'
import { climb, smallFlight } from '../../fixtures/smallFlight'
import { inTerm as now, smallDepartment } from '../../fixtures/smallDepartment'
import { temporaryStores, type TemporaryStores } from '../../fixtures/temporaryStores'

let stores: TemporaryStores
let observations: Observations
let department: Awaited<ReturnType<typeof smallDepartment>>
let versionId: string
let who: { membershipId: string, shareId: string }
const flown = climb(400, 4, -28, 8)
const ready = readyLabs(libraryTexts())
const inversion = ready.find(lab => lab.key === 'morning-inversion')!.body
const later = now + 3_600_000
const load = (shareId: string) => loadShare(stores.read, observations, shareId)
/** The share as of another lab: a practice takes nothing of a share but its lab and convention. */
const loadAs = (body: LabBody) => async (shareId: string) => {
  const loaded = await load(shareId)
  return { ...loaded, revision: { ...loaded.revision, body } }
}
const attemptIn = (body: LabBody, stepKey: string, typed: Record<string, string>) => tryPractice(stores.read, loadAs(body), who, { stepKey, typed }, later)
const attempt = (stepKey: string, typed: Record<string, string>) => tryPractice(stores.read, load, who, { stepKey, typed }, later)

beforeAll(async () => {
  stores = await temporaryStores()
  department = await smallDepartment(stores)
  const { id } = await stores.write(trx => ensureConvention(trx, closed1004, now))
  await stores.write(trx => trx.updateTable('course').set({ convention_revision_id: id }).execute())
  versionId = await smallFlight(stores, stores.dataDir, { ownerCourseId: department.courseId, title: 'Before the sun', rows: flown, actorId: department.asked.actorId }, now)
  observations = openObservations(stores.dataDir)
  const made = await createLab(stores, { ...department.asked, courseId: department.courseId, body: { ...inversion, supply: [{ versionId, leg: 'up', lowM: 0, highM: 100 }] } }, now)
  await postLab(stores, observations, {
    ...department.asked, labId: made.id, seenVersion: made.version,
    posting: { sections: [{ sectionId: department.sectionA, opensLocal: '2026-10-14T08:00', dueLocal: '2026-10-23T17:00' }], attempts: 3, keep: 'best', feedback: 'after_release' },
  }, now)
  const share = await stores.read.selectFrom('share').innerJoin('holder_member', 'holder_member.holder_id', 'share.holder_id').select('share.id').where('holder_member.membership_id', '=', department.members.first).executeTakeFirstOrThrow()
  who = { membershipId: department.members.first, shareId: share.id }
})
afterAll(async () => {
  observations.close()
  await stores.remove()
})

describe('a practice', () => {
  it('is offered beside the lab, with the aims and the field plan, and without the marking guide', async () => {
    const work = await readWork(stores.read, load, who, later)
    expect(work.lab).toMatchObject({ hasPractice: true, aims: inversion.aims, fieldPlan: inversion.fieldPlan })
    expect(JSON.stringify(work)).not.toContain(inversion.guide.slice(2, 40))
  })

  it('shows readings that are not the student’s, and no worked value before a try', async () => {
    const practice = await readPractice(stores.read, load, who, later)
    const { rows } = await load(who.shareId)
    const served = practice.served.columns.find(column => column.quantity === 'air-temperature')!.texts
    const own = rows.columns.find(column => column.quantity === 'air-temperature')!.texts
    expect(served).not.toEqual(own)
    expect(served).toEqual(inversion.practice!.rows.map(row => row[2]))
    expect(JSON.stringify(practice)).not.toMatch(/worked|accepted/)
    expect((await attempt('rate-ends', { 'rate-ends': '' })).worked).toBeNull()
    expect((await attempt('rate-ends', { 'rate-ends': 'about six' })).worked).toBeNull()
  })

  it('judges a try by its own readings and shows how the value comes about', async () => {
    const { columns, rows } = inversion.practice!
    const at = (quantity: string) => columns.findIndex(column => column.quantity === quantity)
    const used = rows.map(row => ({ z: Number(row[at('height')]), t: Number(row[at('air-temperature')]) })).filter(({ z }) => z <= 100)
    const [low, high] = [used.reduce((a, b) => b.z < a.z ? b : a), used.reduce((a, b) => b.z > a.z ? b : a)]
    const rate = -1000 * (high.t - low.t) / (high.z - low.z)
    const right = await attempt('rate-ends', { 'rate-ends': `${rate.toFixed(1)} K/km` })
    expect(right).toMatchObject({ judged: 'within', slip: null })
    expect(Number(right.worked?.value)).toBeCloseTo(rate, 1)
    expect(right.worked?.lines.length).toBeGreaterThan(0)
    const turned = await attempt('rate-ends', { 'rate-ends': `${(-rate).toFixed(1)} K/km` })
    expect(turned.judged).not.toBe('within')
    expect(turned.slip).toContain('upside down')
  })

  it('never shows what is the same for every share: a class, a choice, a number from the text or the constants alone', async () => {
    for (const stepKey of ['stability', 'dry-rate', 'no-such-step']) await expect(attempt(stepKey, { [stepKey]: 'stable', 'dry-rate': '9.8 K/km' })).rejects.toMatchObject({ code: 'not_found' })
    const keys = (key: string) => practicedSteps(ready.find(lab => lab.key === key)!.body).map(step => step.key)
    expect(keys('late-sensor')).toEqual(['line-slope', 'line-error', 'error-up', 'corrected'])
    expect(keys('wet-bulb-outdoors')).not.toContain('fan')
  })

  it('works no value of the student’s own: what was typed in earlier steps, also as an own reading, is carried nowhere', async () => {
    const outdoors = ready.find(lab => lab.key === 'wet-bulb-outdoors')!.body
    const vapor = { vapor: '12.3 hPa' }
    const plain = await attemptIn(outdoors, 'vapor', vapor)
    expect(plain.worked?.lines.length).toBeGreaterThan(0)
    expect(await attemptIn(outdoors, 'vapor', { ...vapor, dry: '31.7 °C', humidity: '43 %' })).toEqual(plain)
    // at the reference pressure the temperature is the potential temperature: 400 K would follow from the 400 K typed before it
    const twice = labBody.parse({ ...inversion, steps: [
      { key: 'first', kind: 'number', title: 'A', pointsMilli: 1, quantity: 'potential-temperature', unit: 'K', inputs: { pressure: { from: 'share', column: 'pressure', read: 'lowest' }, temperature: { from: 'share', column: 'air-temperature', read: 'lowest' } } },
      { key: 'second', kind: 'number', title: 'B', pointsMilli: 1, quantity: 'temperature-from-potential-temperature', unit: 'K', digits: 5, inputs: { pressure: { from: 'text', value: 1000, unit: 'hPa' }, potentialTemperature: { from: 'step', key: 'first' } } },
    ] })
    expect(await attemptIn(twice, 'second', { first: '400.0 K', second: '400.0 K' })).toMatchObject({ judged: 'above' })
  })

  it('holds back what rests on a step that is held back, whose value its working would print', async () => {
    await expect(attempt('parcel', { parcel: '10 °C' })).rejects.toMatchObject({ code: 'not_found' })
    expect(practicedSteps(inversion).map(step => step.key)).toEqual(['rate-ends', 'rate-fit', 'fit-error', 'theta-base', 'theta-top'])
  })

  it('holds back what rests on the bounds of the layer alone, which are no data', async () => {
    const bound = (read: string) => ({ from: 'share', column: 'height', read })
    const ratio = (key: string, low: string, high: string) => ({ key, kind: 'number', title: key, pointsMilli: 1, quantity: 'lapse-rate-of-two-readings', unit: 'K/km', inputs: {
      lowHeight: bound(low), highHeight: bound(high), lowTemperature: { from: 'text', value: 12, unit: 'Cel' }, highTemperature: { from: 'text', value: 11, unit: 'Cel' } } })
    const body = labBody.parse({ ...inversion, steps: [ratio('by-bounds', 'lowBound', 'highBound'), ratio('by-rows', 'lowest', 'highest')] })
    expect(practicedSteps(body).map(step => step.key)).toEqual(['by-rows'])
    await expect(attemptIn(body, 'by-bounds', { 'by-bounds': '10 K/km' })).rejects.toMatchObject({ code: 'not_found' })
  })

  it('keeps nothing and marks nothing', async () => {
    const before = await stores.read.selectFrom('draft').selectAll().execute()
    await attempt('rate-fit', { 'rate-fit': '-30 K/km' })
    expect(await stores.read.selectFrom('draft').selectAll().execute()).toEqual(before)
    expect(await stores.read.selectFrom('submission').select('id').execute()).toEqual([])
  })

  it('is another’s where the share is another’s, and is not there in a lab without one', async () => {
    await expect(readPractice(stores.read, load, { ...who, membershipId: department.members.second }, later)).rejects.toMatchObject({ code: 'not_found' })
    await expect(readPractice(stores.read, loadAs({ ...inversion, practice: null }), who, later)).rejects.toMatchObject({ code: 'no_practice' })
  })

  it('on readings of a flight that shares are drawn from stops the posting', async () => {
    const rows = flown.heights.slice(0, 30).map((height, row) => [height.toFixed(1), (flown.temperatures[row] ?? 0).toFixed(2), (980 - height / 8.3).toFixed(1)])
    const practice = (cells: string[][]) => ({ leg: 'up', lowM: 0, highM: 100, columns: [{ quantity: 'height', unit: 'm' }, { quantity: 'air-temperature', unit: 'Cel' }, { quantity: 'pressure', unit: 'hPa' }], rows: cells })
    const problemsWith = async (cells: string[][]) => {
      const body = labBody.parse({ ...inversion, practice: practice(cells), supply: [{ versionId, leg: 'up', lowM: 0, highM: 100 }] })
      const made = await createLab(stores, { ...department.asked, courseId: department.courseId, body }, now)
      return bindingProblems(await prepareLab(stores.read, observations, made.id)).map(problem => problem.path)
    }
    expect(await problemsWith(rows)).toEqual(['practice'])
    expect(await problemsWith(rows.map(([z = '', t = '', p = '']) => [z, `${Number(t)}0`, p]))).toEqual(['practice'])
    expect(await problemsWith(rows.map(([z = '', t = '', p = '']) => [z, (Number(t) + 0.37).toFixed(2), p]))).toEqual([])
  })
})
