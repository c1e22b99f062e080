/**
 * The k-th smallest (from 0) of the first `count` values; their order is lost. Hoare's selection with the median of three: no copy, no full sort.
 * @example kthSmallest(Float64Array.of(3, 1, 2), 3, 1) // 2
 */
export function kthSmallest(values: Float64Array, count: number, k: number): number {
  let low = 0, high = count - 1
  while (low < high) {
    const middle = low + ((high - low) >> 1)
    const pivot = medianOfThree(values[low] ?? 0, values[middle] ?? 0, values[high] ?? 0)
    let left = low, right = high
    while (left <= right) {
      while ((values[left] ?? 0) < pivot) left++
      while ((values[right] ?? 0) > pivot) right--
      if (left > right) break
      const kept = values[left] ?? 0
      values[left] = values[right] ?? 0
      values[right] = kept
      left++
      right--
    }
    if (k <= right) high = right
    else if (k >= left) low = left
    else break
  }
  return values[k] ?? NaN
}

const medianOfThree = (a: number, b: number, c: number): number => Math.max(Math.min(a, b), Math.min(Math.max(a, b), c))

/** The value at a place between two ranks (from 0), by linear interpolation. */
export function atRank(values: Float64Array, count: number, rank: number): number {
  const whole = Math.floor(rank)
  const below = kthSmallest(values, count, whole)
  const rest = rank - whole
  return rest === 0 ? below : below + rest * (kthSmallest(values, count, whole + 1) - below)
}
