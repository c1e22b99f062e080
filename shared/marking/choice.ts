/** Options of which one or several are right. */
import { withinStep } from './points'
import type { Judgement, ReadAnswer, StepQuestion } from './types'

/** The options that stand in a typed answer, by key: "a, c". */
export const optionsIn = (typed: string): string[] => [...new Set(typed.split(/[\s,;]+/).filter(part => part !== ''))]

/** Right where just the right options are chosen: all of them and no other. */
export function judgedChoice(choice: NonNullable<StepQuestion['choice']>, maxMilli: number, answer: ReadAnswer, blank: Omit<Judgement, 'outcome'>): Judgement {
  const chosen = answer.reading === 'class' ? optionsIn(answer.typed) : []
  const isRight = chosen.length === choice.right.length && choice.right.every(key => chosen.includes(key))
  return {
    ...blank, outcome: 'class', classes: choice.right, isAccepted: isRight, acceptedBy: isRight ? 'word' : null,
    pointsMilli: isRight ? withinStep(maxMilli, maxMilli) : 0, trace: choice.why.map(text => ({ text, formula: '', filled: '' })),
  }
}

/** Reads what was chosen; an option that is not there is named. */
export function readChoice(typed: string, options: readonly { key: string, label: string }[], isSeveral: boolean): ReadAnswer {
  const empty = { typed, valueSi: null, decimal: null, unitUcum: null, digits: null, halfUnitSi: null }
  const chosen = optionsIn(typed)
  if (chosen.length === 0) return { ...empty, reading: 'empty', message: '' }
  const unknown = chosen.find(key => !options.some(option => option.key === key))
  if (unknown !== undefined) return { ...empty, reading: 'unreadable', message: `There is no option ${unknown}.` }
  if (chosen.length > 1 && !isSeveral) return { ...empty, reading: 'ambiguous', message: 'One option can be chosen here.' }
  return { ...empty, reading: 'class', message: `chosen: ${chosen.map(key => options.find(option => option.key === key)?.label ?? key).join('; ')}` }
}
