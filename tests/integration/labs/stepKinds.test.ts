import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { askedNumbers } from '../../../shared/schemas/askedSteps'
import { labBody, type LabBody } from '../../../shared/schemas/lab'
import { defaultConvention } from '../../../shared/thermo/conventions'
import { bindingProblems } from '../../../server/domain/labs/bindingProblems'
import { proofRun } from '../../../server/domain/labs/proof/proofRun'
import { ensureConvention } from '../../../server/domain/labs/conventions'
import { createLab } from '../../../server/domain/labs/createLab'
import { postLab } from '../../../server/domain/labs/postLab'
import { prepareLab } from '../../../server/domain/labs/prepareLab'
import { readTyped } from '../../../server/domain/marking/readTyped'
import { recheckMarks } from '../../../server/domain/marking/recheckMarks'
import type { Reference } from '../../../server/domain/marking/reference'
import { submissionMarks } from '../../../server/domain/marking/submissionMarks'
import { loadShare } from '../../../server/domain/shares/loadShare'
import { questionFor } from '../../../server/domain/shares/questionFor'
import { servedJson } from '../../../server/domain/shares/servedShare'
import { readWork } from '../../../server/domain/submissions/readWork'
import { submitLab } from '../../../server/domain/submissions/submitLab'
import { openObservations, type Observations } from '../../../server/observations/chunks'
import { referenceIn } from '../../fixtures/reference'
import { climb, smallFlight } from '../../fixtures/smallFlight'
import { inTerm as now, smallDepartment } from '../../fixtures/smallDepartment'
import { temporaryStores, type TemporaryStores } from '../../fixtures/temporaryStores'

let stores: TemporaryStores
let observations: Observations
let department: Awaited<ReturnType<typeof smallDepartment>>
let reference: Reference
let flight: string

const layer = (column: string) => ({ from: 'share', column, read: 'layer' })
const row = (column: string) => ({ from: 'share', column, read: 'row' })
const steps = [
  { key: 'line', kind: 'fit', title: 'The layer', inputs: { height: layer('height'), temperature: layer('air-temperature') }, parts: { slope: { pointsMilli: 2000, slipMilli: 500 }, intercept: { pointsMilli: 1000 }, error: { pointsMilli: 1000, digits: 2 } } },
  { key: 'theta', kind: 'table', title: 'Potential temperature', rows: 3, columns: [{ key: 'a', title: 'θ', pointsMilli: 2000, quantity: 'potential-temperature', unit: 'K', inputs: { pressure: row('pressure'), temperature: row('air-temperature') } }] },
  { key: 'at', kind: 'diagram', title: 'Temperature at 155 m', pointsMilli: 1000, quantity: 'profile-temperature-at-height', unit: 'Cel', inputs: { height: layer('height'), temperature: layer('air-temperature'), level: { from: 'text', value: 155, unit: 'm' } }, divisions: { result: { division: 0.5, unit: 'K' } } },
  { key: 'own', kind: 'reading', title: 'Your thermometer', pointsMilli: 1000, quantity: 'observed-air-temperature', unit: 'Cel', inputs: { station: { from: 'share', column: 'air-temperature', read: 'lowest' } }, accuracy: { station: 0.2, own: 0.3 } },
  { key: 'theta-own', kind: 'number', title: 'θ from your reading', pointsMilli: 1000, quantity: 'potential-temperature', unit: 'K', inputs: { pressure: { from: 'text', value: 950, unit: 'hPa' }, temperature: { from: 'step', key: 'own' } } },
  { key: 'why', kind: 'choice', title: 'What follows', pointsMilli: 1000, options: [{ key: 'a', text: 'The layer is stable.', isRight: true, why: 'Its rate is less than the dry one.' }, { key: 'b', text: 'It is not.', isRight: false }] },
]
const body = (of: unknown[] = steps): LabBody => labBody.parse({ title: 'Every kind', text: '', supply: [{ versionId: flight, leg: 'up', lowM: 0, highM: 300 }], steps: of })
const loaded = (id: string) => loadShare(stores.read, observations, id)

beforeAll(async () => {
  stores = await temporaryStores()
  department = await smallDepartment(stores)
  const { id } = await stores.write(trx => ensureConvention(trx, defaultConvention, now))
  await stores.write(trx => trx.updateTable('course').set({ convention_revision_id: id }).where('id', '=', department.courseId).execute())
  flight = await smallFlight(stores, stores.dataDir, { ownerCourseId: department.courseId, title: 'Morning', rows: climb(400, 10, 6.5, 12.3), actorId: department.asked.actorId }, now)
  observations = openObservations(stores.dataDir)
  reference = await referenceIn(stores.write)
})
afterAll(async () => {
  observations.close()
  await stores.remove()
})

