const fixed = Array.from({ length: 27 }, (_, at) => at - 12).map(hours => hours === 0 ? 'UTC' : `UTC${hours < 0 ? '-' : '+'}${String(Math.abs(hours)).padStart(2, '0')}:00`)

/** Zones to choose from: the course's own and UTC first, then fixed offsets, then all names. */
export function allZones(own: string): string[] {
  return [...new Set([own, 'UTC', ...fixed, ...Intl.supportedValuesOf('timeZone')])]
}
