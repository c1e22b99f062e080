import { dayInZone } from '~/composables/dateWords'
import { findMeasuredQuantity, type MeasuredQuantity, measuredQuantities } from '#shared/schemas/data'

export const quantityLabel = (key: string): string => findMeasuredQuantity(key)?.label ?? key
export const quantityList: readonly MeasuredQuantity[] = measuredQuantities

/** "12.4 MB": decimal, as file managers print it. */
export function fileSize(bytes: number): string {
  if (bytes < 1000) return `${bytes} bytes`
  const units = ['kB', 'MB', 'GB']
  let value = bytes / 1000
  let at = 0
  while (value >= 1000 && at < units.length - 1) {
    value /= 1000
    at += 1
  }
  return `${value.toFixed(value < 10 ? 1 : 0)} ${units[at]}`
}

export const countText = (value: number): string => value >= 10_000 ? String(value).replace(/\B(?=(\d{3})+$)/g, '\u202F') : String(value)

/** "7 Oct 2026, 05:01 UTC": an instant for a log. */
export function utcText(iso: string | null): string {
  if (iso === null) return ''
  const at = new Date(iso)
  const seconds = at.getUTCSeconds() === 0 ? '' : `:${String(at.getUTCSeconds()).padStart(2, '0')}`
  return `${dayText(iso)}, ${String(at.getUTCHours()).padStart(2, '0')}:${String(at.getUTCMinutes()).padStart(2, '0')}${seconds} UTC`
}

export const dayText = (iso: string): string => dayInZone(iso, 'UTC')

/** "7 Oct 2026", or "22 Feb to 14 Aug 2021". */
export function spanText(from: string | null, to: string | null): string {
  if (from === null || to === null) return 'no clock'
  const [first, last] = [dayText(from), dayText(to)]
  if (first === last) return first
  const [year, otherYear] = [first.slice(-4), last.slice(-4)]
  return `${year === otherYear ? first.slice(0, -5) : first} to ${last}`
}

/** "1 min", "10 min", "1 h", "2 s". */
export function stepText(stepMs: number): string {
  const seconds = stepMs / 1000
  if (seconds < 60) return `${seconds} s`
  if (seconds < 3600) return `${Math.round(seconds / 6) / 10} min`
  return `${Math.round(seconds / 360) / 10} h`
}

export const flagWords = { range: 'beyond range', step: 'jump', order: 'clock stepped back', duplicate: 'time stands twice' } as const
export const flagShapes = { range: 'cross', step: 'triangle', order: 'diamond', duplicate: 'half' } as const

export const delimiterWords = [{ value: ',', label: 'comma' }, { value: ';', label: 'semicolon' }, { value: 'tab', label: 'tab' }, { value: '|', label: 'vertical bar' }, { value: 'blank', label: 'blanks' }] as const
export type DelimiterWord = (typeof delimiterWords)[number]['value']
export const delimiterWord = (delimiter: string): DelimiterWord => delimiter === '\t' ? 'tab' : delimiter === ' ' ? 'blank' : delimiter === ';' ? ';' : delimiter === '|' ? '|' : ','
