import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { DomainError } from '#shared/errors'
import type { OpenDatabase } from '../../../server/db/open'
import { checkTyped } from '../../../server/domain/submissions/checkTyped'
import { readDrafts } from '../../../server/domain/submissions/readDrafts'
import { saveDraft } from '../../../server/domain/submissions/saveDraft'
import { openTemporary } from '../../fixtures/openTemporary'
import { workingCourse } from '../../fixtures/workingCourse'

const now = Date.parse('2026-10-14T16:00:00Z')
let stores: OpenDatabase & { remove: () => Promise<void> }

beforeEach(async () => {
  stores = await openTemporary()
  await workingCourse(stores, { students: 2, times: { zone: 'America/Chicago', opens: '2026-10-12T08:00', due: '2026-10-16T17:00' }, lateRule: { kind: 'none' } })
})
afterEach(() => stores.remove())

const save = (typed: string, baseVersion: number, at = now, who = 0, stepKey = 'rate') => saveDraft(stores, { membershipId: `m-${who}`, shareId: 'share-0', stepKey, typed, baseVersion }, at)
const refusal = (promise: Promise<unknown>) => promise.then(() => null, (error: unknown) => error instanceof DomainError ? { code: error.code, facts: error.facts } : Promise.reject(error))

describe('a draft', () => {
  it('is saved as typed, version by version, and read back', async () => {
    expect(await save('9.8', 0)).toMatchObject({ version: 1, savedAt: '2026-10-14T16:00:00.000Z' })
    expect(await save('9.8 K/km', 1, now + 1000)).toMatchObject({ version: 2 })
    expect(await readDrafts(stores.read, 'share-0')).toEqual([{ stepKey: 'rate', typed: '9.8 K/km', version: 2, savedAt: '2026-10-14T16:00:01.000Z' }])
  })

  it('of one tab never overwrites that of another: the second is refused with the other text', async () => {
    await save('9.8', 0)
    await save('9.7', 1)
    expect(await refusal(save('6.5', 1))).toEqual({ code: 'changed_meanwhile', facts: { by: 'Another tab or device', typed: '9.7', version: 2, savedAt: '2026-10-14T16:00:00.000Z' } })
    expect((await readDrafts(stores.read, 'share-0'))[0]?.typed).toBe('9.7')
    expect(await save('6.5', 2)).toMatchObject({ version: 3 })
  })

  it('of two tabs at the same instant is saved once, and the other is told', async () => {
    const outcomes = await Promise.all([refusal(save('9.8', 0)), refusal(save('6.5', 0))])
    expect(outcomes.map(outcome => outcome?.code ?? null).sort()).toEqual(['changed_meanwhile', null].sort())
    expect((await readDrafts(stores.read, 'share-0'))[0]?.typed).toBe('9.8')
  })

  it('that was saved already is not a conflict when it is sent again', async () => {
    await save('9.8', 0)
    expect(await save('9.8', 0, now + 60_000)).toMatchObject({ version: 1, savedAt: '2026-10-14T16:00:00.000Z' })
  })

  it('is kept with whatever signs it holds', async () => {
    const typed = '−9,8 °C km⁻¹ \u202e<b>=1+1</b> 🪁'
    await save(typed, 0)
    expect((await readDrafts(stores.read, 'share-0'))[0]?.typed).toBe(typed)
  })

  it('of another student’s share, or of a step that is not there, is not found', async () => {
    expect((await refusal(save('1', 0, now, 1)))?.code).toBe('not_found')
    expect((await refusal(save('1', 0, now, 0, 'nothing')))?.code).toBe('not_found')
  })

  it('is refused before the lab opens and once it is withdrawn', async () => {
    expect((await refusal(save('1', 0, Date.parse('2026-10-12T12:00:00Z'))))?.code).toBe('lab_not_open')
    await stores.write(trx => trx.updateTable('posting').set({ state: 'withdrawn' }).execute())
    expect((await refusal(save('1', 0)))?.code).toBe('lab_withdrawn')
  })
})

describe('what was typed', () => {
  const check = (typed: string, stepKey = 'rate') => checkTyped(stores.read, { membershipId: 'm-0', shareId: 'share-0' }, { stepKey, typed }, now)

  it('is told back with its unit', async () => {
    expect(await check('0.98 K/100 m')).toEqual({ reading: 'ok', message: 'read as 9.8 K km⁻¹' })
  })

  it('of another kind of quantity is told so before submission', async () => {
    expect(await check('9.8 hPa')).toMatchObject({ reading: 'wrong_dimension' })
  })

  it('says the same whether it is right or wrong', async () => {
    const replies = await Promise.all(['6.50 K/km', '-6.50 K/km', '60.0 K/km'].map(typed => check(typed)))
    expect(replies.map(reply => [reply.reading, Object.keys(reply).sort().join()])).toEqual(Array.from({ length: 3 }, () => ['ok', 'message,reading']))
  })
})
