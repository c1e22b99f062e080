import { refuse } from '#shared/errors'
import type { Accepted } from '#shared/marking/types'
import { askedSteps } from '#shared/schemas/askedSteps'
import type { AcceptedTable } from '../../db/schema/labs'
import { questionFor } from '../shares/questionFor'
import type { EarlierReadings, LoadedShare } from '../shares/loadedShare'
import { acceptedOf } from './acceptedOf'
import { readTyped } from './readTyped'
import type { Reference } from './reference'
import type { Judged } from './storedEvaluation'

/**
 * Judges what was typed in every step, in order: each is read with its unit, asked from the share and from the student's own
 * earlier readings, and judged by the given build. Pure; an unreadable or wrong answer is a mark with its reason, never an error.
 * @throws {DomainError} `nothing_to_submit` when every field is empty, `invalid` for a step that the lab does not have
 */
export function judgeSubmission(reference: Reference, loaded: LoadedShare, typed: Readonly<Record<string, string>>, accepted: readonly Pick<AcceptedTable, 'step_key' | 'body_json'>[] = []): Judged[] {
  const steps = askedSteps(loaded.revision.body)
  const unknown = Object.keys(typed).filter(key => !steps.some(step => step.key === key))
  if (unknown.length > 0) refuse('invalid', {}, unknown.map(key => ({ path: `answers.${key}`, message: 'This lab has no such step.' })))
  if (steps.every(step => (typed[step.key] ?? '').trim() === '')) refuse('nothing_to_submit')
  const earlier: Record<string, EarlierReadings[string]> = {}
  return steps.map((step) => {
    const answer = readTyped(step, typed[step.key] ?? '')
    const rulings: readonly Accepted[] = acceptedOf(accepted, step.key)
    const question = { ...questionFor(loaded, step.key, earlier), ...(rulings.length > 0 ? { accepted: rulings } : {}) }
    earlier[step.key] = answer
    return { stepKey: step.key, question, answer, judgement: reference.judgeStep(question, answer) }
  })
}
