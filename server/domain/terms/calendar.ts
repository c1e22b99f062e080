import { Temporal } from 'temporal-polyfill'
import type { Holiday, TermCalendar } from '#shared/schemas/calendar'

/** A day's place in a term: how many days after the Monday of which teaching week. Days above 6 lie in the break after that week. */
export interface TeachingDay { week: number, days: number }

export interface SkippedDay { date: string, name: string }

/** Where a day of one term lands in another: the same teaching week and weekday, off holidays. */
export interface MovedDay {
  date: string
  /** The teaching week that it came from and is put in; a later one where the new term has no such week. */
  from: TeachingDay
  to: TeachingDay
  /** Days without classes that it would have fallen on, in the order in which they were passed over. */
  skipped: SkippedDay[]
  /** True where the new term is shorter: the day is put in its last teaching week and wants a look. */
  isPastEnd: boolean
}

const day = (date: string) => Temporal.PlainDate.from(date)
const daysBetween = (from: string, to: string): number => day(from).until(day(to), { largestUnit: 'days' }).days
const daysAfter = (date: string, days: number): string => day(date).add({ days }).toString()

/** The teaching week that a day belongs to: the last one that has begun, or the first. */
export function teachingDayOf(calendar: TermCalendar, date: string): TeachingDay {
  let week = 1
  calendar.weeks.forEach((monday, at) => {
    if (monday <= date) week = at + 1
  })
  return { week, days: daysBetween(calendar.weeks[week - 1]!, date) }
}

export const holidayOn = (calendar: TermCalendar, date: string): Holiday | undefined => calendar.holidays.find(holiday => holiday.from <= date && date <= holiday.to)

/**
 * Moves a day from one term's calendar to another's by teaching week and weekday. A day that falls on a holiday goes on to the
 * next day with classes: to a weekend only if it was on one.
 */
export function moveDay(from: TermCalendar, to: TermCalendar, date: string): MovedDay {
  const place = teachingDayOf(from, date)
  const isPastEnd = place.week > to.weeks.length
  const monday = to.weeks[Math.min(place.week, to.weeks.length) - 1]!
  const isWeekend = (on: string) => day(on).dayOfWeek > 5
  const mayBeWeekend = isWeekend(date)
  const skipped: SkippedDay[] = []
  let moved = daysAfter(monday, place.days)
  for (;;) {
    const holiday = holidayOn(to, moved)
    if (holiday) skipped.push({ date: moved, name: holiday.name })
    else if (!isWeekend(moved) || mayBeWeekend || skipped.length === 0) break
    moved = daysAfter(moved, 1)
  }
  return { date: moved, from: place, to: teachingDayOf(to, moved), skipped, isPastEnd }
}
