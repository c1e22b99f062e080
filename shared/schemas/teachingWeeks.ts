import { weekdayOf, type Holiday } from './calendar'

/** The date a number of days later. */
export const dateAfter = (date: string, days: number): string => new Date(Date.parse(`${date}T00:00:00Z`) + days * 86_400_000).toISOString().slice(0, 10)

/** Mondays of the teaching weeks between two dates: every week of which at least one weekday has classes. */
export function teachingWeeksBetween(startsOn: string, endsOn: string, holidays: readonly Pick<Holiday, 'from' | 'to'>[]): string[] {
  const weeks: string[] = []
  for (let monday = dateAfter(startsOn, 1 - weekdayOf(startsOn)); monday <= endsOn; monday = dateAfter(monday, 7)) {
    const weekdays = [0, 1, 2, 3, 4].map(days => dateAfter(monday, days)).filter(date => date >= startsOn && date <= endsOn)
    if (weekdays.some(date => !holidays.some(holiday => holiday.from <= date && date <= holiday.to))) weeks.push(monday)
  }
  return weeks
}
