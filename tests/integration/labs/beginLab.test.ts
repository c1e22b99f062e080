import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { readPost } from '../../../components/lab/postDraft'
import { labBody } from '../../../shared/schemas/lab'
import { defaultConvention } from '../../../shared/thermo/conventions'
import { libraryTexts } from '../../../seeds/labs'
import { ensureConvention } from '../../../server/domain/labs/conventions'
import { createLab } from '../../../server/domain/labs/createLab'
import { takeLabText } from '../../../server/domain/labs/labFile/takeLabText'
import { latestRevision } from '../../../server/domain/labs/latestRevision'
import { beginLab } from '../../../server/domain/labs/library/beginLab'
import { listBeginnings } from '../../../server/domain/labs/library/listBeginnings'
import { proofRun } from '../../../server/domain/labs/proof/proofRun'
import { postLab } from '../../../server/domain/labs/postLab'
import type { ActorMembership } from '../../../server/domain/people/actor'
import type { LabBeginning } from '../../../shared/schemas/labBeginning'
import { openObservations, type Observations } from '../../../server/observations/chunks'
import { climb, smallFlight } from '../../fixtures/smallFlight'
import { inTerm as now, smallDepartment } from '../../fixtures/smallDepartment'
import { temporaryStores, type TemporaryStores } from '../../fixtures/temporaryStores'

let stores: TemporaryStores
let observations: Observations
let department: Awaited<ReturnType<typeof smallDepartment>>
let cold: string
const texts = libraryTexts()
const lead = (courseId: string): ActorMembership => ({ id: `lead of ${courseId}`, courseId, role: 'lead', sectionIds: [] })
const begin = (beginning: LabBeginning, memberships = [lead(department.courseId)]) => beginLab(stores, observations, { ...department.asked, courseId: department.courseId, memberships, texts, beginning }, now)
const bodyOf = async (labId: string) => (await latestRevision(stores.read, labId)).body

beforeAll(async () => {
  stores = await temporaryStores()
  department = await smallDepartment(stores)
  const { id } = await stores.write(trx => ensureConvention(trx, defaultConvention, now))
  await stores.write(trx => trx.updateTable('course').set({ convention_revision_id: id }).execute())
  const flight = (title: string, rate: number) => smallFlight(stores, stores.dataDir, { ownerCourseId: department.courseId, title, rows: climb(400, 4, rate, 8), actorId: department.asked.actorId }, now)
  cold = await flight('Before the sun', -28)
  await flight('At noon', 8)
  observations = openObservations(stores.dataDir)
})
afterAll(async () => {
  observations.close()
  await stores.remove()
})

describe('a ready lab', () => {
  it('is taken with shares from those flights alone that fit it, and is posted with nothing but dates', async () => {
    const made = await begin({ from: 'library', key: 'morning-inversion' })
    const body = await bodyOf(made.id)
    expect(made).toMatchObject({ shares: 5, left: 0 })
    expect(new Set(body.supply.map(item => item.versionId))).toEqual(new Set([cold]))
    expect(await proofRun(stores.read, observations, made.id)).toMatchObject({ isReady: true, problems: [], reds: [] })

    // From the list of labs: begin, take, then opening and due of each section, and post.
    let actions = 2
    const enter = <T>(value: T): T => {
      actions++
      return value
    }
    const sections = [department.sectionA, department.sectionB].map(sectionId => ({ sectionId, name: '', students: 0, isChosen: true, opensLocal: enter('2026-10-12T08:00'), dueLocal: enter('2026-10-23T17:00') }))
    const posting = readPost({ sections, rule: 'none', percent: '10', closesAfterDays: '7', attempts: '3', keep: 'best', feedback: 'after_release' }).body
    const posted = await postLab(stores, observations, { ...department.asked, labId: made.id, seenVersion: made.version, posting: enter(posting)! }, now)
    expect(posted.postings).toHaveLength(2)
    expect(actions).toBeLessThanOrEqual(12)
  })

  it('that no flight fits is taken all the same, without shares, and is not ready', async () => {
    const made = await begin({ from: 'library', key: 'water-in-the-air' })
    expect(made).toMatchObject({ shares: 0, left: 0 })
    expect((await proofRun(stores.read, observations, made.id)).isReady).toBe(false)
  })

  it('that does not exist is missing', async () => {
    await expect(begin({ from: 'library', key: '../secret' })).rejects.toMatchObject({ code: 'not_found' })
  })

  it('is listed with what the flights of the course give it, those first that they can supply', async () => {
    const { ready, flights } = await listBeginnings(stores.read, observations, { courseId: department.courseId, memberships: [], texts })
    expect(flights).toBe(2)
    expect(ready).toHaveLength(texts.size)
    const byKey = new Map(ready.map(lab => [lab.key, lab]))
    expect(byKey.get('morning-inversion')).toMatchObject({ layers: 5, missing: [] })
    expect(byKey.get('water-in-the-air')).toMatchObject({ layers: 0, missing: ['relative-humidity'] })
    const firstWithout = ready.findIndex(lab => lab.layers === 0)
    expect(firstWithout).toBeGreaterThan(0)
    expect(ready.slice(firstWithout).every(lab => lab.layers === 0)).toBe(true)
  })
})

