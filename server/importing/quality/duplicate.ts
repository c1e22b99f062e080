/** Marks a row that has the same instant as the one before it. Both stay. */
export function markDuplicate(time: Float64Array, flags: readonly Uint8Array[], bit: number, before: number | null): number | null {
  let last = before
  for (let row = 0; row < time.length; row += 1) {
    const at = time[row]!
    if (last === at) for (const column of flags) column[row]! |= bit
    last = at
  }
  return last
}
