import { describe, expect, it } from 'vitest'
import { termDates } from '#shared/schemas/department'
import { demoCalendar, instantOf, lastFallBack, lastWeekday, nextWeekday } from '../../../seeds/calendar'

const days = Array.from({ length: 120 }, (_, at) => Date.UTC(2026, 0, 1, 3) + at * 11 * 86_400_000)

describe('the demo calendar', () => {
  it.each(days.map(now => [new Date(now).toISOString().slice(0, 10), now] as const))('is alive on %s: the running term runs, the past one is over, both are sound', (_day, now) => {
    const { today, past, running } = demoCalendar(now)
    expect(termDates.safeParse(past).success).toBe(true)
    expect(termDates.safeParse(running).success).toBe(true)
    expect(past.name).not.toBe(running.name)
    expect(past.calendar.weeks.length).toBe(15)
    expect(running.startsOn < today.toString() && today.toString() < running.endsOn).toBe(true)
    expect(past.endsOn < running.startsOn).toBe(true)
    expect(instantOf(past.endsOn, '23:59')).toBeLessThan(instantOf(running.startsOn, '00:00') - 30 * 86_400_000)
  })

  it('finds weekdays before and after a day, at the distance asked', () => {
    const { today } = demoCalendar(Date.UTC(2026, 11, 1, 18)) // a Tuesday in the place
    expect(today.toString()).toBe('2026-12-01')
    expect(lastWeekday(today, 2, 0).toString()).toBe('2026-12-01')
    expect(lastWeekday(today, 2, 1).toString()).toBe('2026-11-24')
    expect(lastWeekday(today, 5, 2).toString()).toBe('2026-11-27')
    expect(nextWeekday(today, 5, 1).toString()).toBe('2026-12-04')
    expect(nextWeekday(today, 2, 1).toString()).toBe('2026-12-08')
  })

  it('knows when the clocks of the place last went back', () => {
    expect(lastFallBack(Date.UTC(2026, 11, 1)).toString()).toBe('2026-11-01')
    expect(lastFallBack(Date.UTC(2026, 5, 1)).toString()).toBe('2025-11-02')
  })
})
