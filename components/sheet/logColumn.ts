/** A column of a log. */
export interface LogColumn {
  key: string
  label: string
  /** Stands on its own line in the head. */
  unit?: string
  /** `number`: right-aligned in the mono face, so that equal decimals stand under each other. */
  align?: 'left' | 'right' | 'number'
  /** The cell that names its row. */
  isHead?: boolean
  /** As narrow as its content. */
  isShut?: boolean
  /** Left out on a phone. */
  isDropped?: boolean
}

export const cellClass = (column: LogColumn): string | undefined =>
  [column.align === 'number' ? 'd' : column.align === 'right' ? 'r' : '', column.isShut ? 'shut' : '', column.isDropped ? 'drop' : ''].filter(Boolean).join(' ') || undefined
