/** The flight drawn beside the sign-in: an invented morning, its knots chosen by hand as a night of clear sky leaves them. */
export const knots: readonly { height: number, temperature: number, isNamed: boolean }[] = [
  { height: 0, temperature: 4.0, isNamed: true }, // cooled ground
  { height: 40, temperature: 5.4, isNamed: false },
  { height: 80, temperature: 7.2, isNamed: false },
  { height: 130, temperature: 8.7, isNamed: true }, // top of the surface inversion
  { height: 450, temperature: 5.8, isNamed: true }, // yesterday's mixed layer
  { height: 520, temperature: 7.8, isNamed: true }, // capping inversion
  { height: 1040, temperature: 4.8, isNamed: true },
]

export interface DrawnPoint { x: number, y: number }

const size = { width: 700, ground: 690, top: 108 } as const
const heightTop = 1040

export const yOf = (height: number): number => size.ground - (height / heightTop) * (size.ground - size.top)
export const xOf = (temperature: number): number => 350 + (temperature - 4) * 40

/** A reading every 10 m: straight between knots, with the small unrest that a sonde shows. The same at each call and on every engine. */
export function drawnReadings(): { height: number, temperature: number }[] {
  const readings: { height: number, temperature: number }[] = []
  let seed = 31
  let unrest = 0
  for (let height = 0; height <= heightTop; height += 10) {
    const above = knots.findIndex(knot => knot.height >= height)
    const upper = knots[above] ?? knots[knots.length - 1]!
    const lower = knots[Math.max(0, above - 1)]!
    const share = upper.height === lower.height ? 1 : (height - lower.height) / (upper.height - lower.height)
    seed = (seed * 1103515245 + 12345) % 2147483648
    unrest = 0.6 * unrest + 0.26 * (seed / 2147483648 - 0.5)
    const isStill = height < 130 || knots.some(knot => knot.height === height)
    readings.push({ height, temperature: lower.temperature + share * (upper.temperature - lower.temperature) + (isStill ? 0 : unrest) })
  }
  return readings
}

export const pathOf = (points: readonly DrawnPoint[]): string => points.map((point, at) => `${at === 0 ? 'M' : 'L'}${point.x.toFixed(1)} ${point.y.toFixed(1)}`).join('')

/** A wind barb: 5 m/s a full feather, 2.5 a half; the staff points to where the wind comes from. */
export function barbPath(speed: number, length = 26): string {
  const halves = Math.round(speed / 2.5)
  let path = `M0 0V${-length}`
  let at = length
  for (let full = 0; full < Math.floor(halves / 2); full++) {
    path += `M0 ${-at}l9 -4`
    at -= 5
  }
  if (halves % 2 === 1) path += `M0 ${-(halves === 1 ? at - 5 : at)}l4.5 -2`
  return path
}

export const winds: readonly { height: number, speed: number, from: number }[] = [
  { height: 80, speed: 2.4, from: 214 }, { height: 240, speed: 5, from: 236 }, { height: 400, speed: 7.4, from: 246 },
  { height: 560, speed: 7.6, from: 252 }, { height: 720, speed: 9.6, from: 262 }, { height: 880, speed: 10.2, from: 264 }, { height: 1040, speed: 10.4, from: 262 },
]
