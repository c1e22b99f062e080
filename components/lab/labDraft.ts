import { labBody, type InputSource, type LabBody } from '#shared/schemas/lab'

/** What stands in the editor's fields: numbers as they were typed, so that nothing that cannot be read yet is lost. */
export interface DraftSource { from: '' | InputSource['from'], column: string, read: string, value: string, unit: string, name: string, key: string }
export interface DraftStep {
  key: string
  title: string
  text: string
  quantity: string
  variant: string
  inputs: Record<string, DraftSource>
  unit: string
  digits: string
  marks: string
  grantedAbsolute: string
  grantedPercent: string
  slipMarks: string
}
export interface DraftSupply { versionId: string, leg: string, lowM: string, highM: string }
export interface LabDraft { title: string, text: string, steps: DraftStep[], supply: DraftSupply[] }

export const emptySource = (): DraftSource => ({ from: '', column: '', read: 'layer', value: '', unit: '', name: '', key: '' })

export function draftOf(body: LabBody): LabDraft {
  return {
    title: body.title, text: body.text,
    supply: body.supply.map(item => ({ versionId: item.versionId, leg: item.leg, lowM: String(item.lowM), highM: String(item.highM) })),
    steps: body.steps.map(step => ({
      key: step.key, title: step.title, text: step.text, quantity: step.quantity, variant: step.variant ?? '', unit: step.unit, digits: String(step.digits),
      marks: String(step.pointsMilli / 1000), grantedAbsolute: text(step.granted.absolute), grantedPercent: step.granted.relative === undefined ? '' : String(percent(step.granted.relative)),
      slipMarks: step.slipMilli === 0 ? '' : String(step.slipMilli / 1000),
      inputs: Object.fromEntries(Object.entries(step.inputs).map(([name, source]) => [name, sourceDraft(source)])),
    })),
  }
}

const text = (value: number | undefined): string => value === undefined ? '' : String(value)
const percent = (fraction: number): number => Number((fraction * 100).toPrecision(12))

export function sourceDraft(source: InputSource): DraftSource {
  const draft = { ...emptySource(), from: source.from }
  switch (source.from) {
    case 'share': return { ...draft, column: source.column, read: source.read }
    case 'text': return { ...draft, value: String(source.value), unit: source.unit }
    case 'constant': return { ...draft, name: source.name }
    case 'step': return { ...draft, key: source.key }
  }
}

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

export interface ReadDraft { body: LabBody | null, problems: { path: string, message: string }[] }

/** Reads the fields into a body by the schema that the server uses; what cannot be read is named with its field. */
export function readDraft(draft: LabDraft): ReadDraft {
  const granted = (step: DraftStep) => {
    const absolute = typedNumber(step.grantedAbsolute)
    const relative = typedNumber(step.grantedPercent)
    return { ...(absolute === undefined ? {} : { absolute }), ...(relative === undefined ? {} : { relative: typeof relative === 'number' ? Number((relative / 100).toPrecision(12)) : relative }) }
  }
  const read = labBody.safeParse({
    title: draft.title, text: draft.text,
    supply: draft.supply.map(item => ({ versionId: item.versionId, leg: item.leg, lowM: typedNumber(item.lowM), highM: typedNumber(item.highM) })),
    steps: draft.steps.map(step => ({
      key: step.key, kind: 'number', title: step.title, text: step.text, pointsMilli: milli(step.marks), quantity: step.quantity, variant: step.variant === '' ? null : step.variant, unit: step.unit,
      digits: typedNumber(step.digits), granted: granted(step), slipMilli: milli(step.slipMarks) ?? 0,
      inputs: Object.fromEntries(Object.entries(step.inputs).filter(([, source]) => source.from !== '').map(([name, source]) => [name, sourceBody(source)])),
    })),
  })
  if (read.success) return { body: read.data, problems: [] }
  return { body: null, problems: read.error.issues.map(issue => ({ path: issue.path.join('.'), message: wordsOf(issue) })) }
}

const choices: Readonly<Record<string, string>> = { title: 'Give it a title.', quantity: 'Choose a quantity.', unit: 'Choose a unit.', versionId: 'Choose a flight.', column: 'Choose a column.', name: 'Choose a constant.' }
const numbers = ['lowM', 'highM', 'value', 'digits', 'absolute', 'relative']

function wordsOf(issue: { code?: string, message: string, path: PropertyKey[] }): string {
  const field = String(issue.path.at(-1))
  if (field === 'pointsMilli' || field === 'slipMilli') return 'Marks from 0 to 1000, at most three decimals.'
  if (field === 'digits') return 'A whole number from 1 to 10.'
  if (issue.code === 'invalid_type' && numbers.includes(field)) return 'A number, such as 100 or 0.5.'
  if (field === 'key' && issue.path.includes('inputs')) return 'Choose a step.'
  if (issue.code === 'too_small' || issue.code === 'invalid_type') return choices[field] ?? issue.message
  return issue.message
}

/** A key for a new step that no other has: from its title, else numbered. */
export function freeKey(title: string, taken: readonly string[]): string {
  const base = title.toLowerCase().normalize('NFKD').replace(/[^a-z0-9]+/g, '-').replace(/^[^a-z]+|-+$/g, '').slice(0, 30) || 'step'
  if (!taken.includes(base)) return base
  for (let no = 2; ; no++) if (!taken.includes(`${base}-${no}`)) return `${base}-${no}`
}

/** Problems whose path begins with this one, for the field they belong to. */
export function problemAt(problems: readonly { path: string, message: string }[], path: string): string | undefined {
  return problems.find(problem => problem.path === path || problem.path.startsWith(`${path}.`))?.message
}
