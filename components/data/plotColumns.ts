import type { VersionFacts } from '#shared/schemas/dataReplies'

export type VersionColumn = VersionFacts['columns'][number]

/** Readings that can be drawn through time, what people look at first standing first. */
const order = ['air-temperature', 'relative-humidity', 'pressure', 'dewpoint', 'wind-speed', 'global-radiation', 'wind-direction', 'precipitation', 'wind-gust']
const rank = (column: VersionColumn) => {
  const at = order.indexOf(column.quantity)
  return at < 0 ? order.length : at
}
export const drawable = (columns: readonly VersionColumn[]): VersionColumn[] => columns.filter(column => column.role === 'value').toSorted((a, b) => rank(a) - rank(b) || a.no - b.no)

/** The columns drawn at first: the first two quantities, with every column that measures the first (three heights of a tower). */
export function firstDrawn(columns: readonly VersionColumn[]): number[] {
  const all = drawable(columns)
  const quantities = [...new Set(all.map(column => column.quantity))].slice(0, 2)
  return all.filter(column => quantities.includes(column.quantity)).slice(0, 4).map(column => column.no)
}

export const columnWords = (column: VersionColumn): string => column.heightM === null ? column.name : `${column.name} at ${column.heightM} m`

/** Columns of one quantity and unit share a panel. */
export function panelsOf<T extends VersionColumn>(columns: readonly T[]): T[][] {
  const panels = new Map<string, T[]>()
  for (const column of columns) {
    const key = `${column.quantity === 'other' ? column.no : column.quantity} ${column.unit}`
    panels.set(key, [...panels.get(key) ?? [], column])
  }
  return [...panels.values()]
}
