import { Temporal } from 'temporal-polyfill'
import { refuse } from '#shared/errors'

/** What a wall time in a zone comes to. `shift` says when a clock change had to be settled. */
export interface ResolvedWallTime {
  /** Epoch milliseconds. */
  at: number
  /** `skipped`: the hour does not exist that night, the time falls after the gap. `doubled`: it exists twice, the later one is meant. */
  shift: 'skipped' | 'doubled' | null
  /** The wall time that `at` shows in the zone: other than asked only when skipped. */
  local: string
}

/** Every wall time in the product is written to the minute: 2026-10-23T17:00. */
const wallTimePattern = /^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}$/

/** A due minute counts to its end: due 23:59 means through 23:59:59.999. */
export const endOfMinute = (at: number): number => at + 59_999

/**
 * The instant of a wall time in a zone. A time inside the hour that a clock change skips falls after the gap,
 * a time inside the doubled hour is the later of the two: both in the student's favor.
 * @throws {DomainError} `dates_invalid`, `zone_unknown`
 * @example resolveWallTime('2026-03-08T02:30', 'America/Chicago').at // 2026-03-08T08:30:00Z, the clock then shows 03:30
 */
export function resolveWallTime(local: string, zone: string): ResolvedWallTime {
  const plain = parseLocal(local)
  assertZone(zone)
  const later = plain.toZonedDateTime(zone, { disambiguation: 'later' })
  const earlier = plain.toZonedDateTime(zone, { disambiguation: 'earlier' })
  const shown = later.toPlainDateTime()
  const shift = later.epochMilliseconds === earlier.epochMilliseconds ? null : shown.equals(plain) ? 'doubled' : 'skipped'
  return { at: later.epochMilliseconds, shift, local: shown.toString({ smallestUnit: 'minute' }) }
}

/** The wall time to the minute that a clock in this zone shows at an instant. */
export function wallTimeAt(at: number, zone: string): string {
  assertZone(zone)
  return Temporal.Instant.fromEpochMilliseconds(at).toZonedDateTimeISO(zone).toPlainDateTime().toString({ smallestUnit: 'minute', roundingMode: 'floor' })
}

const knownMoves = new Map<string, number>()
const mostMoves = 500

/** The same wall time, a number of local dates later: a day of 23 or 25 hours counts as one. A class asks for the same few days again and again, so they stay at hand. */
export function movedByDays(at: number, days: number, zone: string): number {
  const key = `${at} ${days} ${zone}`
  const known = knownMoves.get(key)
  if (known !== undefined) return known
  const moved = moveByDays(at, days, zone)
  if (knownMoves.size >= mostMoves) knownMoves.delete(knownMoves.keys().next().value ?? '')
  knownMoves.set(key, moved)
  return moved
}

function moveByDays(at: number, days: number, zone: string): number {
  assertZone(zone)
  return Temporal.Instant.fromEpochMilliseconds(at).toZonedDateTimeISO(zone).toPlainDateTime().add({ days }).toZonedDateTime(zone, { disambiguation: 'later' }).epochMilliseconds
}

/** A sentence for whoever set the time; null where there is nothing to tell. */
export function tellShift(resolved: ResolvedWallTime, asked: string): string | null {
  if (resolved.shift === 'skipped') return `The clocks skip ${asked.slice(11)} on ${asked.slice(0, 10)}: ${resolved.local.slice(11)} is taken.`
  if (resolved.shift === 'doubled') return `The clocks show ${asked.slice(11)} twice on ${asked.slice(0, 10)}: the later one is taken.`
  return null
}

/** Zones that were found good: there are few, and asking the system anew costs more than the rest of a submission's lateness. */
const knownZones = new Set<string>()

export function isZone(zone: string): boolean {
  if (knownZones.has(zone)) return true
  try {
    new Intl.DateTimeFormat('en-US', { timeZone: zone })
    knownZones.add(zone)
    return true
  }
  catch {
    return false
  }
}

function assertZone(zone: string): void {
  if (!isZone(zone)) refuse('zone_unknown', { zone })
}

function parseLocal(local: string): Temporal.PlainDateTime {
  if (!wallTimePattern.test(local)) return refuse('dates_invalid', { reason: `"${local}" is not a date and a time to the minute.` })
  try {
    return Temporal.PlainDateTime.from(local, { overflow: 'reject' })
  }
  catch {
    return refuse('dates_invalid', { reason: `"${local}" is not a day of the calendar.` })
  }
}
