import { expect, it } from 'vitest'
import { newId } from '../../../../server/domain/ids'

it('gives a UUIDv7 of its instant, and none twice, however many are asked for within a millisecond', () => {
  const at = Date.UTC(2026, 9, 14, 16)
  const ids = Array.from({ length: 20_000 }, () => newId(at))
  expect(new Set(ids).size).toBe(ids.length)
  expect(new Set(ids.map(id => id.slice(24))).size).toBe(ids.length) // the random part alone tells them apart
  expect(ids.every(id => /^[0-9a-f]{8}-[0-9a-f]{4}-7[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/.test(id))).toBe(true)
  expect(Number.parseInt(ids[0]!.replaceAll('-', '').slice(0, 12), 16)).toBe(at)
})
