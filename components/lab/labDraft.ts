import type { LabBody } from '#shared/schemas/lab'
import type { FitStep, InputSource, LabStep, NumberStep, StepKind } from '#shared/schemas/steps'

/** What stands in the editor's fields: numbers as they were typed, so that nothing that cannot be read yet is lost. */
export interface DraftSource { from: '' | InputSource['from'], column: string, read: string, value: string, unit: string, name: string, key: string }

/** A number that is asked by a quantity: a step of its own, or a column of a table. */
export interface DraftAsked {
  quantity: string
  variant: string
  inputs: Record<string, DraftSource>
  unit: string
  digits: string
  marks: string
  grantedAbsolute: string
  grantedPercent: string
  slipMarks: string
  digitsMarks: string
  nearWidths: string
  nearMarks: string
}
export interface DraftColumn extends DraftAsked { key: string, title: string }
export interface DraftOption { key: string, text: string, isRight: boolean, why: string }
/** One of the numbers of a fit; it is not asked where it has no marks. */
export interface DraftFitPart { marks: string, digits: string, grantedAbsolute: string, grantedPercent: string, slipMarks: string }
export interface DraftDivision { division: string, unit: string }

export interface DraftStep extends DraftAsked {
  key: string
  kind: StepKind
  title: string
  text: string
  divisions: Record<string, DraftDivision>
  stationAccuracy: string
  ownAccuracy: string
  fit: { slope: DraftFitPart, intercept: DraftFitPart, error: DraftFitPart }
  rows: string
  columns: DraftColumn[]
  isSeveral: boolean
  options: DraftOption[]
}
export interface DraftSupply { versionId: string, leg: string, lowM: string, highM: string }
/** What a lab carries beside what the editor's fields show: kept as it is. */
export type DraftParts = Omit<LabBody, 'title' | 'text' | 'steps' | 'supply'>
export interface LabDraft { title: string, text: string, steps: DraftStep[], supply: DraftSupply[], parts: DraftParts }

export const emptySource = (): DraftSource => ({ from: '', column: '', read: 'layer', value: '', unit: '', name: '', key: '' })
export const emptyAsked = (): DraftAsked => ({ quantity: '', variant: '', inputs: {}, unit: '', digits: '3', marks: '1', grantedAbsolute: '', grantedPercent: '', slipMarks: '', digitsMarks: '', nearWidths: '', nearMarks: '' })
const emptyPart = (marks: string): DraftFitPart => ({ marks, digits: '3', grantedAbsolute: '', grantedPercent: '', slipMarks: '' })
const fromLayer = (column: string): DraftSource => ({ ...emptySource(), from: 'share', column, read: 'layer' })

/** A new step of a kind, with what it nearly always has. */
export function emptyStep(key: string, kind: StepKind): DraftStep {
  return {
    ...emptyAsked(), key, kind, title: '', text: '', divisions: kind === 'diagram' ? { result: { division: '', unit: '' } } : {}, stationAccuracy: '', ownAccuracy: '',
    inputs: kind === 'fit' ? { height: fromLayer('height'), temperature: fromLayer('air-temperature') } : {},
    fit: { slope: emptyPart('1'), intercept: emptyPart(''), error: emptyPart('') },
    rows: '3', columns: kind === 'table' ? [{ ...emptyAsked(), key: 'a', title: '' }] : [],
    isSeveral: false, options: kind === 'choice' ? [{ key: 'a', text: '', isRight: true, why: '' }, { key: 'b', text: '', isRight: false, why: '' }] : [],
  }
}

export function draftOf({ title, text, steps, supply, ...parts }: LabBody): LabDraft {
  return {
    title, text, parts,
    supply: supply.map(item => ({ versionId: item.versionId, leg: item.leg, lowM: String(item.lowM), highM: String(item.highM) })),
    steps: steps.map(stepDraft),
  }
}

function stepDraft(step: LabStep): DraftStep {
  const draft: DraftStep = { ...emptyStep(step.key, step.kind), title: step.title, text: step.text }
  switch (step.kind) {
    case 'number': return { ...draft, ...askedDraft(step) }
    case 'diagram': return { ...draft, ...askedDraft(step), divisions: Object.fromEntries(Object.entries(step.divisions).map(([name, { division, unit }]) => [name, { division: String(division), unit }])) }
    case 'reading': return { ...draft, ...askedDraft(step), stationAccuracy: String(step.accuracy.station), ownAccuracy: String(step.accuracy.own) }
    case 'fit': return { ...draft, inputs: sourcesDraft(step.inputs), fit: { slope: partDraft(step.parts.slope), intercept: partDraft(step.parts.intercept), error: partDraft(step.parts.error) } }
    case 'table': return { ...draft, rows: String(step.rows), columns: step.columns.map(column => ({ ...askedDraft(column), key: column.key, title: column.title })) }
    case 'choice': return { ...draft, marks: marks(step.pointsMilli), isSeveral: step.isSeveral, options: step.options.map(option => ({ ...option })) }
  }
}

type Asked = Pick<NumberStep, 'quantity' | 'variant' | 'inputs' | 'unit' | 'digits' | 'pointsMilli' | 'granted' | 'slipMilli' | 'digitsMilli' | 'near'>

function askedDraft(step: Asked): DraftAsked {
  return {
    quantity: step.quantity, variant: step.variant ?? '', unit: step.unit, digits: String(step.digits), marks: marks(step.pointsMilli),
    grantedAbsolute: text(step.granted.absolute), grantedPercent: step.granted.relative === undefined ? '' : String(percent(step.granted.relative)),
    slipMarks: some(step.slipMilli), digitsMarks: some(step.digitsMilli), nearWidths: step.near ? String(step.near.widths) : '', nearMarks: step.near ? some(step.near.milli) : '',
    inputs: sourcesDraft(step.inputs),
  }
}

const partDraft = (part: FitStep['parts']['slope'] | null): DraftFitPart => part ? { marks: marks(part.pointsMilli), digits: String(part.digits), grantedAbsolute: text(part.granted.absolute), grantedPercent: part.granted.relative === undefined ? '' : String(percent(part.granted.relative)), slipMarks: some(part.slipMilli) } : emptyPart('')
const sourcesDraft = (inputs: Readonly<Record<string, InputSource>>): Record<string, DraftSource> => Object.fromEntries(Object.entries(inputs).map(([name, source]) => [name, sourceDraft(source)]))
const marks = (milli: number): string => String(milli / 1000)
const some = (milli: number): string => milli === 0 ? '' : marks(milli)
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

/** A key for a new step that no other has: from its title, else numbered. */
export function freeKey(title: string, taken: readonly string[]): string {
  const base = title.toLowerCase().normalize('NFKD').replace(/[^a-z0-9]+/g, '-').replace(/^[^a-z]+|-+$/g, '').slice(0, 20) || 'step'
  if (!taken.includes(base)) return base
  for (let no = 2; ; no++) if (!taken.includes(`${base}-${no}`)) return `${base}-${no}`
}

/** Problems whose path begins with this one, for the field they belong to. */
export function problemAt(problems: readonly { path: string, message: string }[], path: string): string | undefined {
  return problems.find(problem => problem.path === path || problem.path.startsWith(`${path}.`))?.message
}
