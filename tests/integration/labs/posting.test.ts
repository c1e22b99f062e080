import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { labBody, type LabBody, type SupplyItem } from '../../../shared/schemas/lab'
import type { NumberStep } from '../../../shared/schemas/steps'
import { defaultConvention } from '../../../shared/thermo/conventions'
import { ensureConvention } from '../../../server/domain/labs/conventions'
import { createLab } from '../../../server/domain/labs/createLab'
import { proofRun } from '../../../server/domain/labs/proof/proofRun'
import { describeLab } from '../../../server/domain/labs/describeLab'
import { listLabs } from '../../../server/domain/labs/listLabs'
import { postLab } from '../../../server/domain/labs/postLab'
import { saveRevision } from '../../../server/domain/labs/saveRevision'
import { withdrawLab } from '../../../server/domain/labs/withdrawLab'
import { getDraw, inDrawnOrder, itemOf, shareDigest } from '../../../server/domain/shares/draws'
import { ensureShares } from '../../../server/domain/shares/ensureShares'
import { loadShare, serveDrawn } from '../../../server/domain/shares/loadShare'
import { questionFor } from '../../../server/domain/shares/questionFor'
import { redraw } from '../../../server/domain/shares/redraw'
import { sha256Hex } from '../../../server/domain/shares/servedData'
import { createCourse } from '../../../server/domain/terms/courses'
import { enrol } from '../../../server/domain/terms/enrol'
import { moveSection } from '../../../server/domain/terms/memberships'
import { newId } from '../../../server/domain/ids'
import { openObservations, type Observations } from '../../../server/observations/chunks'
import { climb, smallFlight } from '../../fixtures/smallFlight'
import { inTerm as now, smallDepartment } from '../../fixtures/smallDepartment'
import { temporaryStores, type TemporaryStores } from '../../fixtures/temporaryStores'

let stores: TemporaryStores
let observations: Observations
let department: Awaited<ReturnType<typeof smallDepartment>>
let flights: string[]
const seed = Buffer.from('00112233445566778899aabbccddeeff', 'hex')

const step = (more: Partial<NumberStep> = {}): NumberStep => ({
  key: 'rate', kind: 'number', title: 'Lapse rate of the layer', text: '', pointsMilli: 3000, quantity: 'lapse-rate-least-squares', variant: null, unit: 'K/km', digits: 3, granted: {}, slipMilli: 0, digitsMilli: 0, near: null,
  inputs: { height: { from: 'share', column: 'height', read: 'layer' }, temperature: { from: 'share', column: 'air-temperature', read: 'layer' } }, ...more,
})
const body = (supply: SupplyItem[], steps = [step()]): LabBody => labBody.parse({ title: 'Rates', text: 'Find $\\Gamma$.', supply, steps })
const layers = (): SupplyItem[] => flights.flatMap(versionId => [[0, 100], [100, 200], [100, 300]].map(([lowM = 0, highM = 0]) => ({ versionId, leg: 'up' as const, lowM, highM })))
const dates = (sectionIds: string[], dueLocal = '2026-10-23T17:00') => ({ sections: sectionIds.map(sectionId => ({ sectionId, opensLocal: '2026-10-12T08:00', dueLocal })), attempts: 3, keep: 'best' as const, feedback: 'after_release' as const })

async function student(name: string, sectionId: string): Promise<string> {
  const personId = await department.addPerson(name)
  await stores.write(trx => trx.updateTable('person').set({ state: 'active' }).where('id', '=', personId).execute())
  return (await enrol(stores, { ...department.asked, courseId: department.courseId, enrolment: { role: 'student', personId, sectionId } }, now)).id
}
const make = (of: LabBody) => createLab(stores, { ...department.asked, courseId: department.courseId, body: of }, now)
const post = (labId: string, seenVersion: number, posting = dates([department.sectionA, department.sectionB])) => postLab(stores, observations, { ...department.asked, labId, seenVersion, posting, seed }, now)
const sharesOf = (labId: string) => stores.read.selectFrom('share').innerJoin('holder_member', 'holder_member.holder_id', 'share.holder_id').selectAll('share').select('holder_member.membership_id as membershipId').where('share.lab_id', '=', labId).orderBy('ordinal').execute()

