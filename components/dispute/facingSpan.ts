/**
 * How far the bar's axis reaches from its middle on facing leaves: far enough to show a value that lies near,
 * never so far that the band becomes a line; what lies beyond is drawn off the scale.
 */
export function largeSpanOf(bar: { low: number, center: number, high: number, value: number | null }): number {
  const half = Math.max(bar.high - bar.center, bar.center - bar.low)
  const away = bar.value === null ? 0 : Math.abs(bar.value - bar.center)
  return away <= 4 * half ? Math.max(1.9 * half, 1.15 * away) : 1.9 * half
}