describe('a lab of every kind of step', () => {
  let labId: string, shareId: string
  it('is bound, checked on its share, and posted', async () => {
    const made = await createLab(stores, { ...department.asked, courseId: department.courseId, body: body() }, now)
    labId = made.id
    const checked = await proofRun(stores.read, observations, labId)
    expect(checked.problems).toEqual([])
    expect(checked.reds.map(red => red.text)).toEqual([])
    expect(checked.shares[0]?.steps.filter(step => !step.ok).map(step => `${step.key}: ${step.reason}`)).toEqual([])
    expect(checked.shares[0]?.steps.map(step => step.key)).toEqual(['line-slope', 'line-intercept', 'line-error', 'theta-1-a', 'theta-2-a', 'theta-3-a', 'at', 'own', 'theta-own', 'why'])
    await postLab(stores, observations, { ...department.asked, labId, seenVersion: 1, seed: Buffer.alloc(16, 3), posting: { sections: [{ sectionId: department.sectionA, opensLocal: '2026-10-12T08:00', dueLocal: '2026-10-23T17:00' }], attempts: 3, keep: 'best', feedback: 'after_release' } }, now)
    shareId = (await stores.read.selectFrom('share').select('id').where('lab_id', '=', labId).executeTakeFirstOrThrow()).id
  })

  it('shows a student the rows of a table, what is read off, and options without saying which is right', async () => {
    const work = await readWork(stores.read, loaded, { membershipId: department.members.first, shareId }, now)
    expect(work.steps.find(step => step.key === 'theta-2-a')?.block).toMatchObject({ key: 'theta', row: 2, dataRow: 16 })
    expect(work.steps.find(step => step.key === 'theta-2-a')?.ask).toContain('in row 16 of your data')
    expect(work.steps.find(step => step.key === 'at')?.readOff).toEqual({ column: 'air-temperature', division: 0.5, unit: 'K' })
    expect(work.steps.find(step => step.key === 'own')?.ask).toContain('0.3 °C for your instrument')
    const choice = work.steps.find(step => step.key === 'why')
    expect(choice?.options.map(option => option.key)).toEqual(['a', 'b'])
    expect(JSON.stringify(work)).not.toContain('Its rate is less than the dry one')
    expect(JSON.stringify(work)).not.toContain('isRight')
  })

  it('judges every entry by itself, goes on from what the student read, and tells the reasons with the marks', async () => {
    const share = await loaded(shareId)
    const [z, T, p] = share.rows.columns.map(column => share.rows.use.flatMap((used, at) => used ? [Number(column.texts[at])] : [])) as [number[], number[], number[]]
    const mean = (values: number[]) => values.reduce((sum, value) => sum + value, 0) / values.length
    const [meanZ, meanT] = [mean(z), mean(T)]
    const slope = z.reduce((sum, value, at) => sum + (value - meanZ) * (T[at]! - meanT), 0) / z.reduce((sum, value) => sum + (value - meanZ) ** 2, 0)
    const theta = (celsius: number, hPa: number) => ((celsius + 273.15) * (1000 / hPa) ** (287 / 1004)).toFixed(1)
    const own = T[0]! + 0.4 // within 0.2 + 0.3 of the station
    const answers = {
      'line-slope': `${(-slope * 1000).toFixed(2)} K/km`, 'line-intercept': `${(meanT - slope * meanZ).toFixed(1)} C`, 'line-error': '7 K/km',
      'theta-1-a': `${theta(T[0]!, p[0]!)} K`, 'theta-2-a': `${theta(T[15]!, p[15]!)} K`, 'theta-3-a': '250 K',
      'at': `${(mean([T[15]!, T[16]!]) + 0.2).toFixed(1)} C`, 'own': `${own.toFixed(1)} C`, 'theta-own': `${theta(Number(own.toFixed(1)), 950)} K`, 'why': 'a',
    }
    const done = await submitLab(stores, { reference, loadShare: loaded }, { personId: department.people.first, membershipId: department.members.first, shareId, answers, claimedSentAt: null, request: { key: 'k1-every-kind', route: 'r', bodySha256: Buffer.alloc(32) } }, now)
    const marks = await submissionMarks(stores.read, { isStaff: true, membershipId: '' }, done.submissionId)
    expect(Object.fromEntries(marks.steps.map(step => [step.key, step.pointsMilli]))).toEqual({
      'line-slope': 2000, 'line-intercept': 1000, 'line-error': 0, 'theta-1-a': 667, 'theta-2-a': 667, 'theta-3-a': 0, 'at': 1000, 'own': 1000, 'theta-own': 1000, 'why': 1000,
    })
    expect(marks.maxMilli).toBe(10_000)
    // by the station's value the last number would be wrong: it is judged on what was read
    expect(theta(T[0]!, 950)).not.toBe(theta(Number(own.toFixed(1)), 950))
    const why = marks.steps.find(step => step.key === 'why')
    expect(why?.worked).toMatchObject({ value: 'The layer is stable.' })
    expect(why?.worked.lines[0]?.text).toContain('Its rate is less than the dry one.')
  })

  it('goes on from a reading within its digits: 61 typed for 61.3 takes nothing from what follows', async () => {
    const made = await createLab(stores, { ...department.asked, courseId: department.courseId, body: body([steps[3], { ...steps[4], digits: 4 }]) }, now)
    const lab = await prepareLab(stores.read, observations, made.id)
    const { rows } = lab.serve(lab.items[0]!)
    const ground = { rows, convention: lab.convention, share: { item: lab.items[0]! }, revision: { body: lab.revision.body } }
    const read = readTyped(askedNumbers(lab.revision.body)[0]!, '12.7 C')
    const question = questionFor(ground, 'theta-own', { own: read })
    expect(reference.judgeStep(question, readTyped(askedNumbers(lab.revision.body)[1]!, '')).band?.parts.map(part => part.label)).toContain('digits of your own reading (air temperature)')
    const exact = (12.74 + 273.15) * (1000 / 950) ** (287 / 1004) // from what stood on the dial
    expect(reference.judgeStep(question, readTyped(askedNumbers(lab.revision.body)[1]!, `${exact.toFixed(2)} K`)).isAccepted).toBe(true)
  })

  it('keeps from students what only their own readings are compared with', async () => {
    const readingOnly = await createLab(stores, { ...department.asked, courseId: department.courseId, body: body([steps[3]]) }, now)
    const lab = await prepareLab(stores.read, observations, readingOnly.id)
    const served = lab.serve(lab.items[0]!)
    expect(served.csv).not.toContain('temperature_c')
    expect(served.head.join()).not.toContain('temperature_c')
    expect(served.rows.columns.map(column => column.name)).toContain('temperature_c') // which the reference still has
    expect(servedJson(served.rows, lab.items[0]!, 'ground').columns.map(column => column.name)).toEqual(['height_m', 'pressure_hpa'])
  })

  it('is judged again to the same marks', async () => {
    const report = await recheckMarks(stores.read, reference.bundle)
    expect(report).toMatchObject({ evaluations: 10, same: 10, newestDiffers: 0 })
  })

  it.each([
    ['a table with more rows than the layer has', { ...steps[1], rows: 24 }, null],
    ['a plot of which nothing is read off', { ...steps[2], divisions: {} }, 'divisions'],
    ['a division in another unit', { ...steps[2], divisions: { result: { division: 1, unit: 'm' } } }, 'divisions.result.unit'],
    ['an own reading of what no instrument shows', { ...steps[3], quantity: 'potential-temperature', unit: 'K', inputs: {} }, 'quantity'],
    ['an instrument’s quantity in another kind of step', { ...steps[4], quantity: 'observed-air-temperature', inputs: {} }, 'quantity'],
    ['marks for digits beyond the step’s own', { ...steps[3], digitsMilli: 5000 }, 'digitsMilli'],
    ['a row outside a table', { ...steps[4], inputs: { pressure: row('pressure'), temperature: row('air-temperature') } }, 'inputs.pressure'],
  ])('names %s', async (_what, step, path) => {
    const made = await createLab(stores, { ...department.asked, courseId: department.courseId, body: { ...body([step]), supply: [{ versionId: flight, leg: 'up', lowM: 0, highM: 100 }] } }, now)
    const lab = await prepareLab(stores.read, observations, made.id)
    if (path === null) expect((await proofRun(stores.read, observations, made.id)).shares[0]?.steps.some(each => each.code === 'share_degenerate')).toBe(true)
    else expect(bindingProblems(lab).map(problem => problem.path)).toContain(`steps.0.${path}`)
  })
})