describe('a lab of another course', () => {
  const other = async () => {
    const courseId = 'course-of-before'
    if (await stores.read.selectFrom('course').select('id').where('id', '=', courseId).executeTakeFirst()) return courseId
    const row = await stores.read.selectFrom('course').selectAll().where('id', '=', department.courseId).executeTakeFirstOrThrow()
    await stores.write(trx => trx.insertInto('course').values({ ...row, id: courseId, code: 'ATM 1' }).execute())
    return courseId
  }
  const earlierLab = async () => {
    const courseId = await other()
    const body = labBody.parse({ ...(await bodyOf((await begin({ from: 'library', key: 'heated-layer' })).id)), title: 'Of last year', supply: [{ versionId: 'gone', leg: 'up', lowM: 0, highM: 80 }] })
    return { courseId, labId: (await createLab(stores, { ...department.asked, courseId, body }, now)).id }
  }

  it('is taken by whoever writes there too: it says where it comes from, and gets this course’s data', async () => {
    const { courseId, labId } = await earlierLab()
    const { earlier } = await listBeginnings(stores.read, observations, { courseId: department.courseId, memberships: [lead(courseId)], texts })
    expect(earlier).toMatchObject([{ labId, title: 'Of last year', course: 'ATM 1' }])
    const made = await begin({ from: 'earlier', labId }, [lead(courseId)])
    expect(made).toMatchObject({ shares: 5, left: 1 })
    expect(await stores.read.selectFrom('lab').select('ancestor_id').where('id', '=', made.id).executeTakeFirstOrThrow()).toEqual({ ancestor_id: labId })
  })

  it('is missing for a TA or a student of that course, and for strangers', async () => {
    const { courseId, labId } = await earlierLab()
    for (const memberships of [[], [{ ...lead(courseId), role: 'ta' as const }], [{ ...lead(courseId), role: 'student' as const }], [lead(department.courseId)]]) {
      await expect(begin({ from: 'earlier', labId }, memberships)).rejects.toMatchObject({ code: 'not_found' })
      expect((await listBeginnings(stores.read, observations, { courseId: department.courseId, memberships, texts })).earlier).toEqual([])
    }
  })
})

describe('a text', () => {
  it('that was taken from a lab makes the same lab again', async () => {
    const first = await begin({ from: 'library', key: 'weighing-a-layer' })
    const { name, text } = await takeLabText(stores.read, first.id)
    expect(name).toBe('weighing-a-layer.md')
    const again = await begin({ from: 'text', text })
    expect(await bodyOf(again.id)).toEqual(await bodyOf(first.id))
  })

  it('that is no lab is refused with each fault and its line, and nothing is kept', async () => {
    const before = (await stores.read.selectFrom('lab').select('id').execute()).length
    const text = [...texts.values()][0]!.replace('marks: 2', 'marks: many')
    const line = text.split('\n').findIndex(each => each.includes('marks: many')) + 1
    await expect(begin({ from: 'text', text })).rejects.toMatchObject({ code: 'lab_text_unreadable', fields: [{ path: `line ${line}` }] })
    expect((await stores.read.selectFrom('lab').select('id').execute()).length).toBe(before)
  })
})
