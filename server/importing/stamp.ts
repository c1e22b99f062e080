import type { DateOrder } from '#shared/schemas/data'

/** A wall time as read from cells: milliseconds as if it were UTC, and the offset that the cell carried, if any. */
export interface Stamp { wallMs: number, offsetMs: number | null }
export type StampReading = Stamp | { problem: string }

const dayMs = 86_400_000
const isProblem = (value: object): value is { problem: string } => 'problem' in value

/**
 * Reads date and time from one cell: `2021-02-22T08:01:52+01:00`, `2016-01-01 00:00 UTC`, `10/14/2018 13:05`, `22.02.2021 1:05 p. m.`.
 * `24:00` is 00:00 of the next day. The order of day and month is never guessed: a person chose it.
 */
export function readStamp(text: string, order: DateOrder): StampReading {
  const quick = quickIso(text, order)
  if (quick) return quick
  const match = /^(\S+?)(?:[T ,]+(\d.*))?$/.exec(text)
  if (!match) return { problem: text === '' ? 'no time' : 'not a date' }
  const date = readDate(match[1]!, order)
  if (isProblem(date)) return date
  if (match[2] === undefined) return { wallMs: date.wallMs, offsetMs: null }
  const time = readTime(match[2])
  return isProblem(time) ? time : { wallMs: date.wallMs + time.wallMs, offsetMs: time.offsetMs }
}

/** The common shape, without a regular expression: YYYY-MM-DD, T or blank, HH:MM and perhaps seconds; nothing behind it or Z. */
function quickIso(text: string, order: DateOrder): Stamp | null {
  const length = text.length
  if (order !== 'ymd' || (length !== 16 && length !== 19 && length !== 20)) return null
  if (text[4] !== '-' || text[7] !== '-' || text[13] !== ':' || (text[10] !== ' ' && text[10] !== 'T')) return null
  if (length > 16 && text[16] !== ':') return null
  if (length === 20 && text[19] !== 'Z') return null
  const year = digits(text, 0, 4)
  const month = digits(text, 5, 7)
  const day = digits(text, 8, 10)
  const hour = digits(text, 11, 13)
  const minute = digits(text, 14, 16)
  const second = length > 16 ? digits(text, 17, 19) : 0
  if (year < 0 || month < 1 || day < 1 || hour < 0 || minute < 0 || second < 0 || month > 12 || day > 28 || hour > 23 || minute > 59 || second > 59) return null
  return { wallMs: Date.UTC(year, month - 1, day, hour, minute, second), offsetMs: length === 20 ? 0 : null }
}

function digits(text: string, from: number, to: number): number {
  let value = 0
  for (let at = from; at < to; at += 1) {
    const digit = text.charCodeAt(at) - 48
    if (!(digit >= 0 && digit <= 9)) return -1
    value = value * 10 + digit
  }
  return value
}

export function readDate(text: string, order: DateOrder): { wallMs: number } | { problem: string } {
  const compact = /^(\d{4})(\d{2})(\d{2})$/.exec(text)
  const parts = compact ?? /^(\d{1,4})[-/.](\d{1,2})[-/.](\d{1,4})$/.exec(text)
  if (!parts) return { problem: text === '' ? 'no date' : 'not a date' }
  const [first, second, third] = [parts[1]!, parts[2]!, parts[3]!]
  const effective = compact ? 'ymd' : order
  const year = effective === 'ymd' ? first : third
  if (year.length !== 4) return { problem: 'the year does not have four digits; check the order of day, month and year' }
  if (effective === 'ymd') return dateOf(Number(year), Number(second), Number(third))
  return effective === 'dmy' ? dateOf(Number(year), Number(second), Number(first)) : dateOf(Number(year), Number(first), Number(second))
}

/** @returns midnight of a day that exists, or why not. */
export function dateOf(year: number, month: number, day: number): { wallMs: number } | { problem: string } {
  if (!Number.isInteger(year) || !Number.isInteger(month) || !Number.isInteger(day)) return { problem: 'not a date' }
  if (year < 1700 || year > 2200) return { problem: `year ${year} is not between 1700 and 2200` }
  if (month < 1 || month > 12) return { problem: `there is no month ${month}; check the order of day and month` }
  const wallMs = Date.UTC(year, month - 1, day)
  if (day < 1 || new Date(wallMs).getUTCMonth() !== month - 1) return { problem: `month ${month} of ${year} has no day ${day}` }
  return { wallMs }
}

/** Day of the year counts from 1: 366 is 31 December of a leap year. */
export function dateOfYear(year: number, day: number): { wallMs: number } | { problem: string } {
  const start = dateOf(year, 1, 1)
  if (isProblem(start)) return start
  const days = (Date.UTC(year + 1, 0, 1) - start.wallMs) / dayMs
  if (!Number.isInteger(day) || day < 1 || day > days) return { problem: `${year} has no day ${day}; days of the year count from 1` }
  return { wallMs: start.wallMs + (day - 1) * dayMs }
}

const clock = /^(\d{1,2}):?([0-5]\d)(?::?(\d{2})(?:[.,](\d{1,9}))?)?\s*([ap])?\.?\s*m?\.?\s*(Z|UTC|GMT|[+-]\d{2}:?\d{2}|[+-]\d{2})?$/i

/** A time of day: `08:01:52`, `8:05 PM`, `0805`, `5` minutes past midnight written as `0005` or `5`, `24:00`. */
export function readTime(text: string): StampReading {
  const bare = /^\d{1,4}$/.test(text) ? text.padStart(4, '0') : text
  const match = clock.exec(bare)
  if (!match) return { problem: text === '' ? 'no time' : 'not a time of day' }
  const half = match[5]?.toLowerCase()
  let hour = Number(match[1])
  const minute = Number(match[2])
  const second = Number(match[3] ?? 0)
  const fraction = match[4] ? Math.round(Number(`0.${match[4]}`) * 1000) : 0
  if (half) {
    if (hour < 1 || hour > 12) return { problem: `there is no ${hour} o’clock on a 12-hour clock` }
    hour = (hour % 12) + (half === 'p' ? 12 : 0)
  }
  if (second > 59) return { problem: 'a second above 59' }
  if (hour > 24 || (hour === 24 && (minute > 0 || second > 0 || fraction > 0))) return { problem: `there is no time ${text}` }
  return { wallMs: ((hour * 60 + minute) * 60 + second) * 1000 + fraction, offsetMs: readOffset(match[6]) }
}

function readOffset(text: string | undefined): number | null {
  if (text === undefined) return null
  const match = /^([+-])(\d{2}):?(\d{2})?$/.exec(text)
  if (!match) return 0
  return (match[1] === '-' ? -1 : 1) * (Number(match[2]) * 60 + Number(match[3] ?? 0)) * 60_000
}
