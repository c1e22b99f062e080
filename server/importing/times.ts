import type { ColumnRef, Recipe } from '#shared/schemas/data'
import type { Fields } from './fields'
import { dateOf, dateOfYear, readDate, readStamp, readTime, type StampReading } from './stamp'
import { findZone, type Zone } from './zone'

/** An instant, or which column has what wrong. NaN is the instant of a row whose record has no clock. */
export type InstantReading = { at: number } | { column: string, text: string, reason: string }
export interface TimeReader {
  read: (fields: Fields, previous: number | null) => InstantReading
  /** Rows of a doubled hour that were told apart by their order in the file. */
  doubled: () => number
}

/**
 * Makes instants of a recipe's time columns. What is stored is the end of the row's interval: a stamp that names the start is
 * moved on by the interval's length; a stamp that names the end, or an instant, stays.
 *
 * A wall time that the clock skipped is refused. One that stood twice becomes the earlier instant, or the later one when the
 * earlier does not follow the row before: a record that goes through the hour twice comes out in order.
 * @param place where a column stands in this file
 */
export function timeReader(recipe: Recipe, place: (ref: ColumnRef) => number): TimeReader | { unknownZone: string } {
  const zone = findZone(recipe.zone)
  if (!zone) return { unknownZone: recipe.zone }
  const shift = recipe.stampMeans === 'start' ? (recipe.intervalS ?? 0) * 1000 : 0
  const doubled = { count: 0, isDescending: false }
  const wall = wallReader(recipe, place)
  const startsAt = recipe.time.form === 'elapsed' && recipe.time.startsAt !== null ? startOf(recipe.time.startsAt, zone) : null
  return {
    doubled: () => doubled.count,
    read(fields, previous) {
      const reading = wall.read(fields)
      if ('problem' in reading) return { column: wall.column, text: wall.text(fields), reason: reading.problem }
      if ('instant' in reading) return { at: reading.instant + shift }
      if ('elapsedMs' in reading) return { at: startsAt === null ? Number.NaN : startsAt + reading.elapsedMs + shift }
      if ('none' in reading) return { at: Number.NaN }
      const instant = resolve(reading, recipe.ignoresCellZone, zone, previous === null ? null : previous - shift, doubled)
      if (typeof instant !== 'number') return { column: wall.column, text: wall.text(fields), reason: instant.problem }
      return { at: instant + shift }
    },
  }
}

type Wall = StampReading | { instant: number } | { elapsedMs: number } | { none: true }
interface WallReader { column: string, text: (fields: Fields) => string, read: (fields: Fields) => Wall }

