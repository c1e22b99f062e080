/** Marks rows that stood in the file before a row of earlier time: the clock stepped back. A file with the newest row first is in order too. */
export function markOrder(line: Float64Array, flags: readonly Uint8Array[], bit: number): void {
  let rising = 0
  for (let row = 1; row < line.length; row += 1) rising += line[row]! > line[row - 1]! ? 1 : -1
  const sign = rising >= 0 ? 1 : -1
  let most = Number.NEGATIVE_INFINITY
  for (let row = 0; row < line.length; row += 1) {
    const at = line[row]! * sign
    if (at < most) for (const column of flags) column[row]! |= bit
    else most = at
  }
}
