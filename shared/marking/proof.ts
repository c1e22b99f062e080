/** What has to hold before a step is posted with a share: it can be judged, and its band stays within half the way to a slip or a class limit. */
import type { Outcome, QuantityDefinition } from '../thermo/definition'
import { evaluateQuantity } from '../thermo/evaluate'
import { findQuantity } from '../thermo/registry'
import { formatQuantity } from '../units/formatQuantity'
import { exactInUnit } from './decimalEdges'
import { toDouble } from '../numerics/rational'
import { findUnit, type Unit } from '../units/ucum'
import { judgeStep } from './judge'
import { halfUnitAsked } from './rounding'
import { acceptedWays, formulaeOf } from './alternatives'
import { slipRanges } from './slips'
import type { Band, ReadAnswer, StepQuestion } from './types'

export interface BandCheck { ok: boolean, reasons: string[] }

const nothing: ReadAnswer = { typed: '', reading: 'empty', valueSi: null, decimal: null, unitUcum: null, digits: null, halfUnitSi: null, message: '' }

export function checkBand(question: StepQuestion): BandCheck {
  const judgement = judgeStep(question, nothing)
  const definition = findQuantity(question.quantity)
  const unit = findUnit(question.unit)
  if (judgement.outcome === 'refused' || !definition || !unit) return { ok: false, reasons: [judgement.reason ?? 'It cannot be judged.'] }
  const reasons: string[] = []
  if (judgement.classes.length > 1) {
    reasons.push(`Accepted constants put it in different classes (${judgement.classes.join(', ')}): the layer lies at the limit. Choose another.`)
  }
  const answers = answersByWays(definition, question)
  if (answers.size > 1) reasons.push(`Accepted formulae and constants lead to different kinds of answer (${[...answers].join(', ').replaceAll('_', ' ')}): choose another share.`)
  if (judgement.band) reasons.push(...bandFaults(definition, question, judgement.band, unit))
  return { ok: reasons.length === 0, reasons }
}

/** The kinds of answer that accepted ways give: whoever works by one of them must be able to be right. A way that cannot be computed here gives none. */
function answersByWays(definition: QuantityDefinition, question: StepQuestion): ReadonlySet<Outcome['is']> {
  return new Set(acceptedWays(definition, question.convention, question.variant).flatMap((way) => {
    try {
      return evaluateQuantity(definition, question.inputs, way.constants, way.variant, way.formulae).is
    }
    catch {
      return []
    }
  }))
}

function bandFaults(definition: QuantityDefinition, question: StepQuestion, band: Band, unit: Unit): string[] {
  const reasons: string[] = []
  const { center } = band
  const isDifference = definition.kind !== 'temperature'
  const show = (si: number) => formatQuantity(toDouble(exactInUnit(si, unit, isDifference)), question.unit, Math.max(4, question.digits + 1)).text
  const relative = question.granted.relative ?? 0
  if (relative > 0 && definition.nearZero !== undefined && Math.abs(center) < definition.nearZero) {
    reasons.push(`The value ${show(center)} is near zero, where a share of it says nothing: grant an absolute width.`)
  }
  // one unit of the last digit asked
  const unseen = 2 * halfUnitAsked(definition, center, unit, question.digits)
  for (const { slip, value } of slipRanges(definition, question, question.inputs, center)) {
    const distance = Math.abs(value - center)
    if (slip.weight === 'constant') continue
    if (slip.weight === 'fine' && distance <= unseen * (1 + 1e-9)) continue
    const width = value > center ? band.high - center : center - band.low
    if (width > distance / 2) reasons.push(`The band reaches ${show(value > center ? band.high : band.low)}, more than half the way from ${show(center)} to ${show(value)}, which is the slip “${slip.label}”.`)
  }
  for (const slip of definition.slips) {
    if (slip.weight === 'gross' && makesNoDifference(definition, question, slip.key, center)) reasons.push(`The slip “${slip.label}” gives the right value here: the question asks nothing. Choose another share.`)
  }
  for (const limit of definition.classLimits?.(question.inputs, question.convention.constants, formulaeOf(question.convention)) ?? []) {
    const distance = Math.abs(limit.value - center)
    const width = limit.value > center ? band.high - center : center - band.low
    if (width > distance / 2) reasons.push(`The band reaches ${show(limit.value > center ? band.high : band.low)}, more than half the way from ${show(center)} to the class limit ${show(limit.value)} (${limit.label}).`)
  }
  return reasons
}

/** A gross slip that can be made here and gives the very value: ΔT of 0, or θ at 1000 hPa. */
function makesNoDifference(definition: QuantityDefinition, question: StepQuestion, key: string, center: number): boolean {
  const slip = definition.slips.find(one => one.key === key)
  try {
    const value = slip?.apply(question.inputs, question.convention.constants, center, formulaeOf(question.convention)) ?? null
    return value !== null && Math.abs(value - center) <= 1e-12 * Math.abs(center)
  }
  catch {
    return false
  }
}
