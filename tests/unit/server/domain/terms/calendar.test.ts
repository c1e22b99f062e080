import { describe, expect, it } from 'vitest'
import { moveDay, teachingDayOf } from '../../../../../server/domain/terms/calendar'
import { teachingWeeksBetween } from '../../../../../shared/schemas/teachingWeeks'

const fallBreak = { from: '2026-11-23', to: '2026-11-27', name: 'Fall break' }
const fall = { weeks: teachingWeeksBetween('2026-08-24', '2026-12-11', [fallBreak]), holidays: [fallBreak] }
const holidays = [{ from: '2027-02-15', to: '2027-02-15', name: 'Presidents’ Day' }, { from: '2027-03-22', to: '2027-03-26', name: 'Spring break' }, { from: '2027-04-02', to: '2027-04-02', name: 'Good Friday' }]
const spring = { weeks: teachingWeeksBetween('2027-01-11', '2027-04-30', holidays), holidays }

describe('teaching weeks', () => {
  it('leave out a week in which every weekday is free', () => {
    expect(fall.weeks).toHaveLength(15)
    expect(fall.weeks[0]).toBe('2026-08-24')
    expect(fall.weeks).not.toContain('2026-11-23')
    expect(spring.weeks.slice(9, 12)).toEqual(['2027-03-15', '2027-03-29', '2027-04-05'])
  })
  it('start with the week that holds the first day, be it a Wednesday', () => {
    expect(teachingWeeksBetween('2026-09-02', '2026-09-18', [])).toEqual(['2026-08-31', '2026-09-07', '2026-09-14'])
  })
  it('count a day in the break to the week before it', () => {
    expect(teachingDayOf(fall, '2026-11-25')).toEqual({ week: 13, days: 9 })
    expect(teachingDayOf(fall, '2026-08-20')).toEqual({ week: 1, days: -4 })
  })
})

describe('a moved day', () => {
  it('keeps teaching week and weekday', () => {
    // Wednesday of week 10 in fall is 28 October; week 10 in spring begins on 15 March
    expect(moveDay(fall, spring, '2026-10-28')).toMatchObject({ date: '2027-03-17', from: { week: 10, days: 2 }, to: { week: 10, days: 2 }, skipped: [], isPastEnd: false })
  })
  it('counts teaching weeks, not weeks of the year: a break in between moves it on', () => {
    expect(moveDay(fall, spring, '2026-11-04').date).toBe('2027-03-31') // week 11, after spring break
  })
  it('goes past a holiday to the next day with classes and says which it passed', () => {
    // Monday of week 6
    expect(moveDay(fall, spring, '2026-09-28')).toMatchObject({ date: '2027-02-16', skipped: [{ date: '2027-02-15', name: 'Presidents’ Day' }] })
    // Friday of week 11 is Good Friday: over the weekend to Monday
    expect(moveDay(fall, spring, '2026-11-06')).toMatchObject({ date: '2027-04-05', skipped: [{ date: '2027-04-02', name: 'Good Friday' }] })
  })
  it('stays on a weekend when it was on one', () => {
    expect(moveDay(fall, spring, '2026-10-04').date).toBe('2027-02-21') // Sunday of week 6
  })
  it('is put in the last week, and says so, when the new term is shorter', () => {
    const short = { weeks: spring.weeks.slice(0, 12), holidays }
    expect(moveDay(fall, short, '2026-12-09')).toMatchObject({ date: '2027-04-07', isPastEnd: true })
  })
  it('comes back to itself between equal calendars', () => {
    for (let day = 0; day < 90; day++) {
      const date = new Date(Date.UTC(2026, 7, 24 + day)).toISOString().slice(0, 10)
      if (date >= '2026-11-23') continue
      expect(moveDay(fall, fall, date).date).toBe(date)
    }
  })
})
