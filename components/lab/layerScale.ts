import { scaleLinear } from 'd3-scale'

export interface ProfilePoint { heightM: number, temperatureC: number, leg: 'up' | 'down' }

/** Scales and paths of a flight's profile at a given size; height is always upward. */
export function layerFigure(profile: readonly ProfilePoint[], size: { width: number, height: number, left: number, right: number, top: number, bottom: number }) {
  const heights = profile.map(point => point.heightM)
  const temperatures = profile.map(point => point.temperatureC)
  const lowest = Math.min(...heights)
  const highest = Math.max(...heights)
  // Heights above the ground begin at it; heights above the sea begin where the flight did.
  const z = scaleLinear().domain([lowest < 0.2 * highest ? Math.min(0, lowest) : lowest, Math.max(lowest + 1, highest)]).nice(6).range([size.height - size.bottom, size.top])
  const t = scaleLinear().domain([Math.min(...temperatures), Math.max(...temperatures)]).nice(5).range([size.left, size.width - size.right])
  const path = (leg: 'up' | 'down') => profile.filter(point => point.leg === leg).map((point, at) => `${at === 0 ? 'M' : 'L'}${t(point.temperatureC).toFixed(1)} ${z(point.heightM).toFixed(1)}`).join('')
  return { z, t, up: path('up'), down: path('down'), zTicks: z.ticks(6), tTicks: t.ticks(5) }
}

/** The rows of a leg that lie in a layer, as far as the thinned profile shows them. */
export function inLayer(profile: readonly ProfilePoint[], leg: string, lowM: number, highM: number): number {
  return profile.filter(point => (leg === 'all' || point.leg === leg) && point.heightM >= lowM && point.heightM <= highM).length
}
