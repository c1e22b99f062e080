import type { Band, Judgement, ReadAnswer } from '#shared/marking/types'
import type { HeightBar, JudgedAs } from '#shared/schemas/marks'

/**
 * A band in the unit of its step, for drawing. Its edges are stored in both units, and every conversion is affine,
 * so the two edges carry the others over.
 */
export function shownScale(band: Band): (valueSi: number) => number {
  const low = Number(band.lowDecimal)
  const high = Number(band.highDecimal)
  const perSi = band.high === band.low ? 1 : (high - low) / (band.high - band.low)
  return valueSi => low + (valueSi - band.low) * perSi
}

export function heightBarOf(band: Band, answer: Pick<ReadAnswer, 'decimal'>, slip: Judgement['slip'] = null): HeightBar {
  const shown = shownScale(band)
  const width = (difference: number) => shown(band.low + difference) - shown(band.low)
  return {
    unit: band.unit, low: Number(band.lowDecimal), high: Number(band.highDecimal), center: shown(band.center), lowText: band.lowDecimal, highText: band.highDecimal,
    parts: band.parts.map(part => ({ key: part.key, label: part.label, below: width(part.below), above: width(part.above) })),
    value: answer.decimal === null ? null : Number(answer.decimal),
    digits: shownDecimals(band, width),
    ghosts: slip ? [{ label: slip.label, value: shown(slip.value) }] : [],
  }
}

/** One decimal more than was asked for: the asked place is twice the half unit that rounding adds to the band. */
function shownDecimals(band: Band, width: (differenceSi: number) => number): number {
  const rounding = band.parts.find(part => part.key === 'rounding')
  const half = rounding ? width(Math.max(rounding.below, rounding.above)) : 0
  return half > 0 ? Math.min(12, Math.max(0, 1 - Math.round(Math.log10(2 * half)))) : 3
}

/** A value's distance from the reference in half-widths of the band on its side: within is −1 to 1. Null where there is no number. */
export function offsetInHalfWidths(band: Band, answer: Pick<ReadAnswer, 'valueSi' | 'reading'>): number | null {
  if (answer.reading !== 'ok' || answer.valueSi === null) return null
  const away = answer.valueSi - band.center
  if (away === 0) return 0
  const half = away > 0 ? band.high - band.center : band.center - band.low
  return half > 0 ? away / half : Math.sign(away) * Number.MAX_SAFE_INTEGER
}

/** The one word for how a value came out. */
export function judgedAs(judgement: Judgement, answer: Pick<ReadAnswer, 'reading' | 'valueSi'>): JudgedAs {
  if (answer.reading === 'empty') return 'empty'
  if (answer.reading === 'unreadable' || answer.reading === 'wrong_dimension' || answer.reading === 'ambiguous') return 'not_read'
  if (judgement.outcome === 'refused') return 'not_judged'
  if (judgement.isAccepted) {
    if (judgement.acceptedBy === 'ruling') return 'accepted'
    return judgement.band && answer.reading === 'ok' ? 'within' : 'right'
  }
  if (!judgement.band || answer.reading !== 'ok' || answer.valueSi === null) return 'wrong'
  return answer.valueSi > judgement.band.center ? 'above' : 'below'
}
