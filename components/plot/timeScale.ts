import { scaleLinear } from 'd3-scale'
import { extentOf, nearestAt, padded, valueAt, type PlottedSeries, type Point } from './series'
import { ticksOf, type AxisTick } from './profileScale'

export type TimeWindow = readonly [from: number, to: number]

const minute = 60_000
const hour = 60 * minute
const day = 24 * hour
const steps = [minute, 5 * minute, 10 * minute, 15 * minute, 30 * minute, hour, 2 * hour, 3 * hour, 6 * hour, 12 * hour, day, 2 * day, 7 * day, 14 * day, 28 * day, 91 * day, 182 * day, 364 * day]

const clocks = new Map<string, Intl.DateTimeFormat>()
function clockOf(zone: string): Intl.DateTimeFormat {
  const known = clocks.get(zone)
  if (known) return known
  const made = new Intl.DateTimeFormat('en-US', { timeZone: zone, hourCycle: 'h23', year: 'numeric', month: '2-digit', day: '2-digit', hour: '2-digit', minute: '2-digit', second: '2-digit' })
  clocks.set(zone, made)
  return made
}

/** What a clock of the zone shows, as if it were UTC. */
function wallMs(at: number, zone: string): number {
  if (zone === 'UTC') return at
  const part = Object.fromEntries(clockOf(zone).formatToParts(at).map(({ type, value }) => [type, Number(value)]))
  return Date.UTC(part.year!, part.month! - 1, part.day!, part.hour!, part.minute!, part.second!) + (((at % 1000) + 1000) % 1000)
}

const months = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec']
const two = (value: number) => String(value).padStart(2, '0')

/** "25 Oct 13:05", by the clock of the zone; with the year where asked. */
export function instantText(at: number, zone: string, withYear = false): string {
  const wall = new Date(wallMs(at, zone))
  return `${wall.getUTCDate()} ${months[wall.getUTCMonth()]}${withYear ? ` ${wall.getUTCFullYear()}` : ''} ${two(wall.getUTCHours())}:${two(wall.getUTCMinutes())}`
}

/** Ticks at round times of the zone's clock, about as many as asked; a day's begin carries its date. */
export function timeTicks([from, to]: TimeWindow, zone: string, about: number): { at: number, text: string, isDay: boolean }[] {
  const step = steps.find(candidate => (to - from) / candidate <= about) ?? steps[steps.length - 1]!
  const ticks: { at: number, text: string, isDay: boolean }[] = []
  const wallTo = wallMs(to, zone)
  for (let wall = Math.ceil(wallMs(from, zone) / step) * step; wall <= wallTo; wall += step) {
    const at = instantOf(wall, zone)
    if (at < from || at > to) continue
    const shown = new Date(wall)
    const isDay = wall % day === 0
    ticks.push({ at, isDay, text: isDay ? `${shown.getUTCDate()} ${months[shown.getUTCMonth()]}` : `${two(shown.getUTCHours())}:${two(shown.getUTCMinutes())}` })
  }
  return ticks
}

/** The instant at which the zone's clock shows a wall time; in a doubled hour the earlier one. */
function instantOf(wall: number, zone: string): number {
  if (zone === 'UTC') return wall
  const guess = wall - (wallMs(wall, zone) - wall)
  return guess - (wallMs(guess, zone) - wall)
}

/** The widest step between readings that is no gap: two and a half times the usual one. */
export function usualGap(times: ArrayLike<number>): number {
  const sample: number[] = []
  const stride = Math.max(1, Math.floor(times.length / 500))
  for (let at = 1; at < times.length; at += stride) sample.push(times[at]! - times[at - 1]!)
  sample.sort((a, b) => a - b)
  return 2.5 * (sample[Math.floor(sample.length / 2)] ?? Infinity)
}

/** Rows within the window, one more on either side so that the line runs out of the frame. */
export function rowsWithin(times: ArrayLike<number>, [from, to]: TimeWindow): [number, number] {
  if (times.length === 0) return [0, 0]
  let first = nearestAt(times, from)
  while (first > 0 && times[first]! >= from) first--
  let last = nearestAt(times, to)
  while (last < times.length - 1 && times[last]! <= to) last++
  return [first, last + 1]
}

export interface PanelInput { label: string, series: readonly PlottedSeries[] }
export interface PanelScale { top: number, bottom: number, y: (value: number) => number, ticks: AxisTick[] }

/** Panels above each other; the first is the tallest. */
export function panelScales(panels: readonly PanelInput[], rows: readonly [number, number], frame: { top: number, bottom: number }): PanelScale[] {
  const gap = 34
  const shares = panels.map((_, at) => at === 0 && panels.length > 1 ? 1.5 : 1)
  const all = shares.reduce((sum, share) => sum + share, 0)
  const room = frame.bottom - frame.top - gap * (panels.length - 1)
  let top = frame.top
  return panels.map((panel, at) => {
    const bottom = top + room * shares[at]! / all
    const y = scaleLinear().domain(padded(extentOf(panel.series, ...rows) ?? [0, 1])).nice(4).range([bottom, top])
    const scale = { top, bottom, y: (value: number) => y(value), ticks: ticksOf(y, Math.max(2, Math.floor((bottom - top) / 48))) }
    top = bottom + gap
    return scale
  })
}

/** The line of one quantity through time: broken where a value is missing or the record has a gap. */
export function seriesPoints(times: ArrayLike<number>, values: PlottedSeries['values'], [first, last]: readonly [number, number], x: (at: number) => number, y: (value: number) => number, gapAfter: number): (Point | null)[] {
  const points: (Point | null)[] = []
  for (let at = first; at < last; at++) {
    const value = valueAt(values, at)
    if (at > first && times[at]! - times[at - 1]! > gapAfter) points.push(null)
    points.push(value === null ? null : { x: x(times[at]!), y: y(value) })
  }
  return points
}

/** A window moved by a share of itself, or made wider or closer around its middle, kept inside the record. */
export function turnedWindow(window: TimeWindow, full: TimeWindow, turn: { by?: number, zoom?: number, around?: number }, least = 10 * minute): TimeWindow {
  const span = window[1] - window[0]
  const wanted = Math.max(Math.min(least, full[1] - full[0]), Math.min(full[1] - full[0], span * (turn.zoom ?? 1)))
  const middle = turn.around ?? (window[0] + window[1]) / 2
  const share = span === 0 ? 0.5 : (middle - window[0]) / span
  const from = Math.max(full[0], Math.min(full[1] - wanted, middle - share * wanted + span * (turn.by ?? 0)))
  return [from, from + wanted]
}
