import { expect, it } from 'vitest'
import { pieceNumbers } from '../../../../server/domain/records/samplePieces'

it('takes the lowest, the highest and even steps between, each once', () => {
  expect(pieceNumbers(9, 3)).toEqual([0, 4, 8])
  for (let count = 0; count < 60; count++) {
    const picked = pieceNumbers(count, 5)
    expect(new Set(picked).size).toBe(Math.min(count, 5))
    if (count > 0) expect([picked[0], picked.at(-1)]).toEqual([0, count - 1])
  }
})
