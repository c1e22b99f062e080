import type { LabBody, LateRule } from '#shared/schemas/lab'
import { askedSteps, isNumber } from '#shared/schemas/askedSteps'
import { findQuantity } from '#shared/thermo/registry'
import type { Stores } from '../server/db/writer'
import { createLab } from '../server/domain/labs/createLab'
import { postLab } from '../server/domain/labs/postLab'
import { saveRevision } from '../server/domain/labs/saveRevision'
import { readTyped } from '../server/domain/marking/readTyped'
import { releaseMarks } from '../server/domain/marking/releaseMarks'
import type { EarlierReadings } from '../server/domain/shares/loadedShare'
import { questionFor } from '../server/domain/shares/questionFor'
import { saveDraft } from '../server/domain/submissions/saveDraft'
import { submitLab, type Judging } from '../server/domain/submissions/submitLab'
import type { Observations } from '../server/observations/chunks'
import { createHash } from 'node:crypto'
import type { Member } from './department'
import { randomFrom } from './generator/arithmetic'
import { doingOf, habitsOf, typedFor, type Doing, type Habits } from './students'

export interface LabDates { opensLocal: string, dueLocal: string }
/** What a certain student does in a certain step, where the story asks for it. */
export type Story = Readonly<Record<string, Readonly<Record<string, Doing>>>>

/** One lab of the demo: written, posted, worked on and released through the same use cases that people's clicks reach. */
export class LabRun {
  labId = ''
  private version = 0

  constructor(private readonly stores: Stores, private readonly observations: Observations, private readonly judging: Judging, private readonly name: string) {}

  async write(courseId: string, body: LabBody, actorId: string, now: number): Promise<void> {
    const made = await createLab(this.stores, { actorId, once: null, courseId, body }, now)
    this.labId = made.id
    this.version = made.version
  }

  /** Takes the draft that came along from the last term, and gives it this term's flights. */
  async rewrite(courseId: string, body: LabBody, actorId: string, now: number): Promise<void> {
    const lab = await this.stores.read.selectFrom('lab').select(['id', 'version']).where('course_id', '=', courseId).where('title', '=', body.title).executeTakeFirstOrThrow()
    this.labId = lab.id
    this.version = (await saveRevision(this.stores, { labId: lab.id, actorId, seenVersion: lab.version, body }, now)).version
  }

  async post(sections: readonly { id: string, dates: LabDates }[], actorId: string, now: number, more: { attempts?: number, lateRule?: LateRule } = {}): Promise<void> {
    const posted = await postLab(this.stores, this.observations, {
      actorId, once: null, labId: this.labId, seenVersion: this.version, seed: createHash('sha256').update(this.name).digest().subarray(0, 16),
      posting: { sections: sections.map(({ id, dates }) => ({ sectionId: id, ...dates })), lateRule: more.lateRule, attempts: more.attempts ?? 1, keep: 'last', feedback: 'after_release' },
    }, now)
    this.version = posted.version
  }

  async release(sectionId: string, actorId: string, now: number): Promise<void> {
    const posting = await this.stores.read.selectFrom('posting').select(['id', 'version']).where('lab_id', '=', this.labId).where('section_id', '=', sectionId).executeTakeFirstOrThrow()
    await releaseMarks(this.stores, { actorId, postingId: posting.id, seenVersion: posting.version }, now)
  }

  private async isThere(member: Member): Promise<boolean> {
    return await this.stores.read.selectFrom('membership').select('id').where('id', '=', member.membershipId).where('state', '=', 'active').executeTakeFirst() !== undefined
  }

  private async shareOf(member: Member): Promise<string> {
    const share = await this.stores.read.selectFrom('share').innerJoin('holder_member', 'holder_member.holder_id', 'share.holder_id').select('share.id')
      .where('share.lab_id', '=', this.labId).where('holder_member.membership_id', '=', member.membershipId).orderBy('share.redraw', 'desc').executeTakeFirstOrThrow()
    return share.id
  }

  /** What a student types, step by step, each built on their own earlier values. */
  private async answers(member: Member, shareId: string, story: Story): Promise<Record<string, string>> {
    const loaded = await this.judging.loadShare(shareId)
    const habits: Habits = habitsOf(member.key)
    const random = randomFrom(`${this.name} ${member.key}`)
    const earlier: Record<string, EarlierReadings[string]> = {}
    const answers: Record<string, string> = {}
    for (const step of askedSteps(loaded.revision.body)) {
      const judgement = this.judging.reference.judgeStep(questionFor(loaded, step.key, earlier), readTyped(step, ''))
      const doing = story[member.key]?.[step.key] ?? doingOf(random, habits, judgement)
      if (!isNumber(step)) {
        answers[step.key] = doing.does === 'blank' ? '' : doing.does === 'right' ? judgement.classes.join(', ') : step.options.find(option => !option.isRight)?.key ?? ''
        continue
      }
      const classes = findQuantity(step.quantity)?.classes?.map(entry => entry.key) ?? []
      answers[step.key] = typedFor(random, habits, step, judgement, doing, { right: judgement.classes[0] ?? null, all: classes })
      earlier[step.key] = readTyped(step, answers[step.key] ?? '')
    }
    return answers
  }

  /** Hands in; nothing where somebody has left the course by then. `claimedSentAt` where the line was dead and the device says when it was sent. */
  async submit(member: Member, story: Story, now: number, claimedSentAt: number | null = null): Promise<void> {
    if (!await this.isThere(member)) return
    const shareId = await this.shareOf(member)
    const answers = await this.answers(member, shareId, story)
    await this.save(member, shareId, Object.entries(answers), () => now)
    const key = createHash('sha256').update(`${this.name} ${member.key} ${now}`).digest('hex').slice(0, 32)
    const request = { key, route: `POST /api/shares/${shareId}/submissions`, bodySha256: createHash('sha256').update(JSON.stringify(answers)).digest() }
    await submitLab(this.stores, this.judging, { personId: member.personId, membershipId: member.membershipId, shareId, request, answers, claimedSentAt }, now)
  }

  /** Saves the first steps as somebody would who is in the middle of it. */
  async draft(member: Member, steps: number, now: number): Promise<void> {
    const shareId = await this.shareOf(member)
    const answers = await this.answers(member, shareId, {})
    await this.save(member, shareId, Object.entries(answers).slice(0, steps), at => now + at * 240_000)
  }

  /** What is typed stands in its field, as the work page keeps it: whoever has handed in finds it there again. */
  private async save(member: Member, shareId: string, typedIn: readonly [string, string][], timeOf: (at: number) => number): Promise<void> {
    const before = new Map((await this.stores.read.selectFrom('draft').select(['step_key', 'version']).where('share_id', '=', shareId).execute()).map(row => [row.step_key, row.version]))
    await Promise.all(typedIn.map(async ([stepKey, typed], at) => {
      if (typed !== '' || before.has(stepKey)) await saveDraft(this.stores, { membershipId: member.membershipId, shareId, stepKey, typed, baseVersion: before.get(stepKey) ?? 0 }, timeOf(at))
    }))
  }
}
