import { postingBody, type LateRule, type PostingBody } from '#shared/schemas/lab'
import { typedNumber } from './readDraft'

/** What stands in the fields of a posting. */
export interface PostDraft {
  sections: { sectionId: string, name: string, students: number, isChosen: boolean, opensLocal: string, dueLocal: string }[]
  rule: LateRule['kind']
  percent: string
  closesAfterDays: string
  attempts: string
  keep: 'last' | 'best'
  feedback: 'at_once' | 'after_release'
}

export interface ReadPost { body: PostingBody | null, problems: { path: string, message: string }[], chosen: number[] }

/** Reads the fields by the schema that the server uses. Paths count the chosen sections only, as the server does: `chosen` leads back to the fields. */
export function readPost(draft: PostDraft): ReadPost {
  const chosen = draft.sections.flatMap((section, at) => section.isChosen ? [at] : [])
  const closes = typedNumber(draft.closesAfterDays)
  const rule = draft.rule === 'none' ? { kind: 'none' } : draft.rule === 'open' ? { kind: 'open', closesAfterDays: closes } : { kind: draft.rule, percent: typedNumber(draft.percent), closesAfterDays: closes }
  const read = postingBody.safeParse({
    sections: chosen.map(at => draft.sections[at]).flatMap(section => section ? [{ sectionId: section.sectionId, opensLocal: section.opensLocal, dueLocal: section.dueLocal }] : []),
    lateRule: rule, attempts: typedNumber(draft.attempts), keep: draft.keep, feedback: draft.feedback,
  })
  return read.success ? { body: read.data, problems: [], chosen } : { body: null, problems: read.error.issues.map(issue => ({ path: issue.path.join('.'), message: issue.code === 'invalid_type' ? 'A whole number.' : issue.message })), chosen }
}

/** "of what was earned: 10 % for each started day, until 7 days after due". */
export function ruleWords(rule: LateRule): string {
  switch (rule.kind) {
    case 'none': return 'none: late work is kept and earns nothing unless you accept it'
    case 'open': return `open: no loss until ${rule.closesAfterDays} days after due`
    case 'of_earned': return `of what was earned: ${rule.percent} % for each started day, until ${rule.closesAfterDays} days after due`
    case 'of_maximum': return `of the maximum: ${rule.percent} % of the lab’s marks for each started day, until ${rule.closesAfterDays} days after due`
  }
}
