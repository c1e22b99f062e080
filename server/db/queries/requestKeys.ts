import { refuse } from '#shared/errors'
import { insertRows, keptQuery } from '../keptQuery'
import type { Read, Trx } from '../writer'

export interface Once { personId: string, key: string, route: string, bodySha256: Buffer, now: number }

/**
 * Does a piece of work once per request key: a repetition with the same body gets the stored answer,
 * another body under the same key is refused.
 */
export async function once<T>(trx: Trx, request: Once, work: () => Promise<T>): Promise<T> {
  const earlier = await findAnswer<T>(trx, request)
  if (earlier) return earlier.answer
  const answer = await work()
  await insertRows(trx, 'request_key', [{
    person_id: request.personId, key: request.key, route: request.route, body_sha256: request.bodySha256, status: 200, response_json: JSON.stringify(answer), at: request.now,
  }])
  return answer
}

const requestByKey = keptQuery((db, given: Pick<Once, 'personId' | 'key'>) => db.selectFrom('request_key').selectAll().where('person_id', '=', given.personId).where('key', '=', given.key))

/** The answer that this request was given before, if it was; another body under its key is refused. */
export async function findAnswer<T>(db: Read | Trx, request: Once): Promise<{ answer: T } | null> {
  const [earlier] = await requestByKey(db, { personId: request.personId, key: request.key })
  if (!earlier) return null
  if (earlier.route !== request.route || !earlier.body_sha256.equals(request.bodySha256)) refuse('request_key_reused')
  return { answer: JSON.parse(earlier.response_json) as T }
}
