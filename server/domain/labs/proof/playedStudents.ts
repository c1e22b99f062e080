import { typedAsAsked } from '#shared/marking/proofOfStep'
import type { Judgement, ReadAnswer, StepQuestion } from '#shared/marking/types'
import { toDouble } from '#shared/numerics/rational'
import { askedSteps, isNumber, type AskedStep } from '#shared/schemas/askedSteps'
import type { QuantityDefinition } from '#shared/thermo/definition'
import { findQuantity } from '#shared/thermo/registry'
import { judgeStep } from '#shared/marking/judge'
import { findUnit, type Unit } from '#shared/units/ucum'
import { readTyped } from '../../marking/readTyped'
import { askedQuestion, type ShareGround } from '../../shares/questionFor'
import type { EarlierReadings } from '../../shares/loadedShare'

/** Six ways in which students work, so that an author sees what marks each would get. The first two are right; a lab in which they lose is red, as is one in which the last wins. */
export const players = [
  { key: 'spreadsheet', name: 'spreadsheet', says: 'carries every digit, types two more than asked', isRight: true },
  { key: 'notebook', name: 'notebook', says: 'types fifteen digits as they come', isRight: true },
  { key: 'early', name: 'early rounder', says: 'rounds each result to the digits asked and goes on from it', isRight: false },
  { key: 'swapped', name: 'swapped axes', says: 'exchanges the axes of a fit, the two levels or two arguments where that can be done', isRight: false },
  { key: 'plot', name: 'plot reader', says: 'reads two digits off the plot', isRight: false },
  { key: 'guesser', name: 'guesser', says: 'types what the books give: 6.5 K/km, 15 °C, 1000 hPa, the first option', isRight: false },
] as const
export type PlayerKey = (typeof players)[number]['key']

export interface PlayedStep { key: string, typed: string, pointsMilli: number, isAccepted: boolean }
export interface PlayedShare { player: PlayerKey, earnedMilli: number, steps: PlayedStep[] }

/** The whole of a share worked by each, step after step, each going on from what they typed before. */
export function playShare(ground: ShareGround): PlayedShare[] {
  return players.map(({ key }) => {
    const earlier: Record<string, EarlierReadings[string]> = {}
    const steps = askedSteps(ground.revision.body).map((step): PlayedStep => {
      const asked = askedQuestion(ground, step.key, earlier)
      if (!('question' in asked)) return { key: step.key, typed: '', pointsMilli: 0, isAccepted: false }
      const typed = typedBy(key, step, asked.question)
      const answer = readTyped(step, typed)
      earlier[step.key] = answer
      const { pointsMilli, isAccepted } = judgeStep(asked.question, answer)
      return { key: step.key, typed, pointsMilli, isAccepted }
    })
    return { player: key, earnedMilli: steps.reduce((sum, step) => sum + step.pointsMilli, 0), steps }
  })
}

const empty: ReadAnswer = { typed: '', reading: 'empty', valueSi: null, decimal: null, unitUcum: null, digits: null, halfUnitSi: null, message: '' }

function typedBy(player: PlayerKey, step: AskedStep, question: StepQuestion): string {
  const judgement = judgeStep(question, empty)
  if (!isNumber(step)) return player === 'guesser' ? step.options[0]?.key ?? '' : judgement.classes.join(', ')
  const definition = findQuantity(step.quantity)
  const unit = findUnit(step.unit)
  if (!definition || !unit) return ''
  if (definition.classes) return player === 'guesser' ? definition.classes[0]?.label ?? '' : definition.classes.find(entry => entry.key === judgement.classes[0])?.label ?? ''
  if (player === 'guesser') return guess(definition, question, unit)
  // who goes on from an own earlier value computes from it
  const value = (judgement.carriedBand ?? judgement.band)?.center
  if (value === undefined) return judgement.outcome === 'refused' ? '' : judgement.outcome.replace('_', ' ')
  switch (player) {
    case 'spreadsheet': return typedAsAsked(definition, question, unit, value, 2)
    case 'notebook': return `${inUnit(value, definition, unit)} ${unitWords(question, definition, unit)}`
    case 'early': return typedAsAsked(definition, question, unit, value)
    case 'swapped': return typedAsAsked(definition, question, unit, exchanged(judgement) ?? value)
    case 'plot': return typedAsAsked(definition, { ...question, digits: 2 }, unit, value)
  }
}

const inUnit = (si: number, definition: QuantityDefinition, unit: Unit): number => (si - (definition.kind === 'temperature' ? toDouble(unit.offset) : 0)) / toDouble(unit.factor)
/** The unit as `typedAsAsked` writes it. */
const unitWords = (question: StepQuestion, definition: QuantityDefinition, unit: Unit): string => typedAsAsked(definition, question, unit, 0).split(' ').slice(1).join(' ')

/** Slips that come from exchanging two things, the most usual first. */
const exchanges = ['inverse-fit', 'swapped-arguments', 'reversed-layer', 'swapped', 'exponent-inverted', 'ratio-inverted', 'inverted-ratio', 'parts-exchanged']
const exchanged = (judgement: Judgement): number | undefined => exchanges.flatMap(key => judgement.slipValues.filter(slip => slip.key === key))[0]?.value

/** What the books give for a quantity of this dimension; where they give nothing, a round number. */
function guess(definition: QuantityDefinition, question: StepQuestion, unit: Unit): string {
  const usual: Readonly<Record<string, number>> = { 'K/m': 0.0065, 'K': definition.kind === 'temperature' ? 288.15 : 10, 'Pa': 100_000, 'm': 1000, 'kg/m3': 1.2, 'J/kg': 10_000, '1': 0.01, 'm/s': 5 }
  return typedAsAsked(definition, { ...question, digits: 3 }, unit, usual[definition.unit] ?? toDouble(unit.factor))
}
