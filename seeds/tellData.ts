import type { Temporal } from 'temporal-polyfill'
import { dayOfTerm } from './calendar'
import { clockChangeDay, Observing, type LoggerFile } from './observing'
import { termId, type Stage, type TermKey } from './stage'
import { Technician } from './technician'

/** Weeks in whose middle the tethersonde flew. */
const flightWeeks = { past: [2, 5], running: [2, 5, 8] } as const
const firstFlight = { past: 11, running: 21 } as const

/** What the technician brought in: flights on clear mornings, the roof's long record, a day with faults, the day of the clock change. */
export function tellData(stage: Stage): void {
  const { timeline, workshop, department } = stage
  const technician = new Technician(workshop.stores, workshop.files, workshop.dataDir)
  const { past, running, today } = department.calendar

  const bring = (term: TermKey, file: LoggerFile, note: (versionId: string) => void = () => {}) => timeline.at(file.broughtInAt, async (now) => {
    const { id: courseId } = await department.course(termId(stage, term), 'main')
    note(await technician.bringIn(file, { ...await department.technician(), courseId }, now))
  })
  const observe = (term: TermKey, to: Temporal.PlainDate) => {
    const dates = department.calendar[term]
    const days = flightWeeks[term].map(week => dayOfTerm(dates, week, 3))
    const observing = new Observing(dates.name, dayOfTerm(dates, 1, 1), to, days)
    days.forEach((date, which) => {
      for (const file of observing.flights(date, firstFlight[term] + 3 * which)) bring(term, file, versionId => stage.flights[term].push(versionId))
    })
    bring(term, observing.roofRecord())
    return { observing, days }
  }

  observe('past', dayOfTerm(past, 16, 6))
  // The running term's record ends with the last whole day before this one that the technician has fetched.
  const { observing, days } = observe('running', today.subtract({ days: 1 }))
  const faulty = days[1]
  if (faulty) bring('running', observing.faultyDay(faulty))
  const changed = clockChangeDay(workshop.now)
  bring(changed.broughtInAt < Date.parse(`${running.startsOn}T00:00:00Z`) ? 'past' : 'running', changed)
}
