import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { editTerm } from '../../../server/domain/terms/editTerm'
import { describeTerm } from '../../../server/domain/terms/describeTerm'
import { openTemporary } from '../../fixtures/openTemporary'
import { fall, inTerm, smallDepartment } from '../../fixtures/smallDepartment'

let db: Awaited<ReturnType<typeof openTemporary>>
let house: Awaited<ReturnType<typeof smallDepartment>>
beforeEach(async () => {
  db = await openTemporary()
  house = await smallDepartment(db)
})
afterEach(() => db.remove())

const edit = (name: string, seenVersion: number, zone = fall.zone) => editTerm(db, { ...house.asked, termId: house.termId, seenVersion, term: { ...fall, name, zone } }, inTerm)

describe('a term', () => {
  it('is changed by who saw it last; the second of two admins is told, and nothing of theirs is written', async () => {
    expect(await edit('Autumn of 2026', 1)).toEqual({ id: house.termId, version: 2 })
    await expect(edit('Fall again', 1)).rejects.toMatchObject({ code: 'changed_meanwhile', facts: { version: 2 } })
    expect(await describeTerm(db.read, house.termId)).toMatchObject({ name: 'Autumn of 2026', version: 2 })
  })
  it('keeps its zone once it runs', async () => {
    await expect(edit('Fall 2026', 1, 'America/New_York')).rejects.toMatchObject({ code: 'invalid' })
  })
})
