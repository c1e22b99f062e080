import { ticks as niceTicks, tickStep } from 'd3-array'
import { numberText } from '../sheet/unitText'

/** A band as it is shown: numbers in the shown unit. It may be wider on one side of the worked value than on the other. */
export interface ShownBand {
  unit: string
  /** The worked value. */
  center: number
  low: number
  high: number
  /** What the width is made of, from the worked value outward; both sides ≥ 0. */
  parts: readonly ShownPart[]
  /** What was handed in; null where nothing was, or no number. */
  value: number | null
  /** Decimals that values are shown with. */
  digits: number
  /** Values that a slip would give. */
  ghosts?: readonly { label: string, value: number }[]
}
export interface ShownPart { key: 'granted' | 'formulae' | 'rounding' | 'carried' | 'reading' | 'accepted', label: string, below: number, above: number }

/** Where a value stands to a band; an edge belongs to it. */
export type Standing = 'within' | 'above' | 'below'

export const standingOf = (band: Pick<ShownBand, 'low' | 'high'>, value: number): Standing =>
  value < band.low ? 'below' : value > band.high ? 'above' : 'within'

/** Half the band, in the shown unit; for a band of no width, half a unit of the last shown digit, so that a bar can still be drawn. */
export const halfWidth = (band: Pick<ShownBand, 'low' | 'high' | 'digits'>): number => (band.high - band.low) / 2 || 0.5 * 10 ** -band.digits

/** How many half-widths a value lies from the middle of the band: −1 and 1 are its edges. */
export const inHalfWidths = (band: Pick<ShownBand, 'low' | 'high' | 'digits'>, value: number): number =>
  (value - (band.low + band.high) / 2) / halfWidth(band)

export interface BarPointer { y: number, isInside: boolean, off: 'up' | 'down' | null }
export interface SmallBar { high: number, low: number, center: number, pointer: BarPointer | null }

/** Half-widths that the small bar spans on either side of the band's middle. */
export const smallSpan = 2.1

/** The small bar: its band, line and pointer in pixels from the top. A value beyond the span breaks the axis. */
export function smallBar(band: Pick<ShownBand, 'center' | 'low' | 'high' | 'digits' | 'value'>, height: number, margin = 4): SmallBar {
  const y = (distance: number) => height / 2 - Math.max(-smallSpan, Math.min(smallSpan, distance)) / smallSpan * (height / 2 - margin)
  const edges = { high: y(1), low: y(-1), center: y(inHalfWidths(band, band.center)) }
  if (band.value === null) return { ...edges, pointer: null }
  const distance = inHalfWidths(band, band.value)
  return { ...edges, pointer: { y: y(distance), isInside: standingOf(band, band.value) === 'within', off: distance > smallSpan ? 'up' : distance < -smallSpan ? 'down' : null } }
}

export interface PartBlock { key: ShownPart['key'], y: number, height: number }
/** Words beside the bar: `at` where their leader starts, `y` where they stand. */
export interface PlacedLine { kind: 'part' | 'edge' | 'value' | 'ghost', at: number, y: number, text: string, name: string }
export interface LargeBar {
  top: number
  bottom: number
  ticks: { value: number, y: number, text: string }[]
  blocks: PartBlock[]
  high: number
  low: number
  center: number
  /** All words beside the bar but the worked value's, which stand at `center`. */
  lines: PlacedLine[]
  pointer: BarPointer | null
}

const lineHeight = 21

