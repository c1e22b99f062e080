import type { SupplyItem } from '#shared/schemas/lab'

export type Leg = SupplyItem['leg']

/**
 * Which rows of a flight belong to a leg. The flight turns at the first row of its greatest height:
 * *up* is that row and all before it, *down* all after it, *all* every row. A row without a height belongs to no leg.
 * Rows keep their order; a leg is never chosen by the sign of single steps, since a tether sways and stops.
 */
export function rowsOfLeg(heights: readonly (number | null)[], leg: Leg): boolean[] {
  const turn = turnOf(heights)
  return heights.map((height, row) => height !== null && (leg === 'all' || (leg === 'up' ? row <= turn : row > turn)))
}

/** The first row of the greatest height; −1 where no row has one. */
export function turnOf(heights: readonly (number | null)[]): number {
  let turn = -1
  let greatest = -Infinity
  heights.forEach((height, row) => {
    if (height !== null && height > greatest) {
      greatest = height
      turn = row
    }
  })
  return turn
}

export const legWords: Record<Leg, string> = {
  up: 'the way up: rows to the first of the greatest height',
  down: 'the way down: rows after the first of the greatest height',
  all: 'the whole flight, up and down',
}

/** For lists and headings. */
export const legNames: Record<Leg, string> = { up: 'up', down: 'down', all: 'up and down' }
