/**
 * Wall times of a zone as instants. A zone is `UTC`, a fixed offset (`UTC-07:00`) or a name of the zone database.
 * The changes of a year are looked up once; after that a wall time costs a few comparisons.
 */
export interface Zone {
  name: string
  /** Instants at which clocks of this zone show the wall time: none in a gap, two in a doubled hour, else one. */
  instantsOf: (wallMs: number) => readonly number[]
}

const fixedOffset = /^(?:UTC|GMT)(?:([+-])(\d{1,2})(?::?([0-5]\d))?)?$/

/** @returns null where the zone is unknown. */
export function findZone(name: string): Zone | null {
  const fixed = fixedOffset.exec(name)
  if (fixed) {
    const minutes = Number(fixed[2] ?? 0) * 60 + Number(fixed[3] ?? 0)
    if (minutes > 15 * 60) return null
    const offset = (fixed[1] === '-' ? -1 : 1) * minutes * 60_000
    return { name, instantsOf: wallMs => [wallMs - offset] }
  }
  const offsetAt = offsetsOf(name)
  if (!offsetAt) return null
  const years = new Map<number, readonly Span[]>()
  return {
    name,
    instantsOf(wallMs) {
      const year = new Date(wallMs).getUTCFullYear()
      let spans = years.get(year)
      if (!spans) {
        spans = spansOf(year, offsetAt)
        years.set(year, spans)
      }
      const found: number[] = []
      for (const span of spans) {
        const instant = wallMs - span.offset
        if (instant >= span.from && instant < span.to) found.push(instant)
      }
      return found
    },
  }
}

interface Span { from: number, to: number, offset: number }
const dayMs = 86_400_000

/** Stretches of equal offset that touch a year. */
function spansOf(year: number, offsetAt: (instant: number) => number): Span[] {
  const start = Date.UTC(year, 0, 1) - 2 * dayMs
  const end = Date.UTC(year + 1, 0, 1) + 2 * dayMs
  const spans: Span[] = []
  let from = start
  let offset = offsetAt(start)
  for (let at = start; at < end; at += dayMs) {
    const next = Math.min(at + dayMs, end)
    const after = offsetAt(next)
    if (after === offset) continue
    let low = at
    let high = next
    while (high - low > 1000) {
      const middle = Math.floor((low + high) / 2000) * 1000
      if (offsetAt(middle) === offset) low = middle
      else high = middle
    }
    spans.push({ from, to: high, offset })
    from = high
    offset = after
  }
  spans.push({ from, to: end, offset })
  return spans
}

function offsetsOf(name: string): ((instant: number) => number) | null {
  let format: Intl.DateTimeFormat
  try {
    format = new Intl.DateTimeFormat('en-US', { timeZone: name, hourCycle: 'h23', year: 'numeric', month: 'numeric', day: 'numeric', hour: 'numeric', minute: 'numeric', second: 'numeric', era: 'short' })
  }
  catch {
    return null
  }
  return (instant) => {
    const parts: Partial<Record<Intl.DateTimeFormatPartTypes, string>> = {}
    for (const part of format.formatToParts(instant)) parts[part.type] = part.value
    const wall = Date.UTC(Number(parts.year), Number(parts.month) - 1, Number(parts.day), Number(parts.hour), Number(parts.minute), Number(parts.second))
    return wall - Math.floor(instant / 1000) * 1000
  }
}
