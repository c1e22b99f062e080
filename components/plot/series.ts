/** One quantity along a plot: a value for each row, null where there is none. */
export interface PlottedSeries {
  key: string
  label: string
  unit: string
  digits: number
  values: readonly (number | null)[] | Float64Array
}

export interface Point { x: number, y: number }

/** A value that can be drawn: null and NaN both mean that there is none. */
export const valueAt = (values: PlottedSeries['values'], at: number): number | null => {
  const value = values[at]
  return value === undefined || value === null || Number.isNaN(value) ? null : value
}

/** Lowest and highest of several series, null where nothing is there. */
export function extentOf(series: readonly PlottedSeries[], from = 0, to = Infinity): [number, number] | null {
  let low = Infinity
  let high = -Infinity
  for (const one of series) {
    const end = Math.min(to, one.values.length)
    for (let at = from; at < end; at++) {
      const value = valueAt(one.values, at)
      if (value === null) continue
      if (value < low) low = value
      if (value > high) high = value
    }
  }
  return low <= high ? [low, high] : null
}

/** A little air on both sides; a single value, or what differs by rounding only, gets a unit around it. */
export function padded([low, high]: readonly [number, number], share = 0.06): [number, number] {
  const span = high - low > 1e-9 * Math.max(1, Math.abs(high), Math.abs(low)) ? high - low : 1 / share
  return [low - span * share, high + span * share]
}

/** A path that breaks at nulls. */
export function pathOf(points: readonly (Point | null)[]): string {
  let path = ''
  let isBroken = true
  for (const point of points) {
    if (point) path += `${isBroken ? 'M' : 'L'}${point.x.toFixed(1)} ${point.y.toFixed(1)}`
    isBroken = point === null
  }
  return path
}

/**
 * Points for a path no finer than the screen: of each pixel column the first, the lowest, the highest and the last stay,
 * in their order, so that a spike is never thinned away. Breaks stay breaks.
 */
export function thinned(points: readonly (Point | null)[], columns: number): (Point | null)[] {
  if (points.length <= 4 * columns) return [...points]
  const kept: (Point | null)[] = []
  let column: Point[] = []
  const settle = () => {
    if (column.length === 0) return
    let low = column[0]!
    let high = column[0]!
    for (const point of column) {
      if (point.y < low.y) low = point
      if (point.y > high.y) high = point
    }
    const chosen = new Set([column[0]!, low, high, column[column.length - 1]!])
    kept.push(...column.filter(point => chosen.has(point)))
    column = []
  }
  for (const point of points) {
    if (point === null) {
      settle()
      if (kept.length > 0 && kept[kept.length - 1] !== null) kept.push(null)
      continue
    }
    if (column.length > 0 && Math.floor(column[0]!.x) !== Math.floor(point.x)) settle()
    column.push(point)
  }
  settle()
  return kept
}

/** The place of the sorted number nearest to a value. */
export function nearestAt(sorted: ArrayLike<number>, value: number): number {
  let low = 0
  let high = sorted.length - 1
  while (high - low > 1) {
    const middle = (low + high) >> 1
    if (sorted[middle]! <= value) low = middle
    else high = middle
  }
  return Math.abs((sorted[high] ?? Infinity) - value) < Math.abs((sorted[low] ?? Infinity) - value) ? high : low
}
