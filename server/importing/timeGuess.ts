import type { ColumnRef, DateOrder, TimeRecipe } from '#shared/schemas/data'
import { headWords } from './words'

export interface SampleColumn extends ColumnRef { unit: string, cells: readonly string[] }

/** A way to read time from this file. `zone` is what the file itself says, where it does. */
export interface TimeCandidate {
  label: string
  time: TimeRecipe
  /** True where the cells carry an offset or a zone. */
  hasZone: boolean
  zone: string | null
  /** Day and month could be either way round. */
  isOrderOpen: boolean
}

const stamp = /^(\d{1,4})[-/.](\d{1,2})[-/.](\d{1,4})[T ]+\d{1,2}:\d{2}/
const date = /^(\d{1,4})[-/.](\d{1,2})[-/.](\d{1,4})$|^(?:19|20)\d{6}$/
const clock = /^\d{1,2}:\d{2}(:\d{2})?(\s*[ap]\.?\s*m\.?)?$/i
const zoned = /(Z|UTC|GMT|[+-]\d{2}:?\d{2})$/

const zones: Readonly<Record<string, string>> = { utc: 'UTC', gmt: 'UTC', z: 'UTC', est: 'UTC-05:00', cst: 'UTC-06:00', mst: 'UTC-07:00', pst: 'UTC-08:00', akst: 'UTC-09:00', hst: 'UTC-10:00', cet: 'UTC+01:00' }
const zoneOfHead = ({ name, unit }: SampleColumn): string | null => headWords(`${name} ${unit}`).split(' ').map(word => zones[word]).find(zone => zone !== undefined) ?? null

/** All ways found, the surest first: with an offset in the cells, then epoch seconds, then wall times. */
export function guessTimes(columns: readonly SampleColumn[]): TimeCandidate[] {
  const found: { rank: number, candidate: TimeCandidate }[] = []
  const add = (rank: number, candidate: TimeCandidate) => found.push({ rank, candidate })
  const ref = ({ name, at }: SampleColumn): ColumnRef => ({ name, at })
  /** Nearly all: a broken cell here and there is refused later, with its line. */
  const all = (column: SampleColumn, pattern: RegExp) => {
    const filled = column.cells.filter(cell => cell !== '')
    return filled.length > 0 && filled.filter(cell => pattern.test(cell)).length >= 0.9 * filled.length
  }
  const named = (pattern: RegExp) => columns.find(column => pattern.test(headWords(column.name)) && column.cells.some(cell => cell !== ''))

  for (const column of columns) {
    if (all(column, stamp)) {
      const { order, isOpen } = orderOf(column.cells)
      const hasZone = all(column, zoned)
      add(hasZone ? 0 : 2, { label: column.name, time: { form: 'stamp', column: ref(column), dateOrder: order }, hasZone, zone: zoneOfHead(column), isOrderOpen: isOpen })
    }
    if (all(column, /^\d{10}(\.\d+)?$/) && /time|stamp|epoch|unix|sec/.test(headWords(column.name))) {
      add(1, { label: `${column.name}, seconds since 1970`, time: { form: 'epoch', column: ref(column), unit: 's' }, hasZone: true, zone: 'UTC', isOrderOpen: false })
    }
    if (all(column, /^\d{13}$/)) add(1, { label: `${column.name}, milliseconds since 1970`, time: { form: 'epoch', column: ref(column), unit: 'ms' }, hasZone: true, zone: 'UTC', isOrderOpen: false })
    if (/\belapsed\b/.test(headWords(column.name))) {
      const unit = /_min$|\bmin(utes)?\b/.test(column.name) ? 'min' : 's'
      add(6, { label: `${column.name}, since the start`, time: { form: 'elapsed', column: ref(column), unit, startsAt: null }, hasZone: false, zone: null, isOrderOpen: false })
    }
  }
  const dates = columns.find(column => all(column, date) && (column.name === '' || /date|day|^d$|datum/.test(headWords(column.name))))
  const clocks = columns.find(column => column !== dates && all(column, clock))
  if (dates && clocks) {
    const { order, isOpen } = orderOf(dates.cells)
    add(3, { label: `${dates.name} and ${clocks.name}`, time: { form: 'split', date: ref(dates), time: ref(clocks), dateOrder: order }, hasZone: false, zone: zoneOfHead(clocks) ?? zoneOfHead(dates), isOrderOpen: isOpen })
  }
  const [year, month, day, hour] = [named(/^(yr|year|yyyy|yy)$/), named(/^(mo|mon|month|mm)$/), named(/^(day|dd|dy)$/), named(/^(hr|hour|hh)$/)]
  if (year && month && day && hour) {
    const minute = named(/^(min|minute|mi)$/)
    add(4, { label: [year, month, day, hour].map(column => column.name).join(', '), time: { form: 'fields', year: ref(year), month: ref(month), day: ref(day), hour: ref(hour), minute: minute ? ref(minute) : null, second: null }, hasZone: false, zone: null, isOrderOpen: false })
  }
  const dayOfYear = named(/^(doy|jday|julian day|day of year|jul)$/)
  const hhmm = named(/^(hhmm|time|cst|mst|est|pst|utc)$/)
  if (year && dayOfYear && hhmm) add(5, { label: `${year.name}, day of year and ${hhmm.name}`, time: { form: 'dayOfYear', year: ref(year), day: ref(dayOfYear), time: ref(hhmm) }, hasZone: false, zone: zoneOfHead(hhmm), isOrderOpen: false })
  return found.sort((a, b) => a.rank - b.rank).map(entry => entry.candidate)
}

/** Year first, or which of the two short numbers goes above 12. Where neither does, the order stays open. */
function orderOf(cells: readonly string[]): { order: DateOrder, isOpen: boolean } {
  let first = 0
  let second = 0
  for (const cell of cells) {
    const match = /^(\d{1,4})[-/.](\d{1,2})/.exec(cell)
    if (!match || match[1]!.length === 4) return { order: 'ymd', isOpen: false }
    first = Math.max(first, Number(match[1]))
    second = Math.max(second, Number(match[2]))
  }
  if (first > 12) return { order: 'dmy', isOpen: false }
  if (second > 12) return { order: 'mdy', isOpen: false }
  return { order: 'dmy', isOpen: true }
}
