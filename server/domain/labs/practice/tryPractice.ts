import { refuse } from '#shared/errors'
import { judgeStep } from '#shared/marking/judge'
import { askedSteps, type AskedNumber } from '#shared/schemas/askedSteps'
import type { LabBody } from '#shared/schemas/lab'
import type { PracticeTry, TriedStep } from '#shared/schemas/practice'
import type { Read } from '../../../db/writer'
import { heightBarOf, judgedAs } from '../../marking/heightBar'
import { workedOf } from '../../marking/markedStep'
import { readTyped } from '../../marking/readTyped'
import type { EarlierReadings, LoadedShare } from '../../shares/loadedShare'
import { questionFor } from '../../shares/questionFor'
import { openPractice, type AskForPractice } from './openPractice'
import { practicedSteps } from './practicedSteps'

/**
 * A try at one step of the practice. Whoever typed a value that can be read is shown the worked answer with its working; nothing is kept and nothing earns
 * a mark. Values that were typed in earlier steps are carried as they are in the lab.
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
  const judgement = judgeStep(questionFor(ground, step.key, earlierOf(body, step, tried.typed)), answer)
  return {
    readAs, judged: isReading && answer.reading === 'empty' ? 'empty' : judgedAs(judgement, answer), worked: workedOf(step, judgement),
    bar: judgement.band ? heightBarOf(judgement.band, answer, judgement.slip) : null, slip: judgement.slip?.sentence ?? null,
  }
}

function earlierOf(body: LabBody, step: AskedNumber, typed: Readonly<Record<string, string>>): EarlierReadings {
  const steps = askedSteps(body)
  return Object.fromEntries(steps.slice(0, steps.findIndex(each => each.key === step.key)).flatMap(each => each.kind === 'choice' ? [] : [[each.key, readTyped(each, typed[each.key] ?? '')]]))
}
