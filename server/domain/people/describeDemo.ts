import { z } from 'zod'
import { refuse } from '#shared/errors'
import type { Read, Stores } from '../../db/writer'
import { demoPassphrase } from './demoPassphrase'

/** What the installation remembers of its demo: the secret of the passphrases, and whose sign-ins are shown, in order. */
const demoRecord = z.object({ secret: z.string().min(32), madeAt: z.number().int(), shown: z.array(z.string()) })
export type DemoRecord = z.infer<typeof demoRecord>

export async function findDemo(read: Read): Promise<DemoRecord | null> {
  const row = await read.selectFrom('installation').select('value_json').where('key', '=', 'demo').executeTakeFirst()
  return row ? demoRecord.parse(JSON.parse(row.value_json)) : null
}

export async function recordDemo({ write }: Stores, record: DemoRecord): Promise<void> {
  await write(trx => trx.insertInto('installation').values({ key: 'demo', value_json: JSON.stringify(record) }).execute())
}

export interface DemoPerson { name: string, email: string, password: string, roles: string[] }

/**
 * The demo's sign-ins. Where the demo is off, or this department is not an invented one, there is no such thing.
 * @throws {DomainError} `not_found`
 */
export async function describeDemo(read: Read, isDemo: boolean): Promise<{ people: DemoPerson[] }> {
  const demo = isDemo ? await findDemo(read) : null
  if (!demo) return refuse('not_found')
  const [people, roles, memberships] = await Promise.all([
    read.selectFrom('person').select(['id', 'display_name as name', 'email_norm as email']).where('email_norm', 'in', demo.shown).where('state', '=', 'active').execute(),
    read.selectFrom('department_role').select(['person_id as personId', 'role']).where('state', '=', 'active').execute(),
    read.selectFrom('membership').innerJoin('course', 'course.id', 'membership.course_id').innerJoin('term', 'term.id', 'course.term_id')
      .select(['membership.person_id as personId', 'membership.role']).where('membership.state', '=', 'active').where('term.state', '=', 'running').orderBy('course.code').execute(),
  ])
  return {
    people: demo.shown.flatMap((email) => {
      const person = people.find(known => known.email === email)
      if (!person) return []
      const held = [...roles, ...memberships].filter(role => role.personId === person.id).map(role => role.role)
      return [{ name: person.name ?? '', email, password: demoPassphrase(demo.secret, email), roles: [...new Set<string>(held)] }]
    }),
  }
}
