import type { NoticeFacts } from '#shared/schemas/notices'
import type { Letter } from '../letter'
import { instantIn } from '../instantIn'

type Facts = NoticeFacts<'repair'>

/** Tells a student what staff did for them. The reason stays in the house, where it can be erased. */
export function repair(facts: Facts, link: (path: string) => string): Letter {
  const { subject, says } = words[facts.kind](facts.lab ?? facts.course, facts)
  return {
    subject, says: [facts.lab === null ? says : `${says} (${facts.course})`],
    facts: facts.dueAt === null ? [] : [['Due', instantIn(facts.dueAt, facts.zone)]],
    link: { words: 'See what was done, by whom and why', url: link(facts.path) },
  }
}

const words: Record<Facts['kind'], (what: string, facts: Facts) => { subject: string, says: string }> = {
  extension: lab => ({ subject: `A later due time: ${lab}`, says: `You have a due time of your own for ${lab}.` }),
  accommodation: course => ({ subject: `Your due times in ${course}`, says: `Your due times in ${course} have changed. Those that were given before stay.` }),
  excused: lab => ({ subject: `Excused: ${lab}`, says: `You are excused from ${lab}: it is left out of what counts.` }),
  counted: lab => ({ subject: `Counts again: ${lab}`, says: `${lab} counts for you.` }),
  not_counted: lab => ({ subject: `Not counted for now: ${lab}`, says: `${lab} does not count for you until staff decide.` }),
  attempt: lab => ({ subject: `One more attempt: ${lab}`, says: `You have one more attempt at ${lab}.` }),
  moved: course => ({ subject: `Another section: ${course}`, says: `You are in another section of ${course} now. Your data stay, and of both due times the later counts.` }),
  lateness: lab => ({ subject: `Late work accepted: ${lab}`, says: `Staff accepted work that you sent late for ${lab}.` }),
}
