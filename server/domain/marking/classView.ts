import { refuse } from '#shared/errors'
import { lateRule } from '#shared/schemas/lab'
import type { ClassStep, ClassView } from '#shared/schemas/marks'
import type { Read } from '../../db/writer'
import { closingOf, personalDue } from '../submissions/lateness'
import { standingOf } from '../submissions/workList'
import { attemptsOfShares, type StoredAttempt } from './attemptsOf'
import { heightBarOf, judgedAs, offsetInHalfWidths } from './heightBar'
import { labTotal, type LabTotal } from './labTotal'
import { stepsOfBody } from './markedStep'
import { currentSteps, type StoredStep } from './readEvaluations'
import { judgementOfRow, questionOfRow } from './storedEvaluation'

const noConvention = { key: '', title: '', source: '', constants: {}, variants: {}, accepted: [] } as const

/** What a section did in a lab: each value against the band of its own share, slips by number, and who has what standing. */
export async function classView(read: Read, postingId: string, now: number): Promise<ClassView> {
  const posting = await read.selectFrom('posting').innerJoin('lab', 'lab.id', 'posting.lab_id').innerJoin('section', 'section.id', 'posting.section_id')
    .select(eb => ['posting.id', 'posting.lab_id', 'posting.section_id', 'section.name as section', 'posting.version', 'posting.state', 'posting.due_at', 'posting.zone', 'posting.late_rule_json', 'posting.keep', 'posting.attempts', 'posting.released_at', 'lab.title',
      eb.selectFrom('lab_revision').select('lab_revision.id').whereRef('lab_revision.lab_id', '=', 'lab.id').where('lab_revision.frozen_at', 'is not', null).orderBy('lab_revision.no', 'desc').limit(1).as('revisionId')])
    .where('posting.id', '=', postingId).executeTakeFirst()
  if (!posting || posting.revisionId === null) return refuse('not_found')
  const revision = await read.selectFrom('lab_revision').select(['no', 'body_json']).where('id', '=', posting.revisionId).executeTakeFirstOrThrow()
  const rule = lateRule.parse(JSON.parse(posting.late_rule_json))
  const students = await read.selectFrom('membership').leftJoin('person', 'person.id', 'membership.person_id')
    .select(eb => ['membership.id', 'membership.pseudonym', 'person.display_name',
      eb.selectFrom('allowance').select(inner => inner.fn.max('allowance.due_at').as('until')).whereRef('allowance.membership_id', '=', 'membership.id').where('allowance.posting_id', '=', postingId).as('allowedUntil'),
      eb.selectFrom('repair').select(inner => inner.fn.countAll<number>().as('n')).where('repair.kind', '=', 'attempt').whereRef('repair.membership_id', '=', 'membership.id').where('repair.lab_id', '=', posting.lab_id).as('granted'),
      eb.selectFrom('standing').select('standing.kind').whereRef('standing.membership_id', '=', 'membership.id').where('standing.lab_id', '=', posting.lab_id).orderBy('standing.seq', 'desc').limit(1).as('standing')])
    .where('membership.section_id', '=', posting.section_id).where('membership.role', '=', 'student').where('membership.state', '=', 'active').orderBy('membership.id').execute()
  const shareOf = await sharesOfMembers(read, posting.lab_id, students.map(student => student.id))
  const attempts = await attemptsOfShares(read, [...new Set(shareOf.values())])
  const people = students.map((student) => {
    const made = attempts.get(shareOf.get(student.id) ?? '') ?? []
    const counts = labTotal(made, posting.keep)
    const terms = { dueAt: posting.due_at, allowedUntil: student.allowedUntil, zone: posting.zone, lateRule: rule }
    const closesAt = closingOf(terms)
    const standing = standingOf({ isWithdrawn: posting.state === 'withdrawn', standing: student.standing, hasSubmission: made.length > 0, releasedAt: posting.released_at, dueAt: personalDue(terms), closesAt, now })
    return { membershipId: student.id, name: student.display_name ?? student.pseudonym, standing, submissionId: counts?.submissionId ?? null, totalMilli: counts?.totalMilli ?? null, lateDays: counts?.lateDays ?? null, claimedSentAt: claimOf(made, counts), maySubmit: made.length < posting.attempts + (student.granted ?? 0) && (made.length === 0 || posting.released_at === null) && (closesAt === null || now <= closesAt) }
  })
  const counted = people.filter(person => person.submissionId !== null && person.standing !== 'excused' && person.standing !== 'not_counted')
  const stored = await currentSteps(read, people.flatMap(person => person.submissionId ?? []))
  const bodySteps = stepsOfBody(revision.body_json)
  const steps = bodySteps.map((step, at) => classStep(step.key, at + 1, step.title, step.pointsMilli, stored.filter(each => each.stepKey === step.key), people))
  const closesAt = closingOf({ dueAt: posting.due_at, allowedUntil: null, zone: posting.zone, lateRule: rule })
  return {
    posting: { id: posting.id, labId: posting.lab_id, section: posting.section, version: posting.version, dueAt: new Date(posting.due_at).toISOString(), closesAt: closesAt === null ? null : new Date(closesAt).toISOString(), zone: posting.zone, releasedAt: posting.released_at === null ? null : new Date(posting.released_at).toISOString(), state: posting.state },
    lab: { title: posting.title, revisionNo: revision.no },
    students: people.length, handedIn: people.filter(person => person.submissionId !== null).length, late: people.filter(person => (person.lateDays ?? 0) > 0).length,
    missing: people.filter(person => person.standing === 'missing').length, excused: people.filter(person => person.standing === 'excused').length, mayStillSubmit: people.filter(person => person.maySubmit && person.standing !== 'excused').length,
    meanMilli: counted.length === 0 ? null : Math.round(counted.reduce((sum, person) => sum + (person.totalMilli ?? 0), 0) / counted.length), maxMilli: bodySteps.reduce((sum, step) => sum + step.pointsMilli, 0),
    steps, slips: slipsOf(steps, stored),
    people: people.map(({ maySubmit: _maySubmit, ...person }) => person),
  }
}

