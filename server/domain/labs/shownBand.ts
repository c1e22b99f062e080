import type { Band, BandPart } from '#shared/marking/types'

/** A band in the unit of its step, as the height bar draws it. */
export interface ShownBand {
  unit: string
  low: number
  center: number
  high: number
  lowText: string
  highText: string
  parts: BandPart[]
  /** Nothing was handed in: this is the author's view. */
  value: null
  /** Decimals that values are shown with: one more than was asked. */
  digits: number
  ghosts: { label: string, value: number }[]
}

/** The edges stand in both units and every conversion is affine: they carry the other values over. */
export function shownScale(band: Band): (valueSi: number) => number {
  const low = Number(band.lowDecimal)
  const perSi = band.high === band.low ? 1 : (Number(band.highDecimal) - low) / (band.high - band.low)
  return valueSi => low + (valueSi - band.low) * perSi
}

export function shownBand(band: Band, askedDigits: number, slips: readonly { label: string, value: number }[]): ShownBand {
  const shown = shownScale(band)
  const width = (difference: number) => shown(band.low + difference) - shown(band.low)
  const center = shown(band.center)
  const magnitude = center === 0 ? 0 : Math.floor(Math.log10(Math.abs(center)))
  return {
    unit: band.unit, low: Number(band.lowDecimal), high: Number(band.highDecimal), center, lowText: band.lowDecimal, highText: band.highDecimal,
    parts: band.parts.map(part => ({ ...part, below: width(part.below), above: width(part.above) })), value: null,
    digits: Math.min(12, Math.max(0, askedDigits - magnitude)), ghosts: slips.map(slip => ({ label: slip.label, value: shown(slip.value) })),
  }
}
