import { refuse } from '#shared/errors'
import { lateRule, type LateRule } from '#shared/schemas/lab'
import { keptQuery } from '../../db/keptQuery'
import type { Read } from '../../db/writer'
import { getDraw } from '../shares/draws'

/**
 * What a submission stands on and what may change under it: read before judging and again inside the storing
 * transaction.
 */
export interface Ground {
  shareId: string
  redraw: number
  newestRedraw: number
  dataSetVersionId: string
  holderId: string
  membershipId: string
  membershipState: string
  sectionId: string | null
  courseId: string
  courseCode: string
  conventionRevisionId: string
  termState: 'planned' | 'running' | 'closed'
  labId: string
  labTitle: string
  labState: string
  /** The revision of the share's draw: what its student was asked. */
  labRevisionId: string
  /** The newest revision that is frozen: a draft that an instructor is at does not count. */
  newestRevisionId: string | null
  postingId: string | null
  postingState: string | null
  postingVersion: number | null
  opensAt: number | null
  dueAt: number | null
  zone: string | null
  lateRuleJson: string | null
  /** The posting's, and what was granted to this share's holders. */
  attempts: number | null
  keep: 'last' | 'best' | null
  feedback: 'at_once' | 'after_release' | null
  releasedAt: number | null
  /** The latest allowance of this share's holders for the posting, extensions and accommodations alike. */
  allowedUntil: number | null
  attemptsMade: number
  /** What rulings and marking runs have added, in the order in which it came. */
  acceptedIds: readonly string[]
}

const groundOfShare = keptQuery((db, given: { shareId: string, membershipId: string }) => db.selectFrom('share')
  .innerJoin('holder_member', join => join.onRef('holder_member.holder_id', '=', 'share.holder_id').on('holder_member.membership_id', '=', given.membershipId))
  .innerJoin('membership', 'membership.id', 'holder_member.membership_id')
  .innerJoin('draw', 'draw.id', 'share.draw_id').innerJoin('lab', 'lab.id', 'share.lab_id').innerJoin('course', 'course.id', 'lab.course_id').innerJoin('term', 'term.id', 'course.term_id')
  .leftJoin('posting', join => join.onRef('posting.lab_id', '=', 'lab.id').onRef('posting.section_id', '=', 'membership.section_id'))
  .select(eb => [
    'share.id as shareId', 'share.redraw', 'share.data_set_version_id as dataSetVersionId', 'share.holder_id as holderId', 'draw.lab_revision_id as labRevisionId',
    'membership.id as membershipId', 'membership.state as membershipState', 'membership.section_id as sectionId',
    'course.id as courseId', 'course.code as courseCode', 'draw.id as drawId', 'term.state as termState',
    'lab.id as labId', 'lab.title as labTitle', 'lab.state as labState',
    'posting.id as postingId', 'posting.state as postingState', 'posting.version as postingVersion', 'posting.opens_at as opensAt', 'posting.due_at as dueAt', 'posting.zone as zone',
    'posting.late_rule_json as lateRuleJson', 'posting.attempts', 'posting.keep', 'posting.feedback', 'posting.released_at as releasedAt',
    eb.selectFrom('share as other').select(inner => inner.fn.max('other.redraw').as('n')).whereRef('other.lab_id', '=', 'share.lab_id').whereRef('other.holder_id', '=', 'share.holder_id').as('newestRedraw'),
    eb.selectFrom('lab_revision').select('lab_revision.id').whereRef('lab_revision.lab_id', '=', 'lab.id').where('lab_revision.frozen_at', 'is not', null).orderBy('lab_revision.no', 'desc').limit(1).as('newestRevisionId'),
    eb.selectFrom('allowance').innerJoin('holder_member as holding', 'holding.membership_id', 'allowance.membership_id').select(inner => inner.fn.max('allowance.due_at').as('until'))
      .whereRef('allowance.posting_id', '=', 'posting.id').whereRef('holding.holder_id', '=', 'share.holder_id').as('allowedUntil'),
    eb.selectFrom('repair').innerJoin('holder_member as granted', 'granted.membership_id', 'repair.membership_id').select(inner => inner.fn.countAll<number>().as('n'))
      .where('repair.kind', '=', 'attempt').whereRef('repair.lab_id', '=', 'share.lab_id').whereRef('granted.holder_id', '=', 'share.holder_id').as('attemptsGranted'),
    eb.selectFrom('submission').select(inner => inner.fn.max('submission.attempt').as('made')).whereRef('submission.share_id', '=', 'share.id').as('attemptsMade'),
  ])
  .where('share.id', '=', given.shareId))
const acceptedInLab = keptQuery((db, given: { labId: string }) => db.selectFrom('accepted').select('id').where('lab_id', '=', given.labId).where('revoked_at', 'is', null).orderBy('added_at').orderBy('id'))

/** Reads the ground of one member's share; null where there is no such share of theirs. */
export async function readGround(db: Read, shareId: string, membershipId: string): Promise<Ground | null> {
  const [row] = await groundOfShare(db, { shareId, membershipId })
  if (!row) return null
  const accepted = await acceptedInLab(db, { labId: row.labId })
  // A posted lab keeps the convention that its shares were checked by, whatever its course teaches since.
  const { conventionRevisionId } = (await getDraw(db, row.drawId)).supply
  const { attemptsGranted, ...rest } = row
  return { ...rest, attempts: row.attempts === null ? null : row.attempts + (attemptsGranted ?? 0), conventionRevisionId, newestRedraw: row.newestRedraw ?? row.redraw, attemptsMade: row.attemptsMade ?? 0, acceptedIds: accepted.map(each => each.id) }
}

/** True when a judgement made on one ground holds on the other. How many attempts were made is no part of it: it is counted anew. */
export const isSameGround = (a: Ground, b: Ground): boolean => JSON.stringify({ ...a, attemptsMade: 0 }) === JSON.stringify({ ...b, attemptsMade: 0 })

/** A ground on which work is under way: the lab is posted to the section. */
export interface PostedGround extends Ground {
  postingId: string
  postingVersion: number
  opensAt: number
  dueAt: number
  zone: string
  lateRule: LateRule
  attempts: number
  keep: 'last' | 'best'
  feedback: 'at_once' | 'after_release'
}

/**
 * The ground as one on which a person may type at `at`.
 * @throws {DomainError} `not_found`, `lab_withdrawn`, `lab_not_open`
 */
export function postedGround(ground: Ground | null, at: number): PostedGround {
  if (!ground || ground.membershipState !== 'active') return refuse('not_found')
  if (ground.labState === 'withdrawn' || ground.postingState === 'withdrawn') return refuse('lab_withdrawn')
  const { postingId, postingVersion, opensAt, dueAt, zone, lateRuleJson, attempts, keep, feedback } = ground
  if (ground.redraw !== ground.newestRedraw) return refuse('not_found')
  if (postingId === null || postingVersion === null || opensAt === null || dueAt === null || zone === null || lateRuleJson === null || attempts === null || keep === null || feedback === null) return refuse('not_found')
  if (ground.postingState !== 'posted' || opensAt > at) return refuse('lab_not_open')
  return { ...ground, postingId, postingVersion, opensAt, dueAt, zone, attempts, keep, feedback, lateRule: lateRule.parse(JSON.parse(lateRuleJson)) }
}
