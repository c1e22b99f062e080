import { labBody, type LabBody } from '#shared/schemas/lab'
import type { DraftAsked, DraftFitPart, DraftSource, DraftStep, LabDraft } from './labDraft'

/** A number as it is typed in a form, with a comma or a point; what is no number stays a text, which the schema then names. */
export function typedNumber(typed: string): number | string | undefined {
  const trimmed = typed.trim().replace('−', '-').replace(',', '.')
  if (trimmed === '') return undefined
  return /^-?(\d+\.?\d*|\.\d+)$/.test(trimmed) ? Number(trimmed) : typed
}

const milli = (typed: string): number | string | undefined => {
  const marks = typedNumber(typed)
  return typeof marks === 'number' ? Number((marks * 1000).toFixed(6)) : marks
}

function sourceBody(source: DraftSource): Record<string, unknown> {
  switch (source.from) {
    case 'share': return { from: 'share', column: source.read === 'lowBound' || source.read === 'highBound' ? source.column || 'height' : source.column, read: source.read }
    case 'text': return { from: 'text', value: typedNumber(source.value), unit: source.unit }
    case 'constant': return { from: 'constant', name: source.name }
    case 'step': return { from: 'step', key: source.key }
    case '': return {}
  }
}

function inputsBody(inputs: Readonly<Record<string, DraftSource>>): Record<string, unknown> {
  return Object.fromEntries(Object.entries(inputs).filter(([, source]) => source.from !== '').map(([name, source]) => [name, sourceBody(source)]))
}

function grantedBody(typed: { grantedAbsolute: string, grantedPercent?: string }): Record<string, unknown> {
  const absolute = typedNumber(typed.grantedAbsolute)
  const relative = typedNumber(typed.grantedPercent ?? '')
  return { ...(absolute === undefined ? {} : { absolute }), ...(relative === undefined ? {} : { relative: typeof relative === 'number' ? Number((relative / 100).toPrecision(12)) : relative }) }
}

function askedBody(asked: DraftAsked): Record<string, unknown> {
  return {
    pointsMilli: milli(asked.marks), quantity: asked.quantity, variant: asked.variant === '' ? null : asked.variant, unit: asked.unit, digits: typedNumber(asked.digits),
    granted: grantedBody(asked), slipMilli: milli(asked.slipMarks) ?? 0, digitsMilli: milli(asked.digitsMarks) ?? 0, inputs: inputsBody(asked.inputs),
    near: asked.nearMarks.trim() === '' && asked.nearWidths.trim() === '' ? null : { widths: typedNumber(asked.nearWidths), milli: milli(asked.nearMarks) },
  }
}

/** A number of a fit that has no marks is not asked. */
function partBody(part: DraftFitPart): Record<string, unknown> | null {
  return part.marks.trim() === '' ? null : { pointsMilli: milli(part.marks), digits: typedNumber(part.digits), granted: grantedBody(part), slipMilli: milli(part.slipMarks) ?? 0 }
}

function stepBody(step: DraftStep): Record<string, unknown> {
  const head = { key: step.key, kind: step.kind, title: step.title, text: step.text }
  switch (step.kind) {
    case 'number': return { ...head, ...askedBody(step) }
    case 'diagram': return { ...head, ...askedBody(step), divisions: Object.fromEntries(Object.entries(step.divisions).filter(([, { division }]) => division.trim() !== '').map(([name, { division, unit }]) => [name, { division: typedNumber(division), unit: unit || step.unit }])) }
    case 'reading': return { ...head, ...askedBody(step), accuracy: { station: typedNumber(step.stationAccuracy), own: typedNumber(step.ownAccuracy) } }
    case 'fit': return { ...head, inputs: inputsBody(step.inputs), parts: { slope: partBody(step.fit.slope), intercept: partBody(step.fit.intercept), error: partBody(step.fit.error) } }
    case 'table': return { ...head, rows: typedNumber(step.rows), columns: step.columns.map(column => ({ key: column.key, title: column.title, ...askedBody(column) })) }
    case 'choice': return { ...head, pointsMilli: milli(step.marks), isSeveral: step.isSeveral, options: step.options }
  }
}

export interface ReadDraft { body: LabBody | null, problems: { path: string, message: string }[] }

/** Reads the fields into a body by the schema that the server uses; what cannot be read is named with its field. */
export function readDraft(draft: LabDraft): ReadDraft {
  const read = labBody.safeParse({
    ...draft.parts, title: draft.title, text: draft.text,
    supply: draft.supply.map(item => ({ versionId: item.versionId, leg: item.leg, lowM: typedNumber(item.lowM), highM: typedNumber(item.highM) })),
    steps: draft.steps.map(stepBody),
  })
  if (read.success) return { body: read.data, problems: [] }
  return { body: null, problems: read.error.issues.map(issue => ({ path: issue.path.join('.'), message: wordsOf(issue) })) }
}

const choices: Readonly<Record<string, string>> = { title: 'Give it a title.', quantity: 'Choose a quantity.', unit: 'Choose a unit.', versionId: 'Choose a flight.', column: 'Choose a column.', text: 'Write what can be chosen.', name: 'Choose a constant.' }
const numbers = ['lowM', 'highM', 'value', 'digits', 'absolute', 'relative', 'widths', 'station', 'own', 'division']

function wordsOf(issue: { code?: string, message: string, path: PropertyKey[] }): string {
  const field = String(issue.path.at(-1))
  if (['pointsMilli', 'slipMilli', 'digitsMilli', 'milli'].includes(field)) return 'Marks from 0 to 1000, at most three decimals.'
  if (field === 'rows') return 'From 1 to 24 rows.'
  if (field === 'widths') return 'From 1 to 5 half-widths.'
  if (field === 'slope') return 'The slope is always asked: give it marks.'
  if (field === 'digits') return 'A whole number from 1 to 10.'
  if (issue.code === 'invalid_type' && numbers.includes(field)) return 'A number, such as 100 or 0.5.'
  if (field === 'text' && issue.code === 'too_big') return issue.message
  if (field === 'key' && issue.path.includes('inputs')) return 'Choose a step.'
  if (issue.code === 'too_small' || issue.code === 'invalid_type') return choices[field] ?? issue.message
  return issue.message
}