/** The large bar: ticks in the unit, parts stacked outward, words in the order of what they name, so that no leader crosses another or words. */
export function largeBar(band: ShownBand, { height, span, hidesParts = false }: { height: number, span?: number, hidesParts?: boolean }): LargeBar {
  const top = 44
  const bottom = height - 38
  const middle = (band.low + band.high) / 2
  const reach = span ?? largeReach(band)
  const y = (value: number) => (top + bottom) / 2 - (value - middle) / reach * (bottom - top) / 2
  const off = band.value === null ? null : band.value > middle + reach ? 'up' : band.value < middle - reach ? 'down' : null
  const pointer: BarPointer | null = band.value === null ? null : { y: off === 'up' ? top - 14 : off === 'down' ? bottom + 14 : y(band.value), isInside: standingOf(band, band.value) === 'within', off }

  const { blocks, named } = stackParts(band, y)
  const line = (kind: PlacedLine['kind'], value: number, name: string): PlacedLine => ({ kind, at: y(value), y: y(value), text: numberText(value, band.digits), name })
  const lines = placeWords([
    line('edge', band.high, 'top of the range'), line('edge', band.low, 'foot of the range'),
    ...(hidesParts ? [] : named),
    ...(band.value !== null && off === null ? [line('value', band.value, '')] : []),
    ...(band.ghosts ?? []).filter(ghost => Math.abs(ghost.value - middle) <= reach).map(ghost => line('ghost', ghost.value, ghost.label)),
  ], y(band.center))
  const ticks = bandTicks(middle - reach, middle + reach).map(tick => ({ ...tick, y: y(tick.value) }))
  return { top, bottom, ticks, blocks, high: y(band.high), low: y(band.low), center: y(band.center), lines, pointer }
}

/** Parts from the worked value outward; each is named on the side away from the value, where it has one there. */
function stackParts(band: ShownBand, y: (value: number) => number): { blocks: PartBlock[], named: PlacedLine[] } {
  const blocks: PartBlock[] = []
  const named: PlacedLine[] = []
  const isValueHigh = band.value !== null && band.value > band.center
  let above = band.center
  let below = band.center
  for (const part of band.parts) {
    const upper = { y: y(above + part.above), height: y(above) - y(above + part.above) }
    const lower = { y: y(below), height: y(below - part.below) - y(below) }
    if (part.above > 0) blocks.push({ key: part.key, ...upper })
    if (part.below > 0) blocks.push({ key: part.key, ...lower })
    if (part.above > 0 || part.below > 0) {
      const block = part.below > 0 && (isValueHigh || part.above === 0) ? lower : upper
      const at = block.y + block.height / 2
      named.push({ kind: 'part', at, y: at, text: partText(part, band.digits), name: part.label })
    }
    above += part.above
    below -= part.below
  }
  return { blocks, named }
}

/** As far as the value and the slips' values, where that leaves the band a third of the axis. */
function largeReach(band: ShownBand): number {
  const half = halfWidth(band)
  const middle = (band.low + band.high) / 2
  const wanted = [band.value, ...(band.ghosts ?? []).map(ghost => ghost.value)].filter(value => value !== null).map(value => Math.abs(value - middle) * 1.12)
  return Math.max(half * 1.9, ...wanted.filter(reach => reach <= half * 3.2))
}

/** "± 0.10" where both sides are alike, else each side by itself. A width too small for the digits keeps one figure. */
export function partText(part: Pick<ShownPart, 'above' | 'below'>, digits: number): string {
  const show = (width: number) => Number(width.toFixed(digits)) === 0 ? String(Number(width.toPrecision(1))) : width.toFixed(digits)
  if (Math.abs(part.above - part.below) <= 1e-9 * Math.max(part.above, part.below)) return `± ${show(part.above)}`
  if (part.above === 0) return `−${show(part.below)}`
  if (part.below === 0) return `+${show(part.above)}`
  return `+${show(part.above)} −${show(part.below)}`
}

export function bandTicks(low: number, high: number, about = 6): { value: number, text: string }[] {
  const decimals = Math.max(0, -Math.floor(Math.log10(Math.abs(tickStep(low, high, about))) + 1e-9))
  return niceTicks(low, high, about).map(value => ({ value, text: numberText(value, decimals) }))
}

/** Words a line apart, pushed away from the worked value, in the order of what they name. */
export function placeWords<T extends { at: number, y: number }>(lines: readonly T[], center: number, gap = lineHeight): T[] {
  const place = (side: readonly T[], away: 1 | -1): T[] => {
    let last = center
    return side.map((line) => {
      last = away === 1 ? Math.max(line.at, last + gap) : Math.min(line.at, last - gap)
      return { ...line, y: last }
    })
  }
  const above = lines.filter(line => line.at < center).toSorted((a, b) => b.at - a.at)
  const below = lines.filter(line => line.at >= center).toSorted((a, b) => a.at - b.at)
  return [...place(above, -1).toReversed(), ...place(below, 1)]
}
