import type { Read } from '../../db/writer'
import { peopleInFacts } from './peopleInFacts'

const entriesPerPage = 50

/** A page of one chain, newest first, with who did it and whom it is about named as far as they still are. Private texts stay where they are kept. */
export async function listLedger(read: Read, { chain, action, before }: { chain: string, action: string, before: number | null }) {
  let query = read.selectFrom('ledger_entry').selectAll().where('chain_id', '=', chain)
  if (action !== '') query = query.where('action', '=', action)
  if (before !== null) query = query.where('seq', '<', before)
  const [rows, chains, courses, head, actions] = await Promise.all([
    query.orderBy('seq', 'desc').limit(entriesPerPage + 1).execute(),
    read.selectFrom('ledger_chain').select(['id', 'seq']).orderBy('id').execute(),
    read.selectFrom('course').innerJoin('term', 'term.id', 'course.term_id').select(['course.id', 'course.code', 'term.name as term']).orderBy('term.starts_on', 'desc').orderBy('course.code').execute(),
    read.selectFrom('ledger_chain').select(['seq', 'head']).where('id', '=', chain).executeTakeFirst(),
    read.selectFrom('ledger_entry').select('action').distinct().where('chain_id', '=', chain).orderBy('action').execute(),
  ])
  const entries = rows.slice(0, entriesPerPage)
  const names = await namesOf(read, [...new Set(entries.map(entry => entry.actor))])
  const about = await peopleInFacts(read, entries.map(entry => entry.facts_json))
  const courseOf = (id: string) => courses.findIndex(course => `course:${course.id}` === id)
  return {
    chains: chains.map(({ id, seq }) => {
      const at = courseOf(id)
      return { id, seq, order: at, label: at < 0 ? (id === 'department' ? 'Department' : id) : `${courses[at]!.code}, ${courses[at]!.term}` }
    }).sort((a, b) => a.order - b.order),
    head: head ? { seq: head.seq, digest: head.head.toString('hex') } : null,
    actions: actions.map(row => row.action),
    entries: entries.map((entry, at) => ({
      // what people do themselves needs no second mention of them
      seq: entry.seq, about: (about[at] ?? []).filter(name => name !== names.get(entry.actor)), at: new Date(entry.at).toISOString(), action: entry.action, by: names.get(entry.actor) ?? (entry.actor === 'system' ? 'The house itself' : entry.actor),
      facts: entry.facts_json, digest: entry.digest.toString('hex'), hasPrivateText: entry.private_digest !== null,
    })),
    next: rows.length > entriesPerPage ? entries[entries.length - 1]!.seq : null,
  }
}

/** Actors by name; by pseudonym where the person is erased. */
async function namesOf(read: Read, actorIds: readonly string[]): Promise<Map<string, string>> {
  if (actorIds.length === 0) return new Map()
  const [members, roles] = await Promise.all([
    read.selectFrom('membership').leftJoin('person', 'person.id', 'membership.person_id').select(['membership.id', 'membership.pseudonym', 'person.display_name as name']).where('membership.id', 'in', [...actorIds]).execute(),
    read.selectFrom('department_role').leftJoin('person', 'person.id', 'department_role.person_id').select(['department_role.id', 'department_role.pseudonym', 'person.display_name as name']).where('department_role.id', 'in', [...actorIds]).execute(),
  ])
  return new Map([...members, ...roles].map(row => [row.id, row.name ?? row.pseudonym]))
}
