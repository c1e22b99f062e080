import type { Judgement } from '#shared/marking/types'
import { askedSteps, type AskedStep } from '#shared/schemas/askedSteps'
import { labBody } from '#shared/schemas/lab'
import type { MarkedStep } from '#shared/schemas/marks'
import { renderInline } from '../labs/renderLabText'
import { carriedNoteOf } from './carriedNoteOf'
import { classLabel } from './classLabel'
import { heightBarOf, judgedAs } from './heightBar'
import type { StoredStep } from './readEvaluations'
import { judgementOfRow, questionOfRow } from './storedEvaluation'

const noConvention = { key: '', title: '', source: '', constants: {}, variants: {}, accepted: [] } as const

/** Everything that a stored revision asks, in its order. */
export const stepsOfBody = (bodyJson: string): AskedStep[] => askedSteps(labBody.parse(JSON.parse(bodyJson)))

/** One step as its student sees it once marks are released: value, band and where its width comes from, and the working with numbers put in. */
export function markedStep(step: AskedStep, no: number, ask: string, stored: StoredStep): MarkedStep {
  const evaluation = stored.evaluation
  if (!evaluation) throw new Error(`Step ${step.key} of submission ${stored.submissionId} has no evaluation.`)
  const judgement = judgementOfRow(evaluation)
  const { question, answer } = questionOfRow(evaluation, noConvention)
  return {
    key: step.key, no, title: step.title, ask, typed: stored.typed, readAs: answer.message, judged: judgedAs(judgement, answer), pointsMilli: stored.pointsMilli, maxMilli: stored.maxMilli,
    bar: judgement.band ? heightBarOf(judgement.band, answer, judgement.slip) : null,
    carriedBar: judgement.carriedBand ? heightBarOf(judgement.carriedBand, answer) : null,
    carriedNote: carriedNoteOf(question, judgement),
    slip: judgement.slip ? { key: judgement.slip.key, label: judgement.slip.label, sentence: judgement.slip.sentence } : null,
    worked: workedOf(step, judgement),
    notes: [...judgement.notes],
  }
}

/** The worked value of a step with the lines that lead to it, numbers put in. */
export function workedOf(step: AskedStep, judgement: Judgement): MarkedStep['worked'] {
  return { ...workedValue(step, judgement), reason: judgement.reason, lines: judgement.trace.map(line => ({ text: line.text, formulaHtml: texLine(line.formula), filledHtml: texLine(line.filled) })) }
}

/** A line of TeX; an empty one stays empty. */
const texLine = (formula: string): string => formula === '' ? '' : renderInline(`$\\displaystyle ${formula}$`)

/** A number has one digit more than was asked, so that rounding can be followed. */
function workedValue(step: AskedStep, judgement: Judgement): { value: string, unit: string } {
  if (judgement.band) {
    const bar = heightBarOf(judgement.band, { decimal: null })
    return { value: bar.center.toFixed(bar.digits), unit: bar.unit }
  }
  const words: Record<Judgement['outcome'], string> = { value: '', class: judgement.classes.map(key => step.kind === 'choice' ? step.options.find(option => option.key === key)?.text ?? key : classLabel(step.quantity, key)).join(step.kind === 'choice' ? '; ' : ' or '), none: 'none', not_reached: 'not reached', not_defined: 'not defined', refused: 'not computed' }
  return { value: words[judgement.outcome], unit: '' }
}
