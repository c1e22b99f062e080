import { z } from 'zod'
import type { Read } from '../../db/writer'

const gone = 'a person since erased'

/**
 * Whom entries of the ledger are about. The chain itself holds ids and no names, so that erasing a person leaves it whole; what a person reads beside it is
 * looked up now. An id in the facts that is a person's, a membership's, a role's or a submission's stands for its person; nobody twice.
 */
export async function peopleInFacts(read: Read, facts: readonly string[]): Promise<string[][]> {
  const idsOf = facts.map(text => [...new Set(textsIn(JSON.parse(text)))])
  const ids = [...new Set(idsOf.flat())]
  if (ids.length === 0) return idsOf.map(() => [])
  const [people, members, roles, work] = await Promise.all([
    read.selectFrom('person').select(['id', 'display_name as name']).where('id', 'in', ids).execute(),
    read.selectFrom('membership').leftJoin('person', 'person.id', 'membership.person_id').select(['membership.id', 'membership.pseudonym', 'person.display_name as name']).where('membership.id', 'in', ids).execute(),
    read.selectFrom('department_role').leftJoin('person', 'person.id', 'department_role.person_id').select(['department_role.id', 'department_role.pseudonym', 'person.display_name as name']).where('department_role.id', 'in', ids).execute(),
    read.selectFrom('submission').innerJoin('membership', 'membership.id', 'submission.by_membership_id').leftJoin('person', 'person.id', 'membership.person_id')
      .select(['submission.id', 'membership.pseudonym', 'person.display_name as name']).where('submission.id', 'in', ids).execute(),
  ])
  const names = new Map([...people.map(({ id, name }) => [id, name ?? gone] as const), ...[...members, ...roles, ...work].map(row => [row.id, row.name ?? row.pseudonym] as const)])
  return idsOf.map(own => [...new Set(own.flatMap(id => names.get(id) ?? []))])
}

const nested: z.ZodType<unknown[]> = z.array(z.unknown())

/** Every text in the facts' own values and in lists among them: there the ids stand. Marks and digests lie deeper. */
function textsIn(facts: unknown): string[] {
  const values = z.record(z.string(), z.unknown()).safeParse(facts)
  if (!values.success) return []
  return Object.values(values.data).flatMap((value) => {
    const list = nested.safeParse(value)
    return (list.success ? list.data : [value]).flatMap(each => typeof each === 'string' ? [each] : [])
  })
}
