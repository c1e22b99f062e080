import type { TermCalendar } from '#shared/schemas/calendar'
import { weekdayOf } from '#shared/schemas/calendar'
import { dateAfter } from '#shared/schemas/teachingWeeks'

export interface WeekLine {
  monday: string
  /** Its number among the teaching weeks; null in a week without classes. */
  no: number | null
  /** Days without classes, counted from Monday 0. */
  free: number[]
  names: string[]
}

/** Every week from a term's first day to its last, teaching or not. */
export function linesOf(calendar: TermCalendar, startsOn: string, endsOn: string): WeekLine[] {
  const first = dateAfter(startsOn, 1 - weekdayOf(startsOn))
  const start = calendar.weeks[0] !== undefined && calendar.weeks[0] < first ? calendar.weeks[0] : first
  const lines: WeekLine[] = []
  for (let monday = start; monday <= endsOn && lines.length < 70; monday = dateAfter(monday, 7)) {
    const at = calendar.weeks.indexOf(monday)
    const days = [0, 1, 2, 3, 4, 5, 6].map(no => ({ no, holiday: calendar.holidays.find(holiday => holiday.from <= dateAfter(monday, no) && dateAfter(monday, no) <= holiday.to) }))
    lines.push({ monday, no: at < 0 ? null : at + 1, free: days.filter(day => day.holiday).map(day => day.no), names: [...new Set(days.flatMap(day => day.holiday?.name ?? []))] })
  }
  return lines
}
