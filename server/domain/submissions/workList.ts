import { lateRule } from '#shared/schemas/lab'
import type { LabStanding } from '#shared/schemas/marks'
import type { WorkListEntry } from '#shared/schemas/work'
import type { Read } from '../../db/writer'
import { acceptedLateness } from '../repairs/acceptedLateness'
import { closingOf, personalDue } from './lateness'

/** The labs that are open, or were, for one student of a course, the nearest due time first; with `all` also those that open later, which are for staff to see. */
export async function workList(read: Read, who: { courseId: string, membershipId: string }, now: number, opened: 'open' | 'all' = 'open'): Promise<WorkListEntry[]> {
  const postings = await read.selectFrom('membership').innerJoin('posting', 'posting.section_id', 'membership.section_id').innerJoin('lab', 'lab.id', 'posting.lab_id')
    .select(eb => [
      'posting.id', 'posting.lab_id as labId', 'lab.title', 'posting.state', 'lab.state as labState', 'posting.opens_at as opensAt', 'posting.due_at as dueAt', 'posting.zone', 'posting.late_rule_json as lateRuleJson',
      'posting.attempts', 'posting.keep', 'posting.released_at as releasedAt',
      eb.selectFrom('allowance').select(inner => inner.fn.max('allowance.due_at').as('until')).whereRef('allowance.posting_id', '=', 'posting.id').where('allowance.membership_id', '=', who.membershipId).as('allowedUntil'),
      eb.selectFrom('standing').select('standing.kind').where('standing.membership_id', '=', who.membershipId).whereRef('standing.lab_id', '=', 'lab.id').orderBy('standing.seq', 'desc').limit(1).as('standing'),
      eb.selectFrom('repair').select(inner => inner.fn.countAll<number>().as('n')).where('repair.kind', '=', 'attempt').where('repair.membership_id', '=', who.membershipId).whereRef('repair.lab_id', '=', 'lab.id').as('granted'),
      eb.selectFrom('lab_revision').select('lab_revision.id').whereRef('lab_revision.lab_id', '=', 'lab.id').where('lab_revision.frozen_at', 'is not', null).orderBy('lab_revision.no', 'desc').limit(1).as('revisionId'),
    ])
    .where('membership.id', '=', who.membershipId).where('membership.state', '=', 'active').where('lab.course_id', '=', who.courseId)
    .where('posting.state', 'in', ['posted', 'withdrawn']).$if(opened === 'open', query => query.where('posting.opens_at', '<=', now)).orderBy('posting.due_at').execute()
  if (postings.length === 0) return []
  const shares = await currentShares(read, who.membershipId, postings.map(posting => posting.labId))
  const revisionIds = postings.flatMap(posting => posting.revisionId ?? [])
  const steps = await read.selectFrom('step').select(eb => ['lab_revision_id', eb.fn.countAll<number>().as('steps'), eb.fn.sum<number>('points_milli').as('maxMilli')]).where('lab_revision_id', 'in', [...revisionIds, '']).groupBy('lab_revision_id').execute()
  const shareIds = [...shares.values(), '']
  const drafts = await read.selectFrom('draft').select(eb => ['share_id', eb.fn.countAll<number>().as('saved')]).where('share_id', 'in', shareIds).where('typed', '<>', '').groupBy('share_id').execute()
  const made = await read.selectFrom('submission').select(['id', 'share_id', 'attempt', 'received_at', 'receipt_no', 'late_units']).where('share_id', 'in', shareIds).orderBy('attempt').execute()
  const accepted = await acceptedLateness(read, made.map(row => row.id))
  return postings.map((posting): WorkListEntry => {
    const shareId = shares.get(posting.labId) ?? null
    const terms = { dueAt: posting.dueAt, allowedUntil: posting.allowedUntil, zone: posting.zone, lateRule: lateRule.parse(JSON.parse(posting.lateRuleJson)) }
    const closesAt = closingOf(terms)
    const last = made.filter(row => row.share_id === shareId).at(-1)
    const count = steps.find(row => row.lab_revision_id === posting.revisionId)
    return {
      labId: posting.labId, postingId: posting.id, shareId, title: posting.title,
      dueAt: new Date(personalDue(terms)).toISOString(), isOwnDue: personalDue(terms) > posting.dueAt, closesAt: closesAt === null ? null : new Date(closesAt).toISOString(), zone: posting.zone, lateRule: terms.lateRule,
      attempts: posting.attempts + (posting.granted ?? 0), attemptsMade: last?.attempt ?? 0, keep: posting.keep,
      steps: Number(count?.steps ?? 0), saved: Number(drafts.find(row => row.share_id === shareId)?.saved ?? 0), maxMilli: Number(count?.maxMilli ?? 0),
      last: last ? { receiptNo: last.receipt_no, at: new Date(last.received_at).toISOString(), lateDays: accepted.get(last.id)?.lateUnits ?? last.late_units } : null,
      standing: standingOf({ isWithdrawn: posting.state === 'withdrawn' || posting.labState === 'withdrawn', standing: posting.standing, hasSubmission: last !== undefined, releasedAt: posting.releasedAt, dueAt: personalDue(terms), closesAt, now }),
    }
  })
}

/** A member's own share of each lab: the newest draw where it was drawn again. */
export async function currentShares(read: Read, membershipId: string, labIds: readonly string[]): Promise<Map<string, string>> {
  const rows = await read.selectFrom('holder_member').innerJoin('share', 'share.holder_id', 'holder_member.holder_id').select(['share.id', 'share.lab_id'])
    .where('holder_member.membership_id', '=', membershipId).where('holder_member.lab_id', 'in', [...labIds, '']).orderBy('share.redraw').execute()
  return new Map(rows.map(row => [row.lab_id, row.id]))
}

export interface StandingFacts {
  isWithdrawn: boolean
  standing: 'counted' | 'excused' | 'not_counted' | null
  hasSubmission: boolean
  releasedAt: number | null
  dueAt: number
  closesAt: number | null
  now: number
}

/** The one word for where a lab stands. What staff decided comes first; then what was handed in; then the clock. */
export function standingOf(facts: StandingFacts): LabStanding {
  if (facts.standing === 'excused' || facts.standing === 'not_counted') return facts.standing
  if (facts.isWithdrawn) return 'withdrawn'
  if (facts.hasSubmission) return facts.releasedAt === null ? 'submitted' : 'released'
  if (facts.now <= facts.dueAt) return 'open'
  return facts.closesAt === null || facts.now <= facts.closesAt ? 'late_open' : 'missing'
}