beforeAll(async () => {
  stores = await temporaryStores()
  department = await smallDepartment(stores)
  const { id } = await stores.write(trx => ensureConvention(trx, defaultConvention, now))
  await stores.write(trx => trx.updateTable('course').set({ convention_revision_id: id }).where('id', '=', department.courseId).execute())
  const flight = (title: string, rate: number, more = {}) => smallFlight(stores, stores.dataDir, { ownerCourseId: department.courseId, title, rows: climb(400, 10, rate), actorId: department.asked.actorId, ...more }, now)
  flights = [await flight('Morning', 6.5), await flight('Noon', 8.1), await flight('Evening', 4.2)]
  for (let no = 0; no < 20; no++) await student(`Student ${no}`, no % 2 === 0 ? department.sectionA : department.sectionB)
  observations = openObservations(stores.dataDir)
})
afterAll(async () => {
  observations.close()
  await stores.remove()
})

describe('a lab is written, checked and posted', () => {
  let lab: Awaited<ReturnType<typeof make>>
  beforeEach(async () => {
    lab = await make(body(layers()))
  })

  it('prints the ask from the binding and keeps it with the step', async () => {
    const told = await describeLab(stores.read, observations, lab.id)
    expect(told.problems).toEqual([])
    const ask = (await stores.read.selectFrom('step').select('ask').where('lab_revision_id', '=', lab.revisionId).executeTakeFirstOrThrow()).ask
    for (const part of ['least squares', 'positive where temperature falls with height', 'both bounds included', 'rows with use = 1', 'K km⁻¹', '3 significant digits']) expect(ask).toContain(part)
    expect(told.asks.rate).toBe(ask)
  })

  it('saves against the version that was seen, and refuses a stale one', async () => {
    const changed = { ...body(layers()), title: 'Rates of the morning' }
    expect(await saveRevision(stores, { labId: lab.id, actorId: department.asked.actorId, seenVersion: 1, body: changed }, now)).toEqual({ version: 2 })
    await expect(saveRevision(stores, { labId: lab.id, actorId: department.asked.actorId, seenVersion: 1, body: changed }, now)).rejects.toMatchObject({ code: 'changed_meanwhile', facts: { by: 'Ada Min', version: 2 } })
    expect((await describeLab(stores.read, observations, lab.id)).title).toBe('Rates of the morning')
  })

  it('gives every student of the sections one share, each as the seed draws it again', async () => {
    const posted = await post(lab.id, 1)
    expect(posted.shares).toBe(22)
    const shares = await sharesOf(lab.id)
    expect(new Set(shares.map(share => share.membershipId)).size).toBe(22)
    expect(shares.map(share => share.ordinal)).toEqual(Array.from({ length: 22 }, (_, at) => at))
    const stored = await getDraw(stores.read, shares[0]!.draw_id)
    // The database's own copy, read anew: nothing of the process that drew is used.
    const again = { ...stored, seed: Buffer.from(stored.seed) }
    for (const share of shares) {
      const item = itemOf(again, share.ordinal)
      expect(share.supply_no).toBe(item.no)
      expect(share.digest.equals(shareDigest(again, share.ordinal, item))).toBe(true)
      expect(sha256Hex(serveDrawn(observations, stored.revisionId, body(layers()), item).csv)).toBe(share.served_sha256.toString('hex'))
    }
    // and another seed draws otherwise
    const other = { ...stored, seed: Buffer.alloc(16, 7) }
    expect(shares.every(share => itemOf(other, share.ordinal).no === share.supply_no)).toBe(false)
  })

  it('uses every item once before any twice, and never gives neighbors the same (balance)', async () => {
    await post(lab.id, 1)
    const items = (await sharesOf(lab.id)).map(share => share.supply_no)
    expect(new Set(items.slice(0, 9)).size).toBe(9)
    expect(items.every((item, at) => at === 0 || item !== items[at - 1])).toBe(true)
  })

  it('does not move anybody when the roster comes in another order (K27), nor when one comes late', async () => {
    const members = (await stores.read.selectFrom('membership').select('id').where('course_id', '=', department.courseId).execute()).map(row => row.id)
    expect(inDrawnOrder(seed, members.toReversed())).toEqual(inDrawnOrder(seed, members))
    await post(lab.id, 1)
    const before = await sharesOf(lab.id)
    for (const member of members.toReversed()) await stores.write(trx => ensureShares(trx, member, now + 1))
    expect(await sharesOf(lab.id)).toEqual(before)
    const late = await student('Late Comer', department.sectionA)
    const after = await sharesOf(lab.id)
    expect(after.filter(share => share.membershipId !== late)).toEqual(before)
    expect(after.find(share => share.membershipId === late)?.ordinal).toBe(before.length)
    expect(await stores.write(trx => ensureShares(trx, late, now + 2))).toBe(0)
  })

  it('gives who moves to another section a share of what only that section has, and leaves the others alone', async () => {
    const mover = await student('Moving Student', department.sectionA)
    await post(lab.id, 1, dates([department.sectionB]))
    const before = await sharesOf(lab.id)
    expect(before.some(share => share.membershipId === mover)).toBe(false)
    await moveSection(stores, { ...department.asked, membershipId: mover, sectionId: department.sectionB }, now)
    const after = await sharesOf(lab.id)
    expect(after.slice(0, before.length)).toEqual(before)
    expect(after.at(-1)?.membershipId).toBe(mover)
    await moveSection(stores, { ...department.asked, membershipId: mover, sectionId: department.sectionA }, now)
    expect(await sharesOf(lab.id)).toEqual(after)
  })

  it('keeps the shares of the first section when a second one joins', async () => {
    const first = await post(lab.id, 1, dates([department.sectionA]))
    const before = await sharesOf(lab.id)
    const second = await post(lab.id, first.version, dates([department.sectionB]))
    const after = await sharesOf(lab.id)
    expect(after.slice(0, before.length)).toEqual(before)
    expect(second.shares).toBe(after.length - before.length)
    await expect(post(lab.id, second.version, dates([department.sectionB]))).rejects.toMatchObject({ code: 'already_exists' })
  })

  it('freezes the revision: neither the use case nor the database lets it change', async () => {
    await post(lab.id, 1)
    await expect(saveRevision(stores, { labId: lab.id, actorId: department.asked.actorId, seenVersion: 2, body: body(layers()) }, now)).rejects.toMatchObject({ code: 'lab_not_draft' })
    await expect(stores.write(trx => trx.updateTable('step').set({ points_milli: 1 }).where('lab_revision_id', '=', lab.revisionId).execute())).rejects.toThrow('frozen')
    await expect(stores.write(trx => trx.updateTable('lab_revision').set({ body_json: '{}' }).where('id', '=', lab.revisionId).execute())).rejects.toThrow('frozen')
  })

  it('settles dates over clock changes and says so (K7)', async () => {
    const shifted = await post(lab.id, 1, dates([department.sectionA], '2026-11-01T01:30'))
    const [posting] = shifted.postings
    // 01:30 stands twice on that night in America/Denver; the later one is UTC−7
    expect(new Date(posting!.dueAt).toISOString()).toBe('2026-11-01T08:30:59.999Z')
    expect(posting!.notes.join()).toContain('the later one')
    await expect(post((await make(body(layers()))).id, 1, dates([department.sectionA], '2026-10-12T08:00'))).rejects.toMatchObject({ code: 'dates_invalid' })
  })

  it('answers a repeated request from the first one', async () => {
    const once = { personId: department.people.lead, key: `key-${lab.id}`, route: 'POST x', bodySha256: Buffer.alloc(32), now }
    const ask = () => postLab(stores, observations, { actorId: department.asked.actorId, once, labId: lab.id, seenVersion: 1, posting: dates([department.sectionA]), seed }, now)
    const [first, second] = [await ask(), await ask()]
    expect(second).toEqual(first)
    expect(await stores.read.selectFrom('draw').select('id').where('lab_id', '=', lab.id).execute()).toHaveLength(1)
  })

  it('writes who posted what into the ledger', async () => {
    await post(lab.id, 1)
    const entry = await stores.read.selectFrom('ledger_entry').selectAll().where('action', '=', 'lab.posted').orderBy('seq', 'desc').executeTakeFirstOrThrow()
    expect(JSON.parse(entry.facts_json)).toMatchObject({ labId: lab.id, revisionId: lab.revisionId, lateRule: { kind: 'of_earned', percent: 10, closesAfterDays: 7 } })
  })

  it('shows a student the lab once it is open for the own section, and never a draft', async () => {
    const acting = { actorId: department.members.first, role: 'student' as const, courseId: department.courseId, sectionIds: [department.sectionA] }
    const seen = async (at: number) => (await listLabs(stores.read, { courseId: department.courseId, acting }, at)).some(entry => entry.id === lab.id)
    expect(await seen(now)).toBe(false)
    await post(lab.id, 1, dates([department.sectionA]))
    expect(await seen(Date.parse('2026-10-12T13:59:00Z'))).toBe(false)
    expect(await seen(now)).toBe(true)
    const other = { ...acting, actorId: department.members.second, sectionIds: [department.sectionB] }
    expect((await listLabs(stores.read, { courseId: department.courseId, acting: other }, now)).some(entry => entry.id === lab.id)).toBe(false)
  })

  it('takes a posted lab back', async () => {
    const { version } = await post(lab.id, 1)
    await withdrawLab(stores, { ...department.asked, labId: lab.id, seenVersion: version }, now)
    expect((await stores.read.selectFrom('posting').select('state').where('lab_id', '=', lab.id).execute()).every(posting => posting.state === 'withdrawn')).toBe(true)
    await expect(post(lab.id, version + 1)).rejects.toMatchObject({ code: 'lab_withdrawn' })
  })

  it('draws anew openly: another item, with its reason, the old share kept', async () => {
    await post(lab.id, 1)
    const [one] = await sharesOf(lab.id)
    await expect(redraw(stores, { ...department.asked, shareId: one!.id, reason: '  ' }, now)).rejects.toMatchObject({ code: 'invalid' })
    const { shareId } = await redraw(stores, { ...department.asked, shareId: one!.id, reason: 'The layer was empty.' }, now)
    const again = await stores.read.selectFrom('share').selectAll().where('id', '=', shareId).executeTakeFirstOrThrow()
    expect(again).toMatchObject({ holder_id: one!.holder_id, redraw: 1 })
    const kept = await stores.read.selectFrom('private_body').select(['digest', 'body']).execute()
    expect(kept.map(text => [text.digest.toString('hex'), text.body])).toEqual([[again.reason_digest, 'The layer was empty.']])
    expect(again.supply_no).not.toBe(one!.supply_no)
  })
})

