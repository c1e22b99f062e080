import { extent } from 'd3-array'
import { scaleLinear } from 'd3-scale'

export interface CurvePoint { x: number, y: number | null }

/** Scales and paths of a curve; a point without a value is a break. */
export function curveScale(points: readonly CurvePoint[], size: { width: number, height: number }) {
  const left = 64, right = size.width - 24, top = 26, bottom = size.height - 44
  const [low = 0, high = 1] = extent(points, point => point.x)
  const [least = 0, most = 1] = extent(points.flatMap(point => point.y === null ? [] : [point.y]))
  const room = most > least ? (most - least) * 0.06 : Math.max(Math.abs(most) * 0.05, 1e-6)
  const x = scaleLinear().domain([low, high]).range([left, right])
  const y = scaleLinear().domain([least - room, most + room]).range([bottom, top]).nice()
  // no comma between thousands: it could be read as a decimal one
  const ticks = (scale: typeof x, count: number) => scale.ticks(count).map(value => ({ at: scale(value), text: scale.tickFormat(count)(value).replaceAll(',', '').replace('-', '−') }))
  return { left, right, top, bottom, x, y, xTicks: ticks(x, Math.max(3, Math.floor(size.width / 90))), yTicks: ticks(y, 5), path: pathThrough(points, x, y) }
}

function pathThrough(points: readonly CurvePoint[], x: (value: number) => number, y: (value: number) => number): string {
  let path = '', isDown = false
  for (const point of points) {
    if (point.y !== null) path += `${isDown ? 'L' : 'M'}${x(point.x).toFixed(1)} ${y(point.y).toFixed(1)}`
    isDown = point.y !== null
  }
  return path
}

/** The point nearest to where the input stands. */
export function nearestPoint(points: readonly CurvePoint[], at: number): number {
  let best = 0
  points.forEach((point, no) => {
    if (Math.abs(point.x - at) < Math.abs((points[best]?.x ?? 0) - at)) best = no
  })
  return best
}
