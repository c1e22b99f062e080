import { DomainError } from '#shared/errors'
import { judgeStep } from '#shared/marking/judge'
import { checkBand } from '#shared/marking/proof'
import type { Band, Judgement, ReadAnswer } from '#shared/marking/types'
import { askedSteps, isNumber, type AskedStep } from '#shared/schemas/askedSteps'
import type { SupplyItem } from '#shared/schemas/lab'
import type { HeightBar } from '#shared/schemas/marks'
import { findQuantity } from '#shared/thermo/registry'
import { formatUnit } from '#shared/units/formatQuantity'
import { legNames } from '../shares/legs'
import { heightBarOf, shownScale } from '../marking/heightBar'
import { askedQuestion } from '../shares/questionFor'
import { bindingProblems } from './bindingProblems'
import type { PreparedLab } from './prepareLab'
import { renderInline } from './renderLabText'

export interface CheckedStep {
  key: string
  title: string
  ok: boolean
  code: 'band_too_wide' | 'share_degenerate' | null
  reason: string | null
  ask: string
  outcome: Judgement['outcome']
  /** The reference's answer in words: "6.48 K km⁻¹", "stable", "not defined". */
  words: string
  unit: string
  band: HeightBar | null
  trace: { text: string, formulaHtml: string, filledHtml: string }[]
}
export interface CheckedShare { no: number, title: string, versionId: string, leg: SupplyItem['leg'], lowM: number, highM: number, used: number, rows: number, steps: CheckedStep[] }

const nothing: ReadAnswer = { typed: '', reading: 'empty', valueSi: null, decimal: null, unitUcum: null, digits: null, halfUnitSi: null, message: '' }

/** The first thing that stops a posting, as a refusal that names share and step; null where nothing does. */
export function firstRefusal(lab: PreparedLab, shares: readonly CheckedShare[]): DomainError | null {
  const [open] = bindingProblems(lab)
  if (open) return new DomainError('binding_invalid', { step: open.path, reason: open.message }, bindingProblems(lab))
  for (const share of shares) {
    const step = share.steps.find(entry => !entry.ok)
    if (step) return new DomainError(step.code ?? 'share_degenerate', { share: share.no, shareTitle: share.title, step: step.title, stepKey: step.key, reason: step.reason })
  }
  return null
}

export function shareTitle(lab: PreparedLab, item: SupplyItem): string {
  return `${lab.flightOf(item.versionId).flight.title}, ${legNames[item.leg]}, ${String(item.lowM).replace('-', '−')}–${item.highM} m`
}

export function checkShare(lab: PreparedLab, item: SupplyItem): CheckedShare {
  const { rows, asks } = lab.serve(item)
  const ground = { rows, convention: lab.convention, share: { item }, revision: { body: lab.revision.body } }
  return {
    no: lab.items.indexOf(item) + 1, title: shareTitle(lab, item), versionId: item.versionId, leg: item.leg, lowM: item.lowM, highM: item.highM, used: rows.use.filter(Boolean).length, rows: rows.count,
    steps: askedSteps(lab.revision.body).map(step => checkStep(step, asks[step.key] ?? '', askedQuestion(ground, step.key, {}))),
  }
}

function checkStep(step: AskedStep, ask: string, asked: ReturnType<typeof askedQuestion>): CheckedStep {
  const bare = { key: step.key, title: step.title, ask, unit: isNumber(step) ? step.unit : '1', band: null, trace: [] }
  if (!('question' in asked)) return { ...bare, ok: false, code: 'share_degenerate', reason: asked.reason, outcome: 'refused', words: 'not computed' }
  const judgement = judgeStep(asked.question, nothing)
  const { ok, reasons } = isNumber(step) ? checkBand(asked.question) : { ok: true, reasons: [] }
  return {
    ...bare, ok, code: ok ? null : judgement.outcome === 'value' ? 'band_too_wide' : 'share_degenerate', reason: ok ? null : reasons.join(' '), outcome: judgement.outcome, words: wordsOf(step, judgement),
    band: judgement.band ? barWithSlips(judgement.band, judgement.slipValues) : null,
    trace: judgement.trace.map(line => ({ text: line.text, formulaHtml: texLine(line.formula), filledHtml: texLine(line.filled) })),
  }
}

/** The band as it is drawn, with the value of every slip that can be made here beside it. */
function barWithSlips(band: Band, slips: Judgement['slipValues']): HeightBar {
  const shown = shownScale(band)
  return { ...heightBarOf(band, { decimal: null }), ghosts: slips.map(slip => ({ label: slip.label, value: shown(slip.value) })) }
}

const texLine = (formula: string): string => formula === '' ? '' : renderInline(`$\\displaystyle ${formula}$`)

function wordsOf(step: AskedStep, judgement: Judgement): string {
  if (!isNumber(step)) return step.options.filter(option => option.isRight).map(option => option.text).join('; ')
  if (judgement.band) {
    const shown = heightBarOf(judgement.band, { decimal: null })
    const unit = formatUnit(step.unit)
    return `${shown.center.toFixed(shown.digits).replace('-', '−')}${unit === '' ? '' : ` ${unit}`}`
  }
  const classes = findQuantity(step.quantity)?.classes ?? []
  const named: Record<Judgement['outcome'], string> = {
    value: '', class: judgement.classes.map(key => classes.find(entry => entry.key === key)?.label ?? key).join(' or '), none: 'none', not_reached: 'not reached', not_defined: 'not defined', refused: 'not computed',
  }
  return named[judgement.outcome]
}
