import type { Trx } from '../writer'

/** The next number of a named sequence; gap-free, since an undone piece of work gives its number back. */
export async function nextNumber(trx: Trx, name: string): Promise<number> {
  const row = await trx.insertInto('counter').values({ name, value: 1 })
    .onConflict(conflict => conflict.column('name').doUpdateSet(set => ({ value: set('counter.value', '+', 1) })))
    .returning('value').executeTakeFirstOrThrow()
  return row.value
}
