/** A class against the band: each student measured from the worked value of their own share, in half-widths of their own band. */
export interface ClassValue {
  /** −1 and 1 are the edges of the band. */
  distance: number
  /** The slip that explains it, where one does. */
  slip?: string | null
}

export type Side = 'in' | 'above' | 'below'
export interface SwarmDot { x: number, y: number, side: Side }
export interface SwarmBar { y: number, height: number, width: number, count: number, side: Side, from: number }
export interface OffScale { slip: string, count: number, side: 'above' | 'below' }

export interface Swarm {
  /** Each value a dot; empty where there are too many and bars stand instead. */
  dots: SwarmDot[]
  bars: SwarmBar[]
  /** Values beyond the axis, grouped by slip, most first. */
  off: OffScale[]
  within: number
  all: number
}

export interface SwarmBox {
  /** Pixels for one half-width. */
  unit: number
  /** Half-widths that the axis reaches on either side. */
  reach: number
  dot: number
  width: number
}

/** Above this many students dots give way to bars. */
export const mostDots = 120
/** A bar counts the values of a tenth of a half-width. */
export const barStep = 0.1

const sideOf = (distance: number): Side => distance > 1 ? 'above' : distance < -1 ? 'below' : 'in'

/** Where each value stands: y in pixels above the worked value's line is negative, as on a screen. */
export function swarm(values: readonly ClassValue[], box: SwarmBox): Swarm {
  const shown = values.filter(value => Math.abs(value.distance) <= box.reach)
  const drawn = values.length > mostDots ? { dots: [], bars: barsOf(shown, box) } : { dots: dotsOf(shown, box), bars: [] }
  return { ...drawn, off: offScale(values, box.reach), within: values.filter(value => sideOf(value.distance) === 'in').length, all: values.length }
}

/** Values in rows one dot high; a row fills from the axis to the right, and goes tighter where it would not fit. */
function dotsOf(values: readonly ClassValue[], box: SwarmBox): SwarmDot[] {
  const rows = new Map<string, ClassValue[]>()
  for (const value of values) {
    const key = `${sideOf(value.distance)} ${Math.round(value.distance * box.unit / box.dot)}`
    rows.set(key, [...(rows.get(key) ?? []), value])
  }
  return [...rows.values()].flatMap((row) => {
    const step = Math.min(box.dot, (box.width - box.dot) / Math.max(1, row.length - 1))
    const sorted = row.toSorted((a, b) => Math.abs(a.distance) - Math.abs(b.distance))
    const y = -Math.round(sorted[0]!.distance * box.unit / box.dot) * box.dot
    return sorted.map((value, at) => ({ x: box.dot / 2 + at * step, y, side: sideOf(value.distance) }))
  })
}

function barsOf(values: readonly ClassValue[], box: SwarmBox): SwarmBar[] {
  const counts = new Map<number, ClassValue[]>()
  for (const value of values) {
    const bin = binOf(value.distance)
    counts.set(bin, [...(counts.get(bin) ?? []), value])
  }
  const most = Math.max(1, ...[...counts.values()].map(held => held.length))
  return [...counts.entries()].map(([bin, held]) => {
    const from = bin * barStep
    return { from, count: held.length, side: sideOf(held[0]!.distance), y: -(from + barStep) * box.unit, height: barStep * box.unit, width: box.width * held.length / most }
  }).toSorted((a, b) => b.from - a.from)
}

/** The bin of a value. An edge belongs to the band, so 1 is counted with what is just below it, and −1 with what is just above. */
function binOf(distance: number): number {
  const bin = Math.floor(distance / barStep + 1e-9)
  return distance === 1 ? bin - 1 : bin
}

function offScale(values: readonly ClassValue[], reach: number): OffScale[] {
  const groups = new Map<string, OffScale>()
  for (const value of values) {
    if (Math.abs(value.distance) <= reach) continue
    const side = value.distance > 0 ? 'above' : 'below'
    const slip = value.slip ?? 'no slip found'
    const group = groups.get(`${side} ${slip}`) ?? { slip, side, count: 0 }
    groups.set(`${side} ${slip}`, { ...group, count: group.count + 1 })
  }
  return [...groups.values()].toSorted((a, b) => b.count - a.count || a.slip.localeCompare(b.slip))
}