describe('a copy as a new draft', () => {
  it('says which lab it comes from, and comes from no other course', async () => {
    const posted = await make(body(layers()))
    const copy = (courseId: string, ancestorId: string) => createLab(stores, { ...department.asked, courseId, body: { ...body(layers()), title: 'A copy' }, ancestorId }, now)
    const made = await copy(department.courseId, posted.id)
    expect(await stores.read.selectFrom('lab').select(['ancestor_id', 'state', 'version']).where('id', '=', made.id).executeTakeFirstOrThrow()).toEqual({ ancestor_id: posted.id, state: 'draft', version: 1 })
    const elsewhere = await createCourse(stores, { ...department.asked, course: { termId: department.termId, code: 'ATM 302', title: 'Another', alsoListedAs: [], lateRule: { kind: 'none' }, conventionRevisionId: null, sections: ['A'], leadPersonId: department.people.lead } }, now)
    await expect(copy(elsewhere.id, posted.id)).rejects.toMatchObject({ code: 'not_found' })
    await expect(copy(department.courseId, 'no-such-lab')).rejects.toMatchObject({ code: 'not_found' })
  })
})

describe('what a share is asked', () => {
  it('computes from the served digits of the closed layer', async () => {
    const lab = await make(body(layers()))
    await post(lab.id, 1)
    const [share] = await sharesOf(lab.id)
    const loaded = await loadShare(stores.read, observations, share!.id)
    const question = questionFor(loaded, 'rate', {})
    const { lowM, highM } = loaded.share.item
    const heights = question.inputs.height as readonly number[]
    expect(Math.min(...heights)).toBe(lowM)
    expect(Math.max(...heights)).toBe(highM)
    expect(heights).toHaveLength((highM - lowM) / 10 + 1)
    const temperatures = question.inputs.temperature as readonly number[]
    const lines = loaded.csv.split('\n').filter(line => !line.startsWith('#')).slice(1).map(line => line.split(',')).filter(cells => cells.at(-1) === '1')
    expect(lines.map(cells => Number(cells[3]) + 273.15)).toEqual(temperatures.map(value => expect.closeTo(value, 9)))
    expect(loaded.asks.rate).toContain(`${lowM} m to ${highM} m above the ground, both bounds included`)
    expect(loaded.csv).toContain(`# Step 1, Lapse rate of the layer: ${loaded.asks.rate}`)
    expect(sha256Hex(loaded.csv)).toBe(share!.served_sha256.toString('hex'))
    expect(question.granted).toEqual({})
  })

  it('carries the student’s own earlier value beside the true one, and not one that makes the rest trivial (K16, K18, K20)', async () => {
    const lab = await make(body(layers(), [step(), step({ key: 'class', title: 'Stability', quantity: 'static-stability', unit: '1', granted: {}, inputs: { lapseRate: { from: 'step', key: 'rate' } } })]))
    await post(lab.id, 1)
    const loaded = await loadShare(stores.read, observations, (await sharesOf(lab.id))[0]!.id)
    const answer = (valueSi: number | null, reading: 'ok' | 'empty' = 'ok') => ({ typed: '', reading, valueSi, decimal: null, unitUcum: 'K/km', digits: 3, halfUnitSi: 0.00005, message: '' })
    const bare = questionFor(loaded, 'class', {})
    expect(typeof bare.inputs.lapseRate).toBe('number')
    expect(bare.carried).toBeUndefined()
    expect(questionFor(loaded, 'class', { rate: answer(null, 'empty') }).carried).toBeUndefined()
    const own = questionFor(loaded, 'class', { rate: answer(-0.0065) })
    expect(own.inputs).toEqual(bare.inputs)
    expect(own.carried).toEqual({ lapseRate: { valueSi: -0.0065, halfUnitSi: 0.00005 } })
    expect(questionFor(loaded, 'class', { rate: answer(9) }).carried).toEqual({ lapseRate: { notCarried: expect.any(String) } })
  })

  it('leaves out a flagged row', async () => {
    const flagged = await smallFlight(stores, stores.dataDir, { ownerCourseId: department.courseId, title: 'Spiked', rows: climb(400, 10, 6.5), actorId: department.asked.actorId, flagged: [5] }, now)
    const lab = await make(body([{ versionId: flagged, leg: 'up', lowM: 0, highM: 100 }]))
    await post(lab.id, 1)
    const loaded = await loadShare(stores.read, observations, (await sharesOf(lab.id))[0]!.id)
    expect(loaded.rows.use.flatMap((isUsed, row) => isUsed ? [row] : [])).toEqual([0, 1, 2, 3, 4, 6, 7, 8, 9, 10])
  })
})

