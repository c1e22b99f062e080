import { refuse } from '#shared/errors'
import type { PostingBody } from '#shared/schemas/lab'
import { endOfMinute, resolveWallTime, tellShift } from '../terms/wallClock'

export interface ResolvedDates {
  sectionId: string
  opensLocal: string
  dueLocal: string
  opensAt: number
  /** The last instant that is on time: a due minute counts to its end. */
  dueAt: number
  /** What a clock change made of the dates, in sentences. */
  notes: string[]
}

/**
 * What a posting's wall times come to in the term's zone.
 * @throws {DomainError} `dates_invalid` where due does not come after opening, or a section is named twice
 */
export function resolveDates(sections: PostingBody['sections'], zone: string): ResolvedDates[] {
  if (new Set(sections.map(section => section.sectionId)).size < sections.length) refuse('dates_invalid', { reason: 'A section is named twice.' })
  return sections.map(({ sectionId, opensLocal, dueLocal }, at) => {
    const opens = resolveWallTime(opensLocal, zone)
    const due = resolveWallTime(dueLocal, zone)
    if (due.at <= opens.at) refuse('dates_invalid', { reason: `Due ${dueLocal} does not come after opening ${opensLocal}.` }, [{ path: `sections.${at}.dueLocal`, message: 'Due must come after opening.' }])
    return { sectionId, opensLocal, dueLocal, opensAt: opens.at, dueAt: endOfMinute(due.at), notes: [tellShift(opens, opensLocal), tellShift(due, dueLocal)].filter(note => note !== null) }
  })
}
