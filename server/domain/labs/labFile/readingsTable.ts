import type { PracticeReadings } from '#shared/schemas/labParts'
import type { LabFileFault } from './fault'
import type { Block } from './layout'

type Table = Pick<PracticeReadings, 'columns' | 'rows'>

/** The readings of a practice as lines of commas, under names with units: "height [m],pressure [hPa]". */
export function writeReadings({ columns, rows }: Table): string {
  return [columns.map(({ quantity, unit }) => `${quantity} [${unit}]`).join(','), ...rows.map(row => row.join(','))].join('\n')
}

export function readReadings({ line, source }: Block): { table: Table, faults: LabFileFault[] } {
  const [head = '', ...rest] = source.replace(/\n$/, '').split('\n')
  const faults: LabFileFault[] = []
  const columns = head.split(',').map((name) => {
    const found = /^\s*([a-z][a-z0-9-]*) \[(.+)\]\s*$/.exec(name)
    if (!found) faults.push({ line, message: `“${name.trim()}” is no column: a column is a quantity with its unit, such as “height [m]”.` })
    return { quantity: found?.[1] ?? '', unit: found?.[2] ?? '' }
  })
  const rows = rest.map((text, at) => {
    const cells = text.split(',').map(cell => cell.trim())
    if (cells.length !== columns.length) faults.push({ line: line + at + 1, message: `This row has ${cells.length} cells, and there are ${columns.length} columns.` })
    return cells
  })
  return { table: { columns, rows }, faults }
}