/** A late submission's claim to have been sent earlier, for staff to look at; the server's receipt decides. */
function claimOf(made: readonly StoredAttempt[], counts: LabTotal | null): string | null {
  const claimed = counts !== null && counts.lateDays > 0 ? made.find(attempt => attempt.submissionId === counts.submissionId && !attempt.isAccepted)?.claimedSentAt ?? null : null
  return claimed === null ? null : new Date(claimed).toISOString()
}

async function sharesOfMembers(read: Read, labId: string, membershipIds: readonly string[]): Promise<Map<string, string>> {
  if (membershipIds.length === 0) return new Map()
  const rows = await read.selectFrom('holder_member').innerJoin('share', 'share.holder_id', 'holder_member.holder_id').select(['holder_member.membership_id', 'share.id'])
    .where('holder_member.lab_id', '=', labId).where('holder_member.membership_id', 'in', [...membershipIds]).orderBy('share.redraw').execute()
  return new Map(rows.map(row => [row.membership_id, row.id]))
}

function classStep(key: string, no: number, title: string, maxMilli: number, stored: readonly StoredStep[], people: readonly { name: string, submissionId: string | null }[]): ClassStep {
  let parts: ClassStep['parts'] = []
  const dots = stored.flatMap((each) => {
    if (!each.evaluation) return []
    const judgement = judgementOfRow(each.evaluation)
    const { answer } = questionOfRow(each.evaluation, noConvention)
    const band = judgement.acceptedBy === 'carried' && judgement.carriedBand ? judgement.carriedBand : judgement.band
    if (band && parts.length === 0) {
      const bar = heightBarOf(band, answer)
      const [below, above] = [bar.center - bar.low, bar.high - bar.center]
      parts = bar.parts.map(part => ({ key: part.key, label: part.label, below: below > 0 ? part.below / below : 0, above: above > 0 ? part.above / above : 0 }))
    }
    return [{
      submissionId: each.submissionId, name: people.find(person => person.submissionId === each.submissionId)?.name ?? '',
      offset: band ? offsetInHalfWidths(band, answer) : null, judged: judgedAs(judgement, answer), slip: judgement.slip?.key ?? null,
    }]
  })
  const count = (...words: readonly string[]) => dots.filter(dot => words.includes(dot.judged)).length
  return { key, no, title, maxMilli, within: count('within', 'right', 'accepted'), outside: count('above', 'below', 'wrong'), empty: count('empty'), notRead: count('not_read', 'not_judged'), parts, dots }
}

/** Slips by number, the most frequent first; values outside the band that no slip explains close the list. */
function slipsOf(steps: readonly ClassStep[], stored: readonly StoredStep[]): ClassView['slips'] {
  const labels = new Map<string, string>()
  for (const each of stored) {
    const slip = each.evaluation ? judgementOfRow(each.evaluation).slip : null
    if (slip) labels.set(slip.key, slip.label)
  }
  const found = steps.flatMap((step) => {
    const outside = step.dots.filter(dot => dot.judged === 'above' || dot.judged === 'below' || dot.judged === 'wrong')
    const keys = [...new Set(outside.flatMap(dot => dot.slip ?? []))]
    const named = keys.map(key => ({ key, label: labels.get(key) ?? key, stepNo: step.no, students: outside.filter(dot => dot.slip === key).length }))
    const unexplained = outside.filter(dot => dot.slip === null).length
    return unexplained === 0 ? named : [...named, { key: 'unexplained', label: 'outside, no slip found', stepNo: step.no, students: unexplained }]
  })
  return found.sort((a, b) => Number(a.key === 'unexplained') - Number(b.key === 'unexplained') || b.students - a.students || a.stepNo - b.stepNo)
}
