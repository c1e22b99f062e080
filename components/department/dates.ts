import { weekdayOf } from '#shared/schemas/calendar'

const weekdays = ['Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat', 'Sun']
const months = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec']

/** "28 Oct", with the year where it is asked for. */
export function dateText(date: string, { year = false }: { year?: boolean } = {}): string {
  const [y, month, day] = date.slice(0, 10).split('-').map(Number)
  return `${day} ${months[(month ?? 1) - 1]}${year ? ` ${y}` : ''}`
}

/** "Wed 28 Oct" */
export const dayText = (date: string): string => `${weekdays[weekdayOf(date.slice(0, 10)) - 1]} ${dateText(date)}`

/** "Wed 28 Oct, 23:00", from a time on the wall. */
export const wallText = (local: string): string => `${dayText(local)}, ${local.slice(11, 16)}`

export const isWeekend = (date: string): boolean => weekdayOf(date.slice(0, 10)) > 5

/** An instant as the clock of the person who reads shows it would differ between server and browser: ledger times are told in UTC. */
export const utcText = (iso: string): string => `${dateText(iso, { year: true })}, ${iso.slice(11, 19)} UTC`
