import { randomBytes } from 'node:crypto'
import { DomainError, refuse } from '#shared/errors'
import { lateRule, type LateRule, type PostingBody, type SupplyItem } from '#shared/schemas/lab'
import type { Read, Stores, Trx } from '../../db/writer'
import type { Observations } from '../../observations/chunks'
import { doOnce, type Asked } from '../asked'
import { newId } from '../ids'
import { noteChange, refuseOlder } from '../lastChange'
import { appendEntry, courseChain } from '../ledger/appendEntry'
import { applyAccommodations } from '../repairs/applyAccommodations'
import { currentDraw, giveShares, insertDraw, type DrawnSupply } from '../shares/draws'
import type { DrawnItem } from '../shares/loadedShare'
import { sha256Hex } from '../shares/servedData'
import { firstRefusal } from './checkShare'
import { prepareLab, type PreparedLab } from './prepareLab'
import { proveLab } from './proof/proofRun'
import { resolveDates, type ResolvedDates } from './resolveDates'
import { writeSteps } from './writeRevision'

export interface PostLab { labId: string, seenVersion: number, posting: PostingBody, /** Only replay and the demo's generator fix it. */ seed?: Buffer }

export interface PostedLab {
  version: number
  postings: { id: string, sectionId: string, opensLocal: string, dueLocal: string, opensAt: number, dueAt: number, notes: string[] }[]
  /** Students who got their share by this posting. */
  shares: number
}

/**
 * Gives a lab to sections: proves every share, freezes the revision, draws, and writes the dates as instants of the term's zone.
 * A later section joins the draw that is there; nobody who has a share is moved.
 * @throws {DomainError} `proof_open` while a finding of the proof run is neither settled nor owned, `band_too_wide` or `share_degenerate` with the share that causes it, `binding_invalid`, `dates_invalid`, `changed_meanwhile`, `already_exists`
 */
export async function postLab({ read, write }: Stores, observations: Observations, input: Asked & PostLab, now: number): Promise<PostedLab> {
  // Judged outside the unit of work. A repeated request finds its stored answer before what was refused here matters.
  const prepared = await prepareFor(read, observations, input).catch((error: unknown) => error instanceof DomainError ? error : Promise.reject(error))
  return write(trx => doOnce(trx, input, async () => {
    if (prepared instanceof DomainError) throw prepared
    const { lab, dates, supply } = prepared
    await assertUnchanged(trx, prepared, input.seenVersion)
    await assertSections(trx, lab.lab.courseId, dates)
    const rule = input.posting.lateRule ?? await ruleOfCourse(trx, lab.lab.courseId)
    const postings = await Promise.all(dates.map(date => writePosting(trx, lab, date, input.posting, rule, now)))
    let draw = await currentDraw(trx, lab.lab.id)
    if (!draw) {
      await writeSteps(trx, lab.revision.id, lab.revision.body, lab.convention)
      await insertDraw(trx, { labId: lab.lab.id, revisionId: lab.revision.id, seed: input.seed ?? randomBytes(16), supply }, now)
      draw = await currentDraw(trx, lab.lab.id)
    }
    if (!draw) throw new Error('A draw that was just written is not there.')
    const students = await trx.selectFrom('membership').select('id').where('course_id', '=', lab.lab.courseId).where('role', '=', 'student').where('state', '=', 'active')
      .where('section_id', 'in', dates.map(date => date.sectionId)).execute()
    const shares = await giveShares(trx, draw, students.map(row => row.id), now)
    const version = lab.lab.version + 1
    await trx.updateTable('lab').set({ state: 'posted', version }).where('id', '=', lab.lab.id).execute()
    await noteChange(trx, lab.lab.id, input.actorId, now)
    await applyAccommodations(trx, { membershipIds: students.map(row => row.id), actorId: input.actorId }, now)
    await appendEntry(trx, {
      chain: courseChain(lab.lab.courseId), at: now, actor: input.actorId, action: 'lab.posted',
      facts: { labId: lab.lab.id, revisionId: draw.revisionId, drawId: draw.id, shares, lateRule: rule, attempts: input.posting.attempts, keep: input.posting.keep, postings: postings.map(({ id, sectionId, opensAt, dueAt }) => ({ id, sectionId, opensAt, dueAt })) },
    })
    return { version, postings, shares }
  }))
}