describe('what cannot be posted', () => {
  it('refuses a band that is wider than half the way to a slip, and names share and step', async () => {
    const lab = await make(body(layers(), [step({ granted: { absolute: 8 } })]))
    await expect(post(lab.id, 1)).rejects.toMatchObject({ code: 'band_too_wide', facts: { share: 1, step: 'Lapse rate of the layer', reason: expect.stringContaining('half the way') } })
    const told = await proofRun(stores.read, observations, lab.id)
    expect(told.isReady).toBe(false)
    expect(told.shares).toHaveLength(9)
    expect(told.shares[0]!.steps[0]).toMatchObject({ ok: false, code: 'band_too_wide' })
    expect(await stores.read.selectFrom('draw').select('id').where('lab_id', '=', lab.id).execute()).toEqual([])
  })

  it('refuses the one share whose layer is nearly isothermal: its sign slip lies inside the band (L28)', async () => {
    const heights = climb(400, 10, 0).heights
    const flat = await smallFlight(stores, stores.dataDir, { ownerCourseId: department.courseId, title: 'Flat', rows: { heights, temperatures: heights.map(height => 15 - height / 20_000) }, actorId: department.asked.actorId }, now)
    const heat = step({ key: 'heat', title: 'Heat', quantity: 'isobaric-heat', unit: 'kJ/kg', granted: { absolute: 0.02 }, inputs: {
      temperatureStart: { from: 'share', column: 'air-temperature', read: 'lowest' }, temperatureEnd: { from: 'share', column: 'air-temperature', read: 'highest' } } })
    const lab = await make(body([...layers(), { versionId: flat, leg: 'up' as const, lowM: 0, highM: 400 }], [heat]))
    const told = await proofRun(stores.read, observations, lab.id)
    const refused = told.shares.filter(share => share.steps.some(entry => !entry.ok))
    expect(refused.map(share => share.title)).toEqual(['Flat, up, 0–400 m'])
    expect(refused[0]!.steps[0]!.reason).toContain('sign')
    await expect(post(lab.id, 1)).rejects.toMatchObject({ code: 'band_too_wide', facts: { shareTitle: 'Flat, up, 0–400 m' } })
  })

  it('refuses a layer without rows, and a flight too low for it', async () => {
    const lab = await make(body([{ versionId: flights[0]!, leg: 'up', lowM: 500, highM: 600 }]))
    await expect(post(lab.id, 1)).rejects.toMatchObject({ code: 'share_degenerate', facts: { share: 1 } })
  })

  it('answers a flight of another course like one that does not exist', async () => {
    const termId = department.termId
    const { createCourse } = await import('../../../server/domain/terms/courses')
    const other = await createCourse(stores, { ...department.asked, course: { termId, code: `X ${newId(now).slice(-4)}`, title: 'Other', alsoListedAs: [], lateRule: { kind: 'none' }, conventionRevisionId: null, sections: ['A'], leadPersonId: null } }, now)
    const foreign = await smallFlight(stores, stores.dataDir, { ownerCourseId: other.id, title: 'Secret flight', rows: climb(400, 10, 6.5), actorId: department.asked.actorId }, now)
    const tell = async (versionId: string) => (await describeLab(stores.read, observations, (await make(body([{ versionId, leg: 'up', lowM: 0, highM: 100 }]))).id)).problems
    const [ofForeign, ofNothing] = [await tell(foreign), await tell(newId(now))]
    expect(ofForeign).toEqual([{ path: 'supply.0.versionId', message: 'Not a flight of this course.' }])
    expect(ofForeign).toEqual(ofNothing)
    const lab = await make(body([{ versionId: foreign, leg: 'up', lowM: 0, highM: 100 }]))
    await expect(post(lab.id, 1)).rejects.toMatchObject({ code: 'binding_invalid' })
  })

  it('names every binding that is open', async () => {
    const lab = await make(body(layers(), [step({ unit: 'K', granted: { absolute: 0.1 }, inputs: { height: { from: 'share', column: 'height', read: 'lowest' } } })]))
    const paths = (await describeLab(stores.read, observations, lab.id)).problems.map(problem => problem.path)
    expect(paths).toEqual(['steps.0.unit', 'steps.0.inputs.height', 'steps.0.inputs.temperature'])
  })

  it('refuses a convention that does not close, and a share of a temperature', async () => {
    await expect(stores.write(trx => ensureConvention(trx, { ...defaultConvention, key: 'open', constants: { ...defaultConvention.constants, R: 287.05 } }, now))).rejects.toMatchObject({ code: 'convention_open' })
    const lab = await make(body(layers(), [step({ quantity: 'potential-temperature', unit: 'Cel', granted: { relative: 0.01 }, inputs: { pressure: { from: 'share', column: 'pressure', read: 'mean' }, temperature: { from: 'share', column: 'air-temperature', read: 'mean' } } })]))
    expect((await describeLab(stores.read, observations, lab.id)).problems.map(problem => problem.path)).toEqual(['steps.0.granted.relative'])
  })
})
