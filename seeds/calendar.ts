import { Temporal } from 'temporal-polyfill'
import type { TermDates } from '#shared/schemas/department'
import { place } from './generator/place'

/** The demo's two terms, laid around the day on which it is made, so that it looks alive whenever that is. */
export interface DemoCalendar {
  today: Temporal.PlainDate
  past: TermDates
  running: TermDates
}

const weeksBefore = 9 // the running term is in its tenth teaching week, or in its break
const teachingWeeks = 15

export function demoCalendar(now: number): DemoCalendar {
  const today = Temporal.Instant.fromEpochMilliseconds(now).toZonedDateTimeISO(place.zone).toPlainDate()
  const monday = today.subtract({ days: today.dayOfWeek - 1 })
  return { today, past: termFrom(monday.subtract({ weeks: weeksBefore + 27 })), running: termFrom(monday.subtract({ weeks: weeksBefore })) }
}

/** A term of fifteen teaching weeks with a free Thursday and Friday in its sixth and a free week after its twelfth. */
function termFrom(monday: Temporal.PlainDate): TermDates {
  const weeks = Array.from({ length: teachingWeeks + 1 }, (_, at) => monday.add({ weeks: at })).filter((_, at) => at !== 12).map(String)
  const day = (week: number, days: number) => monday.add({ weeks: week, days }).toString()
  return {
    name: termName(monday), zone: place.zone, startsOn: monday.toString(), endsOn: day(teachingWeeks, 4),
    calendar: { weeks, holidays: [{ from: day(5, 3), to: day(5, 4), name: 'Founding days' }, { from: day(12, 0), to: day(12, 6), name: 'Reading week' }] },
  }
}

/** By the month in which most of it lies. */
function termName(monday: Temporal.PlainDate): string {
  const middle = monday.add({ weeks: 7 })
  const season = middle.month <= 5 ? 'Spring' : middle.month <= 8 ? 'Summer' : 'Autumn'
  return `${season} ${middle.year}`
}

/** A wall time of the place as an instant. */
export function instantOf(date: Temporal.PlainDate | string, time: string): number {
  return Temporal.PlainDateTime.from(`${date.toString()}T${time}`).toZonedDateTime(place.zone).epochMilliseconds
}

/** A day of a term: `week` counts from 1 over all weeks, `weekday` is 1 for Monday. */
export function dayOfTerm(term: TermDates, week: number, weekday: number): Temporal.PlainDate {
  return Temporal.PlainDate.from(term.startsOn).add({ weeks: week - 1, days: weekday - 1 })
}

/** The last such weekday that lies at least so many days before a day. */
export function lastWeekday(before: Temporal.PlainDate, weekday: number, leastDays: number): Temporal.PlainDate {
  const latest = before.subtract({ days: leastDays })
  return latest.subtract({ days: (latest.dayOfWeek - weekday + 7) % 7 })
}

/** The next such weekday that lies at least so many days after a day. */
export function nextWeekday(after: Temporal.PlainDate, weekday: number, leastDays: number): Temporal.PlainDate {
  const earliest = after.add({ days: leastDays })
  return earliest.add({ days: (weekday - earliest.dayOfWeek + 7) % 7 })
}

/** The last day on which clocks went back in the place before an instant. */
export function lastFallBack(now: number): Temporal.PlainDate {
  let day = Temporal.Instant.fromEpochMilliseconds(now).toZonedDateTimeISO(place.zone).toPlainDate()
  for (let tries = 0; tries < 800; tries++) {
    day = day.subtract({ days: 1 })
    if (instantOf(day.add({ days: 1 }), '00:00') - instantOf(day, '00:00') === 25 * 3_600_000) return day
  }
  throw new Error('Clocks never go back here.')
}
