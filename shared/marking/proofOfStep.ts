/** What the proof run shows of one step on one share: each accepted way and each slip typed as a student would type it and judged, and how hard the share is. */
import { tenTo, toDouble } from '../numerics/rational'
import type { QuantityDefinition } from '../thermo/definition'
import { findQuantity } from '../thermo/registry'
import { formatQuantity } from '../units/formatQuantity'
import { readQuantity } from '../units/readQuantity'
import { findUnit, type Unit } from '../units/ucum'
import { formulaeOf, valuesOfWays } from './alternatives'
import { exactInUnit } from './decimalEdges'
import { judgeStep } from './judge'
import { halfUnitAsked, lastPlaceAsked } from './rounding'
import type { Judgement, ReadAnswer, StepQuestion } from './types'

export interface ProvedWay { label: string, typed: string, isInside: boolean }
/** `isQuiet`: as small as the spread of constants, or within one unit of the last digit: it says nothing against the band. */
export interface ProvedSlip { key: string, label: string, typed: string, pointsMilli: number, isOutside: boolean, isQuiet: boolean }
export interface ProvedStep {
  ways: ProvedWay[]
  slips: ProvedSlip[]
  /** Half-width over the size of the value; null for a temperature, whose zero is arbitrary, and where there is no number. */
  relativeWidth: number | null
  /** Distance to the nearest class limit in half-widths on its side; null where there is none. */
  toClassLimit: number | null
  /** Tries that find the band when only right or wrong is told, over what a guesser would think possible. */
  triesToFind: number | null
}

const empty: ReadAnswer = { typed: '', reading: 'empty', valueSi: null, decimal: null, unitUcum: null, digits: null, halfUnitSi: null, message: '' }

export function proveStep(question: StepQuestion): ProvedStep {
  const nothing: ProvedStep = { ways: [], slips: [], relativeWidth: null, toClassLimit: null, triesToFind: null }
  const definition = findQuantity(question.quantity)
  const unit = findUnit(question.unit)
  const judgement = judgeStep(question, empty)
  if (!definition || !unit || !judgement.band) return nothing
  const { band } = judgement
  const judged = (si: number) => {
    const typed = typedAsAsked(definition, question, unit, si)
    return { typed, judgement: judgeStep(question, readQuantity(typed, { unit: question.unit, kind: definition.kind, quantityName: definition.name })) }
  }
  const half = Math.max(band.center - band.low, band.high - band.center)
  return {
    ways: valuesOfWays(definition, question.convention, question.variant, question.inputs).map(({ way, value }) => {
      const told = judged(value)
      return { label: way.label, typed: told.typed, isInside: told.judgement.isAccepted }
    }),
    slips: judgement.slipValues.map((slip) => {
      const told = judged(slip.value)
      return { key: slip.key, label: slip.label, typed: told.typed, pointsMilli: told.judgement.pointsMilli, isOutside: !told.judgement.isAccepted, isQuiet: isQuiet(definition, question, unit, judgement, slip) }
    }),
    relativeWidth: definition.kind === 'temperature' || band.center === 0 ? null : half / Math.abs(band.center),
    toClassLimit: nearestLimit(definition, question, judgement),
    // from nothing to twice the value, or over 30 K of a temperature: what a guesser would take for possible
    triesToFind: half > 0 ? Math.ceil((definition.kind === 'temperature' ? 30 : 2 * Math.max(Math.abs(band.center), definition.nearZero ?? 0)) / (2 * half)) : null,
  }
}

/** A value as somebody types it who rounds once, to the digits asked. */
export function typedAsAsked(definition: QuantityDefinition, question: Pick<StepQuestion, 'unit' | 'digits'>, unit: Unit, si: number, more = 0): string {
  const place = lastPlaceAsked(definition, si, unit, question.digits + more)
  const inUnit = toDouble(exactInUnit(si, unit, definition.kind !== 'temperature'))
  const text = place < 0 ? inUnit.toFixed(Math.min(15, -place)) : String(Math.round(inUnit / Number(tenTo(place))) * Number(tenTo(place)))
  const suffix = formatQuantity(0, question.unit, 1).text.replace(/^0\s*/, '')
  return suffix === '' ? text : `${text} ${suffix}`
}

function isQuiet(definition: QuantityDefinition, question: StepQuestion, unit: Unit, judgement: Judgement, slip: { key: string, value: number }): boolean {
  const weight = definition.slips.find(one => one.key === slip.key)?.weight
  if (weight === 'constant') return true
  const center = judgement.band?.center ?? 0
  const lastUnit = 2 * halfUnitAsked(definition, center, unit, question.digits)
  return weight === 'fine' && Math.abs(slip.value - center) <= lastUnit * (1 + 1e-9)
}

function nearestLimit(definition: QuantityDefinition, question: StepQuestion, judgement: Judgement): number | null {
  const { band } = judgement
  if (!band) return null
  const distances = (definition.classLimits?.(question.inputs, question.convention.constants, formulaeOf(question.convention)) ?? []).map(({ value }) => {
    const half = value > band.center ? band.high - band.center : band.center - band.low
    return half > 0 ? Math.abs(value - band.center) / half : 0
  })
  return distances.length === 0 ? null : Math.min(...distances)
}
