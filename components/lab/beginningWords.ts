import type { LabKind } from '#shared/schemas/labParts'
import { findMeasuredQuantity } from '#shared/schemas/measured'

const kinds: Readonly<Record<LabKind, string>> = {
  'station': 'station', 'profile': 'profile', 'parcel': 'parcel', 'first-law': 'first law', 'moisture': 'moisture', 'instruments': 'instruments', 'surface-layer': 'surface layer', 'field-work': 'field work',
}
export const kindWords = (kind: LabKind | null): string => kind === null ? '' : kinds[kind]

/** "1 h 50 min", "45 min". */
export function minutesText(minutes: number | null): string {
  if (minutes === null) return ''
  const [hours, rest] = [Math.floor(minutes / 60), minutes % 60]
  return [hours > 0 ? `${hours} h` : '', rest > 0 ? `${rest} min` : ''].filter(Boolean).join(' ')
}

/** What a course's flights give for a ready lab, or what they lack. */
export function layerWords(lab: { layers: number, needs: readonly string[], missing: readonly string[] }, flights: number): string {
  const names = (keys: readonly string[]) => keys.map(key => findMeasuredQuantity(key)?.label ?? key).join(', ')
  if (lab.layers > 0) return lab.layers === 1 ? 'one layer fits' : `${lab.layers} layers fit`
  if (flights === 0) return `no flight yet; needs ${names(lab.needs)}`
  return lab.missing.length > 0 ? `no flight has ${names(lab.missing)}` : 'no layer of these flights fits; choose one yourself'
}
