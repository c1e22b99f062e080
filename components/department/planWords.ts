import type { DateNote, PlannedPosting } from '#shared/schemas/rollOver'
import { dayText } from './dates'

const which = { opens: 'Opening', due: 'Due' } as const

/** What a plan tells of a date, as a sentence. */
export function noteText(note: DateNote): string {
  switch (note.kind) {
    case 'holiday': return `${which[note.which]}: ${dayText(note.date)} is ${note.name}.`
    case 'clock': return `${which[note.which]}: ${note.told}`
    case 'no_such_week': return `${which[note.which]}: the new term has no teaching week ${note.week}; it is put in the last one.`
    case 'outside_term': return `${which[note.which]}: ${dayText(note.date)} lies outside the term.`
    case 'chosen': return 'Chosen by hand.'
  }
}

const ordinals = ['first', 'second', 'third', 'fourth', 'fifth', 'sixth', 'seventh', 'eighth', 'ninth', 'tenth']
export const draftText = (no: number): string => no <= ordinals.length ? `${ordinals[no - 1]} draft` : `draft ${no}`

/** Postings of a lab by their moved times: sections that keep step are one line. */
export function linesOf(postings: readonly PlannedPosting[]): { sections: string[], postings: PlannedPosting[] }[] {
  const lines: { sections: string[], postings: PlannedPosting[] }[] = []
  for (const posting of postings) {
    const same = lines.find(line => JSON.stringify([line.postings[0]!.was, line.postings[0]!.becomes, line.postings[0]!.notes]) === JSON.stringify([posting.was, posting.becomes, posting.notes]))
    if (same) {
      same.sections.push(posting.section)
      same.postings.push(posting)
    }
    else lines.push({ sections: [posting.section], postings: [posting] })
  }
  return lines
}
