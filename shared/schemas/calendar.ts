import { z } from 'zod'

/** A date on the wall, `2026-10-28`, that exists. */
export const localDate = z.string().regex(/^\d{4}-\d{2}-\d{2}$/, 'A date is written 2026-10-28.').refine(exists, 'There is no such day.')

/** A date and a time of day on the wall, `2026-10-28T23:00`; which instant it is depends on the zone. */
export const localDateTime = z.string().regex(/^\d{4}-\d{2}-\d{2}T([01]\d|2[0-3]):[0-5]\d$/, 'A time is written 2026-10-28T23:00.')
  .refine(text => exists(text.slice(0, 10)), 'There is no such day.')

export const zoneName = z.string().trim().min(1).max(60).refine(isZone, 'Use the name of a time zone, such as America/Denver.')

export const holiday = z.object({ from: localDate, to: localDate, name: z.string().trim().min(1).max(60) })
  .refine(day => day.to >= day.from, { path: ['to'], message: 'The last day comes before the first.' })
export type Holiday = z.infer<typeof holiday>

/** Teaching weeks, named by their Mondays (the first is week 1), and days without classes. */
export const termCalendar = z.object({
  weeks: z.array(localDate).min(1, 'A term has at least one teaching week.').max(60),
  holidays: z.array(holiday).max(60).default([]),
}).superRefine((calendar, context) => {
  calendar.weeks.forEach((monday, at) => {
    if (weekdayOf(monday) !== 1) context.addIssue({ code: 'custom', path: ['weeks', at], message: `${monday} is no Monday.` })
    const before = calendar.weeks[at - 1]
    if (before !== undefined && before >= monday) context.addIssue({ code: 'custom', path: ['weeks', at], message: `${monday} does not come after ${before}.` })
  })
})
export type TermCalendar = z.infer<typeof termCalendar>

function exists(text: string): boolean {
  const instant = Date.parse(`${text}T00:00:00Z`)
  return !Number.isNaN(instant) && new Date(instant).toISOString().slice(0, 10) === text
}

/** True for a whole date that exists, such as a date field gives once it is filled. */
export const isDateText = (text: string): boolean => /^\d{4}-\d{2}-\d{2}$/.test(text) && exists(text)

/** 1 Monday … 7 Sunday. */
export function weekdayOf(date: string): number {
  return ((new Date(`${date}T00:00:00Z`).getUTCDay() + 6) % 7) + 1
}

function isZone(name: string): boolean {
  if (!/^(UTC|[A-Z][A-Za-z_]+(\/[A-Za-z0-9_+-]+)+)$/.test(name)) return false
  try {
    new Intl.DateTimeFormat('en', { timeZone: name })
    return true
  }
  catch {
    return false
  }
}
