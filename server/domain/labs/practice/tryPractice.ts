import { refuse } from '#shared/errors'
import { judgeStep } from '#shared/marking/judge'
import type { PracticeTry, TriedStep } from '#shared/schemas/practice'
import type { Read } from '../../../db/writer'
import { heightBarOf, judgedAs } from '../../marking/heightBar'
import { workedOf } from '../../marking/markedStep'
import { readTyped } from '../../marking/readTyped'
import type { LoadedShare } from '../../shares/loadedShare'
import { questionFor } from '../../shares/questionFor'
import { openPractice, type AskForPractice } from './openPractice'
import { practicedSteps } from './practicedSteps'

/**
 * A try at one step of the practice. Whoever typed a value that can be read is shown the worked answer with its working; nothing is kept and nothing earns
 * a mark. Nothing that was typed is carried: every earlier value, also of an own reading, is the practice's, so that no number of a student's own can be worked here.
 * @throws {DomainError} `not_found` for a step whose worked answer a practice does not show
 */
export async function tryPractice(read: Read, loadShare: (shareId: string) => Promise<LoadedShare>, who: AskForPractice, tried: PracticeTry, now: number): Promise<TriedStep> {
  const { body, ground } = await openPractice(read, loadShare, who, now)
  const step = practicedSteps(body).find(each => each.key === tried.stepKey)
  if (!step) return refuse('not_found')
  const answer = readTyped(step, tried.typed[step.key] ?? '')
  const readAs = answer.message
  const isReading = step.kind === 'reading'
  if (!isReading && ['empty', 'unreadable', 'wrong_dimension', 'ambiguous'].includes(answer.reading)) return { readAs, judged: answer.reading === 'empty' ? 'empty' : 'not_read', worked: null, bar: null, slip: null }
  const judgement = judgeStep(questionFor(ground, step.key, {}), answer)
  return {
    readAs, judged: isReading && answer.reading === 'empty' ? 'empty' : judgedAs(judgement, answer), worked: workedOf(step, judgement),
    bar: judgement.band ? heightBarOf(judgement.band, answer, judgement.slip) : null, slip: judgement.slip?.sentence ?? null,
  }
}