function wallReader(recipe: Recipe, place: (ref: ColumnRef) => number): WallReader {
  const time = recipe.time
  const textAt = (...at: number[]) => (fields: Fields) => at.map(index => fields.text(index)).join(' ')
  switch (time.form) {
    case 'stamp': {
      const at = place(time.column)
      return { column: time.column.name, text: textAt(at), read: fields => readStamp(fields.text(at), time.dateOrder) }
    }
    case 'split': {
      const [date, clock] = [place(time.date), place(time.time)]
      return {
        column: `${time.date.name}, ${time.time.name}`, text: textAt(date, clock),
        read: fields => together(readDate(fields.text(date), time.dateOrder), () => readTime(fields.text(clock))),
      }
    }
    case 'fields': {
      const places = [time.year, time.month, time.day, time.hour, time.minute, time.second].map(ref => ref === null ? null : place(ref))
      const numberAt = (fields: Fields, index: number) => {
        const at = places[index]
        return at === null || at === undefined ? 0 : wholeNumber(fields.text(at))
      }
      return {
        column: [time.year, time.month, time.day, time.hour].map(ref => ref.name).join(', '), text: textAt(...places.filter(at => at !== null)),
        read(fields) {
          const [hour, minute, second] = [numberAt(fields, 3), numberAt(fields, 4), numberAt(fields, 5)]
          const isClock = hour >= 0 && hour <= 24 && minute >= 0 && minute < 60 && second >= 0 && second < 60 && (hour < 24 || (minute === 0 && second === 0))
          return together(dateOf(numberAt(fields, 0), numberAt(fields, 1), numberAt(fields, 2)), () =>
            isClock ? { wallMs: ((hour * 60 + minute) * 60 + second) * 1000, offsetMs: null } : { problem: 'not a time of day' })
        },
      }
    }
    case 'dayOfYear': {
      const [year, day, clock] = [place(time.year), place(time.day), place(time.time)]
      return {
        column: `${time.year.name}, ${time.day.name}, ${time.time.name}`, text: textAt(year, day, clock),
        read: fields => together(dateOfYear(wholeNumber(fields.text(year)), wholeNumber(fields.text(day))), () => readTime(fields.text(clock))),
      }
    }
    case 'epoch': {
      const at = place(time.column)
      const scale = time.unit === 's' ? 1000 : 1
      return {
        column: time.column.name, text: textAt(at),
        read(fields) {
          const value = plainNumber(fields.text(at), recipe.decimal)
          const instant = Math.round(value * scale)
          if (!(instant > Date.UTC(1700, 0, 1) && instant < Date.UTC(2200, 0, 1))) return { problem: Number.isNaN(value) ? 'not a number of seconds' : 'not between 1700 and 2200; check seconds or milliseconds' }
          return { instant }
        },
      }
    }
    case 'elapsed': {
      const at = place(time.column)
      const scale = time.unit === 's' ? 1000 : 60_000
      return {
        column: time.column.name, text: textAt(at),
        read(fields) {
          const value = plainNumber(fields.text(at), recipe.decimal)
          return Number.isNaN(value) ? { problem: 'not a number of seconds or minutes' } : { elapsedMs: Math.round(value * scale) }
        },
      }
    }
    case 'none':
      return { column: '', text: () => '', read: () => ({ none: true }) }
  }
}

const wholeNumber = (text: string): number => /^\d{1,4}$/.test(text) ? Number(text) : /^(\d{1,2}):00(?::00)?$/.test(text) ? Number.parseInt(text, 10) : Number.NaN

function plainNumber(text: string, decimal: '.' | ','): number {
  const plain = decimal === ',' ? text.replace(',', '.') : text
  return /^[+-]?\d+(?:\.\d+)?(?:[eE][+-]?\d{1,3})?$/.test(plain) ? Number(plain) : Number.NaN
}

function together(date: { wallMs: number } | { problem: string }, clock: () => StampReading): StampReading {
  if ('problem' in date) return date
  const time = clock()
  return 'problem' in time ? time : { wallMs: date.wallMs + time.wallMs, offsetMs: time.offsetMs }
}

function resolve(stamp: { wallMs: number, offsetMs: number | null }, ignoresOffset: boolean, zone: Zone, previous: number | null, doubled: { count: number, isDescending: boolean }): number | { problem: string } {
  if (stamp.offsetMs !== null && !ignoresOffset) return stamp.wallMs - stamp.offsetMs
  const instants = zone.instantsOf(stamp.wallMs)
  const earlier = instants[0]
  const later = instants[1]
  if (earlier === undefined) return { problem: `clocks in ${zone.name} skipped this time` }
  if (later === undefined) {
    if (previous !== null && !Number.isNaN(previous) && previous !== earlier) doubled.isDescending = earlier < previous
    return earlier
  }
  doubled.count += 1
  if (previous === null || Number.isNaN(previous)) return doubled.isDescending ? later : earlier
  if (doubled.isDescending) return later < previous ? later : earlier
  return earlier > previous ? earlier : later
}

function startOf(text: string, zone: Zone): number | null {
  const stamp = readStamp(text, 'ymd')
  if ('problem' in stamp) return null
  return stamp.offsetMs !== null ? stamp.wallMs - stamp.offsetMs : zone.instantsOf(stamp.wallMs)[0] ?? null
}
