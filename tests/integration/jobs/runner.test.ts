import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { DomainError } from '#shared/errors'
import { cancelJob } from '../../../server/domain/jobs/cancelJob'
import { enqueueJob } from '../../../server/domain/jobs/enqueueJob'
import { leaseJob } from '../../../server/domain/jobs/leaseJob'
import { startRunner, type JobHandler, type Runner } from '../../../server/jobs/runner'
import { temporaryStores, type TemporaryStores } from '../../fixtures/temporaryStores'

let stores: TemporaryStores
let runner: Runner | undefined
beforeEach(async () => { stores = await temporaryStores() })
afterEach(async () => {
  await runner?.stop()
  runner = undefined
  await stores.remove()
})

const start = (handlers: Record<string, JobHandler>, now = () => Date.now()) => { runner = startRunner({ stores, handlers, now, pollMs: 20 }) }
const jobOf = (id: string) => stores.read.selectFrom('job').selectAll().where('id', '=', id).executeTakeFirstOrThrow()
const until = async (id: string, isSo: (job: Awaited<ReturnType<typeof jobOf>>) => boolean) => {
  for (let n = 0; n < 400; n++) {
    const job = await jobOf(id)
    if (isSo(job)) return job
    await new Promise(resolve => setTimeout(resolve, 20))
  }
  throw new Error(`It stayed ${JSON.stringify(await jobOf(id))}`)
}
const enqueue = (kind: string, more = {}) => stores.write(trx => enqueueJob(trx, { kind, payload: { a: 1 }, now: Date.now(), ...more }))

describe('background work', () => {
  it('is done, with its progress and its result kept', async () => {
    start({ add: async ({ payload, progress }) => {
      await progress(1, 2)
      return { saw: payload }
    } })
    const job = await until(await enqueue('add'), one => one.state === 'done')
    expect(job).toMatchObject({ done_units: 1, all_units: 2, attempts: 1, result_json: '{"saw":{"a":1}}', error_json: null })
  })

  it('is one, however often it is asked for under one key', async () => {
    expect(await enqueue('add', { onceKey: 'k' })).toBe(await enqueue('add', { onceKey: 'k' }))
  })

  it('fails for good by a refusal, and is tried again after any other error, its words kept out of what is shown', async () => {
    start({
      refused: async () => { throw new DomainError('file_empty', { file: 'a.csv' }) },
      broken: async () => { throw new Error('SELECT secret') },
    })
    const [refused, broken] = [await enqueue('refused'), await enqueue('broken')]
    expect((await until(refused, one => one.state === 'failed')).error_json).toBe('{"code":"file_empty","facts":{"file":"a.csv"}}')
    const job = await until(broken, one => one.attempts === 1 && one.state === 'waiting')
    expect(job.error_json).toBe('{"code":"failed","facts":{}}')
    expect(job.run_after).toBeGreaterThan(Date.now() + 3000)
  })

  it('hears of a cancel while it runs', async () => {
    let heard = ''
    start({ long: ({ signal }) => new Promise((_, reject) => signal.addEventListener('abort', () => {
      heard = String(signal.reason.message)
      reject(signal.reason as Error)
    })) })
    const id = await enqueue('long')
    await until(id, one => one.state === 'leased')
    expect(await cancelJob(stores, id)).toBe(true)
    for (let n = 0; n < 200 && heard === ''; n++) await new Promise(resolve => setTimeout(resolve, 20))
    expect(heard).toBe('cancelled')
    expect((await jobOf(id)).state).toBe('cancelled')
    expect(await cancelJob(stores, id)).toBe(false)
  })

  it('goes back into the queue when the server stops, and is taken up at the next start, as what a dead server left is', async () => {
    start({ long: ({ signal }) => new Promise((_, reject) => signal.addEventListener('abort', () => reject(signal.reason as Error))) })
    const id = await enqueue('long')
    await until(id, one => one.state === 'leased')
    await runner!.stop()
    expect(await jobOf(id)).toMatchObject({ state: 'waiting', attempts: 0 })
    await leaseJob(stores, { owner: 'one that died', kinds: ['long'], now: Date.now(), until: Date.now() + 1e9 })
    start({ long: async () => 'done at last' })
    expect((await until(id, one => one.state === 'done')).result_json).toBe('"done at last"')
  })
})
