/**
 * Which of some pieces of work, ordered by their marks, make a sample: the lowest, the highest, and between them at even distances.
 * @example pieceNumbers(9, 3) // [0, 4, 8]
 */
export function pieceNumbers(count: number, most: number): number[] {
  if (count <= most) return Array.from({ length: count }, (_, at) => at)
  return Array.from({ length: most }, (_, at) => Math.round(at * (count - 1) / (most - 1)))
}