interface Prepared { lab: PreparedLab, dates: ResolvedDates[], supply: DrawnSupply, hasDraw: boolean }

async function prepareFor(read: Read, observations: Observations, input: PostLab): Promise<Prepared> {
  const lab = await prepareLab(read, observations, input.labId)
  const dates = resolveDates(input.posting.sections, lab.zone)
  if (lab.lab.state === 'withdrawn' || lab.lab.state === 'archived') return refuse('lab_withdrawn')
  const hasDraw = await read.selectFrom('draw').select('id').where('lab_id', '=', input.labId).executeTakeFirst() !== undefined
  if (hasDraw) return { lab, dates, hasDraw, supply: { conventionRevisionId: lab.conventionRevisionId, items: [] } }
  const { shares, reds } = await proveLab(read, lab)
  const refused = firstRefusal(lab, shares)
  if (refused) throw refused
  const open = reds.filter(red => red.owned === null)
  if (open[0]) return refuse('proof_open', { count: open.length, first: open[0].text })
  const items = lab.items.map((item, no) => drawnItem(lab, item, no))
  return { lab, dates, hasDraw, supply: { conventionRevisionId: lab.conventionRevisionId, items } }
}

function drawnItem(lab: PreparedLab, { versionId, leg, lowM, highM }: SupplyItem, no: number): DrawnItem {
  const { flight } = lab.flightOf(versionId)
  const { asks, head, csv } = lab.serve({ versionId, leg, lowM, highM })
  return { no, versionId, versionNo: flight.versionNo, leg, lowM, highM, dataSetTitle: flight.title, rootSha256: flight.rootSha256, heightDatum: flight.heightDatum, asks, head, servedSha256: sha256Hex(csv) }
}

async function assertUnchanged(trx: Trx, { lab, hasDraw }: Prepared, seenVersion: number): Promise<void> {
  const present = await trx.selectFrom('lab').innerJoin('course', 'course.id', 'lab.course_id').select(['lab.version', 'course.convention_revision_id as convention']).where('lab.id', '=', lab.lab.id).executeTakeFirstOrThrow()
  if (present.version !== seenVersion || present.version !== lab.lab.version || (!hasDraw && present.convention !== lab.conventionRevisionId)) await refuseOlder(trx, lab.lab.id, present.version)
}

async function assertSections(trx: Trx, courseId: string, dates: readonly ResolvedDates[]): Promise<void> {
  const sections = await trx.selectFrom('section').select('id').where('course_id', '=', courseId).execute()
  const strange = dates.findIndex(date => !sections.some(section => section.id === date.sectionId))
  if (strange >= 0) refuse('invalid', {}, [{ path: `sections.${strange}.sectionId`, message: 'Not a section of this course.' }])
}

async function ruleOfCourse(trx: Trx, courseId: string): Promise<LateRule> {
  const course = await trx.selectFrom('course').select('late_rule_json').where('id', '=', courseId).executeTakeFirstOrThrow()
  return lateRule.parse(JSON.parse(course.late_rule_json))
}

/** A posting that the next term's plan has laid out takes its dates here; a posted one is not posted twice. */
async function writePosting(trx: Trx, { lab, zone }: PreparedLab, date: ResolvedDates, posting: PostingBody, rule: LateRule, now: number) {
  const there = await trx.selectFrom('posting').innerJoin('section', 'section.id', 'posting.section_id').select(['posting.id', 'posting.state', 'posting.version', 'section.name']).where('lab_id', '=', lab.id).where('section_id', '=', date.sectionId).executeTakeFirst()
  if (there && there.state !== 'planned') return refuse('already_exists', { what: `The posting to section ${there.name}` })
  const values = {
    opens_local: date.opensLocal, due_local: date.dueLocal, zone, opens_at: date.opensAt, due_at: date.dueAt, late_rule_json: JSON.stringify(rule),
    attempts: posting.attempts, keep: posting.keep, feedback: posting.feedback, state: 'posted' as const,
  }
  const id = there?.id ?? newId(now)
  if (there) await trx.updateTable('posting').set({ ...values, version: there.version + 1 }).where('id', '=', id).execute()
  else await trx.insertInto('posting').values({ ...values, id, lab_id: lab.id, section_id: date.sectionId, released_at: null, version: 1 }).execute()
  return { id, ...date }
}
