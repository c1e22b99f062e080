import { randomInt } from 'node:crypto'
import type { Trx } from '../../db/writer'

// No vowels, so that no word comes out; nothing that reads like another letter or digit.
const letters = '23456789BCDFGHJKMNPQRTVWXZ'

/** A name by which somebody is called where names are hidden: drawn at random, never made from the person. */
export const drawPseudonym = (): string => Array.from({ length: 5 }, () => letters[randomInt(letters.length)]).join('')

/** One that nobody in the course bears. */
export async function freePseudonym(trx: Trx, courseId: string): Promise<string> {
  for (;;) {
    const pseudonym = drawPseudonym()
    const taken = await trx.selectFrom('membership').select('id').where('course_id', '=', courseId).where('pseudonym', '=', pseudonym).executeTakeFirst()
    if (!taken) return pseudonym
  }
}
