import type { AskedNumber } from '#shared/schemas/askedSteps'
import type { Judgement } from '#shared/marking/types'
import { randomFrom, type Random } from './generator/arithmetic'

/** How somebody works: how often a step comes out right, how close to the due time, and how they write numbers. */
export interface Habits { skill: number, lateness: number, minus: string, decimal: string, superscripts: boolean }

export function habitsOf(key: string): Habits {
  const random = randomFrom(`habits ${key}`)
  return {
    skill: 0.62 + 0.36 * random.uniform(), lateness: random.uniform(),
    minus: random.uniform() < 0.25 ? '−' : '-', decimal: random.uniform() < 0.08 ? ',' : '.', superscripts: random.uniform() < 0.3,
  }
}

/** What somebody does with a step. */
export type Doing = { does: 'right' } | { does: 'slip', slip: string } | { does: 'miscalculated' } | { does: 'coarse' } | { does: 'blank' }

/** Slips by how often students make them; where a step has none of these, any that it has. */
const usualSlips = ['sign', 'station-pressure', 'celsius-for-kelvin', 'per-meter', 'standard-pressure', 'cv-for-cp', 'cp-for-cv', 'base-10', 'standard-atmosphere', 'joules-for-kilojoules'] as const

export function doingOf(random: Random, habits: Habits, judgement: Judgement): Doing {
  const luck = random.uniform()
  if (luck < habits.skill) return { does: 'right' }
  const rest = (luck - habits.skill) / (1 - habits.skill)
  if (rest > 0.94) return { does: 'blank' }
  if (rest > 0.84) return { does: 'coarse' }
  if (rest > 0.62) return { does: 'miscalculated' }
  const made = usualSlips.filter(key => judgement.slipValues.some(slip => slip.key === key))
  const chosen = made[Math.floor(made.length * random.uniform() ** 2)] ?? judgement.slipValues[0]?.key
  return chosen === undefined ? { does: 'miscalculated' } : { does: 'slip', slip: chosen }
}

/** What is typed for a step, as people type it; empty for a blank. */
export function typedFor(random: Random, habits: Habits, step: AskedNumber, judgement: Judgement, doing: Doing, klass: { right: string | null, all: readonly string[] }): string {
  if (doing.does === 'blank') return ''
  if (klass.all.length > 0) return doing.does === 'right' || doing.does === 'coarse' ? klass.right ?? '' : klass.all.find(key => key !== klass.right) ?? ''
  const center = (judgement.carriedBand ?? judgement.band)?.center
  if (center === undefined) return judgement.outcome === 'none' ? 'none' : ''
  if (doing.does === 'slip') {
    const slip = judgement.slipValues.find(made => made.key === doing.slip)
    if (slip) return written(random, habits, step, slip.value, step.digits)
  }
  if (doing.does === 'miscalculated') {
    // An error of arithmetic: a fifth to a third off; a temperature by a few kelvins.
    const off = (random.uniform() < 0.5 ? -1 : 1) * (0.2 + 0.13 * random.uniform())
    return written(random, habits, step, isTemperature(step) ? center + 12 * off : center * (1 + off), step.digits)
  }
  return written(random, habits, step, center, doing.does === 'coarse' ? Math.max(1, step.digits - 1) : step.digits + (random.uniform() < 0.2 ? 1 : 0))
}

const isTemperature = (step: AskedNumber) => step.unit === 'Cel' || step.unit === 'K'

interface Style { unit: string, of: (si: number) => number }
const stylesOf: Readonly<Record<string, readonly Style[]>> = {
  'K/km': [{ unit: 'K/km', of: si => si * 1000 }, { unit: 'K/km', of: si => si * 1000 }, { unit: 'K km⁻¹', of: si => si * 1000 }, { unit: '°C/km', of: si => si * 1000 }, { unit: 'K/100 m', of: si => si * 100 }],
  'kJ/kg': [{ unit: 'kJ/kg', of: si => si / 1000 }, { unit: 'kJ/kg', of: si => si / 1000 }, { unit: 'J/kg', of: si => si }],
  'Cel': [{ unit: '°C', of: si => si - 273.15 }],
  'K': [{ unit: 'K', of: si => si }],
  'm': [{ unit: 'm', of: si => si }],
  'kg/m3': [{ unit: 'kg/m³', of: si => si }, { unit: 'kg/m3', of: si => si }],
}

/** A number with its unit, to so many significant digits; what a person writes differs from hand to hand. */
export function written(random: Random, habits: Habits, step: AskedNumber, si: number, digits: number): string {
  const styles = stylesOf[step.unit] ?? [{ unit: step.unit, of: (value: number) => value }]
  const style = styles[Math.floor(styles.length * random.uniform())] ?? styles[0]
  if (!style) throw new Error('A step without a unit.')
  // A temperature is asked to a place and not to digits: three digits are tenths.
  const text = (isTemperature(step) ? style.of(si).toFixed(Math.max(0, digits - 2)) : plainDigits(style.of(si), digits)).replace('.', habits.decimal).replace('-', habits.minus)
  const unit = habits.superscripts ? style.unit : style.unit.replace('⁻¹', '^-1')
  return `${text} ${unit}`
}

/** Significant digits without an exponent. */
function plainDigits(value: number, digits: number): string {
  if (value === 0) return '0'
  const places = Math.max(0, digits - 1 - Math.floor(Math.log10(Math.abs(value))))
  const text = value.toFixed(Math.min(places, 12))
  return Number(text) === 0 ? '0' : text
}
