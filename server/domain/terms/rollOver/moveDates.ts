import type { TermDates } from '#shared/schemas/department'
import type { DateNote, PlannedPosting } from '#shared/schemas/rollOver'
import type { TermCalendar } from '#shared/schemas/calendar'
import { holidayOn, moveDay, teachingDayOf } from '../calendar'
import { endOfMinute, resolveWallTime, tellShift } from '../wallClock'

type Which = 'opens' | 'due'
interface SaidTimes { opensLocal: string, dueLocal: string }

/**
 * Moves a posting's times into another term: the same teaching week, weekday and time of day. Says what it met on the way:
 * days without classes, an hour that the clock skips or shows twice, a week that the new term does not have.
 */
export function moveDates(from: TermCalendar, to: TermDates, was: SaidTimes, chosen: SaidTimes | null): Pick<PlannedPosting, 'was' | 'becomes' | 'notes' | 'problem'> {
  const notes: DateNote[] = chosen ? [{ kind: 'chosen' }] : []
  const local = (which: Which, said: string): string => {
    if (chosen) return which === 'opens' ? chosen.opensLocal : chosen.dueLocal
    const moved = moveDay(from, to.calendar, said.slice(0, 10))
    for (const { date, name } of moved.skipped) notes.push({ kind: 'holiday', which, date, name })
    if (moved.isPastEnd) notes.push({ kind: 'no_such_week', which, week: moved.from.week })
    return `${moved.date}T${said.slice(11)}`
  }
  const opensLocal = local('opens', was.opensLocal)
  const dueLocal = local('due', was.dueLocal)
  const resolved = { opens: resolveWallTime(opensLocal, to.zone), due: resolveWallTime(dueLocal, to.zone) }
  for (const [which, said] of [['opens', opensLocal], ['due', dueLocal]] as const) {
    const told = tellShift(resolved[which], said)
    if (told !== null) notes.push({ kind: 'clock', which, told })
    const date = said.slice(0, 10)
    if (date < to.startsOn || date > to.endsOn) notes.push({ kind: 'outside_term', which, date })
    const holiday = chosen ? holidayOn(to.calendar, date) : undefined
    if (holiday) notes.push({ kind: 'holiday', which, date, name: holiday.name })
  }
  const problem = resolved.due.at > resolved.opens.at ? null : 'It would be due before it opens.'
  return {
    was: { ...was, dueWeek: teachingDayOf(from, was.dueLocal.slice(0, 10)).week },
    becomes: { opensLocal, dueLocal, opensAt: resolved.opens.at, dueAt: endOfMinute(resolved.due.at), dueWeek: teachingDayOf(to.calendar, dueLocal.slice(0, 10)).week },
    notes, problem,
  }
}
