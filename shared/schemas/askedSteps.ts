import type { ChoiceStep, DiagramStep, FitStep, InputSource, LabStep, NumberStep, ReadingStep, TableStep } from './steps'

/**
 * What a lab asks, one entry each: a step as it is written asks once, a fit for its slope, intercept and standard error, a table for each of its
 * cells. Each is answered, judged, marked and objected to by itself, under its own key.
 */

/** The step that an entry is a part of, and its place there. */
export interface AskedBlock { key: string, title: string, part: string, row: number | null }

export interface AskedNumber extends Omit<NumberStep, 'kind'> {
  kind: 'number' | 'diagram' | 'reading' | 'fit' | 'table'
  block: AskedBlock | null
  /** Divisions of the axes from which it is read. */
  divisions: DiagramStep['divisions']
  /** Half-widths of the station's and of the student's own instrument, in `unit`. */
  accuracy: ReadingStep['accuracy'] | null
}
export interface AskedChoice extends ChoiceStep { block: null }
export type AskedStep = AskedNumber | AskedChoice

const plain = { block: null, divisions: {}, accuracy: null }

export function askedOf(step: LabStep): AskedStep[] {
  switch (step.kind) {
    case 'number': return [{ ...step, ...plain }]
    case 'diagram': return [{ ...step, ...plain, divisions: step.divisions }]
    case 'reading': return [{ ...step, ...plain, accuracy: step.accuracy }]
    case 'choice': return [{ ...step, block: null }]
    case 'fit': return partsOfFit(step)
    case 'table': return cellsOfTable(step)
  }
}

/** Everything that a lab asks, in its order. */
export const askedSteps = (body: { steps: readonly LabStep[] }): AskedStep[] => body.steps.flatMap(askedOf)
export const askedNumbers = (body: { steps: readonly LabStep[] }): AskedNumber[] => askedSteps(body).filter(isNumber)
export const isNumber = (step: AskedStep): step is AskedNumber => step.kind !== 'choice'

const fitParts = [
  { part: 'slope', title: 'lapse rate', quantity: 'lapse-rate-least-squares', unit: 'K/km' },
  { part: 'intercept', title: 'temperature at height 0', quantity: 'fitted-temperature-at-zero-height', unit: 'Cel' },
  { part: 'error', title: 'standard error of the lapse rate', quantity: 'lapse-rate-standard-error', unit: 'K/km' },
] as const

function partsOfFit(step: FitStep): AskedNumber[] {
  return fitParts.flatMap(({ part, title, quantity, unit }, at): AskedNumber[] => {
    const wanted = step.parts[part]
    if (!wanted) return []
    return [{
      ...plain, key: `${step.key}-${part}`, kind: 'fit', title: `${step.title}: ${title}`, text: at === 0 ? step.text : '', quantity, variant: null, inputs: step.inputs, unit,
      pointsMilli: wanted.pointsMilli, digits: wanted.digits, granted: wanted.granted, slipMilli: wanted.slipMilli, digitsMilli: 0, near: null, block: { key: step.key, title: step.title, part: title, row: null },
    }]
  })
}

function cellsOfTable(step: TableStep): AskedNumber[] {
  return Array.from({ length: step.rows }, (_, row) => step.columns.map(({ key, title, ...column }, at): AskedNumber => ({
    ...column, ...plain, key: `${step.key}-${row + 1}-${key}`, kind: 'table', title: `${step.title}: ${title}, row ${row + 1}`, text: row === 0 && at === 0 ? step.text : '',
    inputs: Object.fromEntries(Object.entries(column.inputs).map(([name, source]) => [name, inRow(source, row + 1, step.rows, step)])),
    // Marks of a column are for all its rows: the parts add up to them exactly.
    pointsMilli: partOf(column.pointsMilli, row, step.rows), slipMilli: partOf(column.slipMilli, row, step.rows), digitsMilli: partOf(column.digitsMilli, row, step.rows),
    near: column.near && { ...column.near, milli: partOf(column.near.milli, row, step.rows) },
    block: { key: step.key, title: step.title, part: title, row: row + 1 },
  }))).flat()
}

/** A source as one row of a table takes it: its own row of the share, and another column of the same row. */
function inRow(source: InputSource, no: number, of: number, step: TableStep): InputSource {
  if (source.from === 'share' && source.read === 'row') return { ...source, row: { no, of } }
  if (source.from === 'step' && step.columns.some(column => column.key === source.key)) return { from: 'step', key: `${step.key}-${no}-${source.key}` }
  return source
}

/** Thousandths split over rows so that they add up: the first rows take what remains. */
const partOf = (milli: number, row: number, rows: number): number => Math.floor(milli / rows) + (row < milli % rows ? 1 : 0)
