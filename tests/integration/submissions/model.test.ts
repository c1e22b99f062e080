import fc from 'fast-check'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { DomainError } from '#shared/errors'
import type { OpenDatabase } from '../../../server/db/open'
import type { Judging } from '../../../server/domain/submissions/submitLab'
import { openTemporary } from '../../fixtures/openTemporary'
import { referenceIn } from '../../fixtures/reference'
import { handIn } from '../../fixtures/submitting'
import { workingCourse, type WorkingCourse } from '../../fixtures/workingCourse'

/**
 * R6 as a model: whatever students send, in whatever order and however often, there is one submission for each person and key,
 * every answer to the same request is the same receipt, and another body under a used key is refused.
 */
let stores: OpenDatabase & { remove: () => Promise<void> }
let course: WorkingCourse
let judging: Judging
const students = 4
const at = Date.parse('2026-10-15T12:00:00Z')

beforeAll(async () => {
  stores = await openTemporary()
  course = await workingCourse(stores, { students, attempts: 20, times: { zone: 'UTC', opens: '2026-10-12T08:00', due: '2026-10-16T17:00' }, lateRule: { kind: 'none' } })
  judging = { reference: await referenceIn(stores.write), loadShare: async shareId => course.loaded(shareId) }
})
afterAll(() => stores.remove())

const request = fc.record({ no: fc.nat(students - 1), key: fc.nat(3), body: fc.nat(1), wait: fc.nat(3) })
type Request = { no: number, key: number, body: number, wait: number }

let run = 0
async function send({ no, key, body, wait }: Request): Promise<string> {
  for (let turns = 0; turns < wait; turns++) await new Promise(setImmediate)
  try {
    return (await handIn(stores, judging, course, { no, key: `run-${run}-key-${key}`, answers: { rate: `${4 + body}.50 K/km` }, at })).receipt.no
  }
  catch (error) {
    if (error instanceof DomainError) return error.code
    throw error
  }
}

describe('R6: any interleaving of requests', () => {
  it('is one submission for each person and key', async () => {
    await fc.assert(fc.asyncProperty(fc.array(request, { minLength: 2, maxLength: 24 }), async (requests) => {
      run++
      const answers = await Promise.all(requests.map(send))
      const stored = await stores.read.selectFrom('submission').select(['by_membership_id', 'request_key', 'receipt_no', 'attempt', 'seq']).orderBy('seq').execute()
      expect(stored.map(row => row.seq)).toEqual(stored.map((_, index) => index + 1))
      for (const no of course.students.keys()) {
        const own = stored.filter(row => row.by_membership_id === `m-${no}`)
        expect(own.map(row => row.attempt)).toEqual(own.map((_, index) => index + 1))
      }
      const groups = new Map<string, { request: Request, answer: string }[]>()
      requests.forEach((sent, index) => groups.set(`${sent.no} ${sent.key}`, [...groups.get(`${sent.no} ${sent.key}`) ?? [], { request: sent, answer: answers[index]! }]))
      for (const group of groups.values()) {
        const { no, key } = group[0]!.request
        const rows = stored.filter(row => row.by_membership_id === `m-${no}` && row.request_key === `run-${run}-key-${key}`)
        const receipts = new Set(group.filter(each => each.answer.startsWith('AS240-')).map(each => each.answer))
        const refused = group.filter(each => !each.answer.startsWith('AS240-')).map(each => each.answer)
        if (rows.length === 0) expect(new Set(refused)).toEqual(new Set(['attempts_used']))
        else {
          expect(rows).toHaveLength(1)
          expect([...receipts]).toEqual([rows[0]!.receipt_no])
          const bodies = new Set(group.filter(each => each.answer.startsWith('AS240-')).map(each => each.request.body))
          expect(bodies.size).toBe(1)
          for (const code of refused) expect(['request_key_reused', 'attempts_used']).toContain(code)
        }
      }
    }), { numRuns: 60 })
  }, 240_000)
})
