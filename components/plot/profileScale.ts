import { tickStep } from 'd3-array'
import { scaleLinear } from 'd3-scale'
import { numberText } from '../sheet/unitText'
import { extentOf, padded, pathOf, valueAt, type PlottedSeries, type Point } from './series'

export interface ProfileInput {
  width: number
  height: number
  heights: readonly (number | null)[]
  /** Drawn on one axis: they share a unit. */
  main: readonly PlottedSeries[]
  /** Drawn on an axis of its own at the right, where there is room. */
  side?: PlottedSeries | null
  /** Heights that are shown; the whole profile unless said. */
  range?: readonly [number, number] | null
}

export interface AxisTick { at: number, text: string }
export interface ProfileScale {
  left: number
  right: number
  top: number
  bottom: number
  sideLeft: number
  /** Where the last axis ends. */
  end: number
  y: (height: number) => number
  x: (value: number) => number
  sideX: (value: number) => number
  heightTicks: AxisTick[]
  mainTicks: AxisTick[]
  sideTicks: AxisTick[]
  /** Row numbers from the lowest level to the highest: the order in which a cursor walks. */
  order: number[]
  hasDots: boolean
}

/** Room for half of the last label of an axis, and for the labels of two axes side by side. */
const rightMargin = 18
const betweenAxes = 44

/** Above this many levels the line stands without its dots. */
const mostDots = 90

/** Height upward, the quantity across; drawn for the width it is given. */
export function profileScale({ width, height, heights: all, main, side, range = null }: ProfileInput): ProfileScale {
  const isNarrow = width < 420
  const heights = range ? all.map(level => level !== null && level >= range[0] && level <= range[1] ? level : null) : all
  const [left, top, bottom] = [52, 14, height - 46]
  const order = heights.map((_, at) => at).filter(at => heights[at] !== null).toSorted((a, b) => heights[a]! - heights[b]!)
  const sideWidth = side ? Math.round((width - left - rightMargin) * (isNarrow ? 0.24 : 0.27)) : 0
  const right = width - rightMargin - sideWidth - (side ? betweenAxes : 0)
  const lowest = order.length > 0 ? heights[order[0]!]! : 0
  const highest = order.length > 0 ? heights[order[order.length - 1]!]! : 100
  const whole = scaleLinear().domain([Math.min(0, lowest), highest - Math.min(0, lowest) < 1 ? lowest + 10 : highest]).nice(8)
  const y = (range ? scaleLinear().domain(range) : whole).range([bottom, top])
  const shown = range ? main.map(series => ({ ...series, values: heights.map((level, at) => level === null ? null : valueAt(series.values, at)) })) : main
  const x = scaleLinear().domain(padded(extentOf(shown) ?? [0, 1])).nice(6).range([left, right])
  const sideDomain = side?.unit === '%' ? [Math.min(40, (extentOf([side]) ?? [40, 100])[0]), Math.max(100, (extentOf([side]) ?? [40, 100])[1])] : padded(side ? extentOf([side]) ?? [0, 1] : [0, 1])
  const sideX = scaleLinear().domain(sideDomain).nice(3).range([right + betweenAxes, width - rightMargin])
  return {
    left, right, top, bottom, sideLeft: right + betweenAxes, end: width - rightMargin, order, hasDots: heights.length <= mostDots,
    y: value => y(value), x: value => x(value), sideX: value => sideX(value),
    heightTicks: ticksOf(y, Math.max(3, Math.floor((bottom - top) / 64))),
    mainTicks: ticksOf(x, Math.max(2, Math.floor((right - left) / 62))),
    sideTicks: side ? ticksOf(sideX, isNarrow ? 2 : 3) : [],
  }
}

/** Ticks with as many decimals as their step has. */
export function ticksOf(scale: { ticks: (count: number) => number[], domain: () => number[], (value: number): number }, count: number): AxisTick[] {
  const [from = 0, to = 1] = scale.domain()
  const decimals = Math.max(0, -Math.floor(Math.log10(Math.abs(tickStep(from, to, count))) + 1e-9))
  return scale.ticks(count).map(value => ({ at: scale(value), text: numberText(value, decimals) }))
}

/** The line of one quantity: it breaks where a height or a value is missing. */
export function profilePoints(heights: readonly (number | null)[], values: PlottedSeries['values'], x: (value: number) => number, y: (height: number) => number): (Point | null)[] {
  return heights.map((height, at) => {
    const value = valueAt(values, at)
    return height === null || value === null ? null : { x: x(value), y: y(height) }
  })
}

export const profilePath = (points: readonly (Point | null)[]): string => pathOf(points)

/** On which side of the plot a layer's bracket and name hide fewer readings. */
export function layerSide(points: readonly (Point | null)[], [top, bottom]: readonly [number, number], { left, right }: { left: number, right: number }): 'left' | 'right' {
  const middle = (top + bottom) / 2
  const words = 120
  const hidden = points.filter(point => point !== null && Math.abs(point.y - middle) < 26)
  const atLeft = hidden.filter(point => point !== null && point.x < left + words).length
  const atRight = hidden.filter(point => point !== null && point.x > right - words).length
  return atLeft < atRight ? 'left' : 'right'
}

/** A window of heights made closer or wider around a level, or moved by a share of itself, kept inside the whole. */
export function turnedRange(range: readonly [number, number], whole: readonly [number, number], turn: { zoom?: number, by?: number, around?: number }, least = 10): [number, number] {
  const span = Math.max(Math.min(least, whole[1] - whole[0]), Math.min(whole[1] - whole[0], (range[1] - range[0]) * (turn.zoom ?? 1)))
  const middle = turn.around ?? (range[0] + range[1]) / 2
  const share = range[1] > range[0] ? (middle - range[0]) / (range[1] - range[0]) : 0.5
  const low = Math.max(whole[0], Math.min(whole[1] - span, middle - share * span + (range[1] - range[0]) * (turn.by ?? 0)))
  return [low, low + span]
}

/** The level that a step up or down leads to, from the row where the cursor is. */
export function stepLevel(order: readonly number[], from: number | null, step: number): number | null {
  if (order.length === 0) return null
  if (from === null) return step > 0 ? order[0]! : order[order.length - 1]!
  const at = Math.max(0, order.indexOf(from))
  return order[Math.max(0, Math.min(order.length - 1, at + step))]!
}
