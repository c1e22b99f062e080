import type { Read } from '../../db/writer'

const perPage = 100
const states = ['waiting', 'sent', 'dead'] as const

/** Mail of the house, newest first: to whom, of which kind, whether it went out. What it says is between the house and its reader. */
export async function listMail(read: Read, { before }: { before: string | null }) {
  let query = read.selectFrom('outbox').leftJoin('membership', 'membership.id', 'outbox.to_membership_id')
    .leftJoin('person', join => join.on(on => on.or([on('person.id', '=', on.ref('outbox.to_person_id')), on('person.id', '=', on.ref('membership.person_id'))])))
    .select(['outbox.id', 'outbox.template', 'outbox.state', 'outbox.attempts', 'outbox.next_at as nextAt', 'person.display_name as name', 'membership.pseudonym'])
  if (before !== null) query = query.where('outbox.id', '<', before)
  const [rows, counted] = await Promise.all([
    query.orderBy('outbox.id', 'desc').limit(perPage + 1).execute(),
    read.selectFrom('outbox').select(count => ['state', count.fn.countAll<number>().as('n')]).groupBy('state').execute(),
  ])
  const mails = rows.slice(0, perPage)
  return {
    mails: mails.map(mail => ({ id: mail.id, template: mail.template, to: mail.name ?? mail.pseudonym ?? '', state: mail.state, attempts: mail.attempts, nextAt: new Date(mail.nextAt).toISOString(), madeAt: new Date(madeAt(mail.id)).toISOString() })),
    counts: Object.fromEntries(states.map(state => [state, counted.find(row => row.state === state)?.n ?? 0])) as Record<typeof states[number], number>,
    next: rows.length > perPage ? mails[mails.length - 1]!.id : null,
  }
}

/** A UUIDv7 begins with the milliseconds at which it was made. */
const madeAt = (id: string): number => Number.parseInt(id.replace(/-/g, '').slice(0, 12), 16)
