import type { TermCalendar } from '#shared/schemas/calendar'
import { isDateText } from '#shared/schemas/calendar'
import { termDates } from '#shared/schemas/department'
import { teachingWeeksBetween } from '#shared/schemas/teachingWeeks'

export interface TypedHoliday { from: string, to: string, name: string }


/** A term's dates as the route takes them, from what was typed. Messages name the form's fields. */
export function readTypedTerm(typed: Record<string, unknown>, holidays: readonly TypedHoliday[]) {
  const days = holidays.map(day => ({ from: day.from, to: day.to === '' ? day.from : day.to, name: day.name }))
  const [startsOn, endsOn] = [String(typed.startsOn ?? ''), String(typed.endsOn ?? '')]
  const countable = isDateText(startsOn) && isDateText(endsOn) && days.every(day => isDateText(day.from) && isDateText(day.to))
  const weeks = countable ? teachingWeeksBetween(startsOn, endsOn, days) : []
  return termDates.safeParse({ name: typed.name ?? '', zone: typed.zone ?? '', startsOn, endsOn, calendar: { weeks, holidays: days } })
}

export const typedFrom = (term: { name: string, zone: string, startsOn: string, endsOn: string }): Record<string, unknown> => ({ name: term.name, zone: term.zone, startsOn: term.startsOn, endsOn: term.endsOn })
export const holidaysFrom = (calendar: TermCalendar): TypedHoliday[] => calendar.holidays.map(day => ({ from: day.from, to: day.to === day.from ? '' : day.to, name: day.name }))
