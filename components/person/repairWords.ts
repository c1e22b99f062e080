import type { DueSource, RepairEntry, SoFar } from '#shared/schemas/repairs'
import { marksText } from '../sheet/unitText'

const days = (n: number) => n === 1 ? '1 day' : `${n} days`

/** What was done, in a few words. */
export function repairText(entry: RepairEntry): string {
  switch (entry.kind) {
    case 'extension': return 'Later due time'
    case 'accommodation': return entry.extraDays === 0 ? 'Accommodation ended' : `Due times ${days(entry.extraDays ?? 0)} later from then on`
    case 'excused': return 'Excused'
    case 'counted': return 'Counts'
    case 'not_counted': return 'Not counted until staff decide'
    case 'attempt': return 'One more attempt'
    case 'moved': return 'Moved to another section'
    case 'lateness': return entry.lateDays === 0 ? 'Late work accepted as in time' : `Late work accepted as ${days(entry.lateDays ?? 0)} late`
  }
}

export const dueSourceText: Readonly<Record<DueSource, string>> = {
  section: 'section', extension: 'extension', accommodation: 'accommodation', late_add: 'late start', moved_section: 'from the section before',
}

/** "140 of 200, 70.0 %": rounded for the eye alone. */
export const soFarText = (soFar: SoFar): string =>
  `${marksText(soFar.earnedMilli)} of ${marksText(soFar.maxMilli)}${soFar.maxMilli > 0 ? `, ${(soFar.earnedMilli / soFar.maxMilli * 100).toFixed(1)}\u202f%` : ''}`
