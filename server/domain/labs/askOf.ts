import { digitsInWords } from '#shared/marking/rounding'
import type { Convention } from '#shared/marking/types'
import { askedSteps, type AskedNumber, type AskedStep } from '#shared/schemas/askedSteps'
import type { LabBody, SupplyItem } from '#shared/schemas/lab'
import type { InputSource } from '#shared/schemas/steps'
import type { InputDefinition, QuantityDefinition } from '#shared/thermo/definition'
import { constantDefinitions } from '#shared/thermo/constants'
import { findMeasuredQuantity } from '#shared/schemas/measured'
import { findQuantity } from '#shared/thermo/registry'
import { formatUnit } from '#shared/units/formatQuantity'
import { legWords } from '../shares/legs'
import { columnOf } from '../shares/servedData'
import type { ServedRows } from '../shares/loadedShare'
import { edgeRow, tableRow } from './rowsOfLayer'

/** What the ask says beyond the step once a share is known. */
export interface AskedShare {
  item: Pick<SupplyItem, 'leg' | 'lowM' | 'highM'>
  heightDatum: string
  rows: ServedRows
}

const decimal = (value: number): string => String(value).replace('-', '−')

/** What the heights of a flight are counted from, as words in a sentence. */
export function datumWords(datum: string): string {
  if (datum === 'sea level') return 'above mean sea level'
  if (datum === 'ground') return 'above the ground'
  if (datum === 'roof') return 'above the roof'
  if (datum === 'launch point') return 'above the launch point'
  return 'as given in the file (datum not stated)'
}

/** The asks of a body by key; for every share where none is given. A step whose quantity is not known yet has none. */
export function asksOf(body: LabBody, convention: Convention, share: AskedShare | null): Record<string, string> {
  const steps = askedSteps(body)
  const titles = Object.fromEntries(steps.map(step => [step.key, step.title]))
  return Object.fromEntries(steps.map(step => [step.key, askOfStep(step, convention, titles, share)]))
}

function askOfStep(step: AskedStep, convention: Convention, titles: Readonly<Record<string, string>>, share: AskedShare | null): string {
  if (step.kind === 'choice') return step.isSeveral ? 'Choose every option that is right; all of them, and no other, earn the marks.' : 'Choose the one option that is right.'
  const definition = findQuantity(step.quantity)
  return definition ? askOf(step, definition, convention, titles, share) : ''
}

/**
 * The line above an entry: exactly what is asked, so that everything it pins is a definition and never a matter of width.
 * Quantity and sign, method, inputs with their bounds and rows, height datum, constants of the convention, digits.
 */
export function askOf(step: AskedNumber, definition: QuantityDefinition, convention: Convention, titles: Readonly<Record<string, string>>, share: AskedShare | null): string {
  return [
    sentence(definition.ask),
    methodOf(step, definition, convention),
    ...(step.accuracy ? ['Compared with what the station read.'] : []),
    // where the student reads an instrument, what the station read is not told beforehand
    ...definition.inputs.filter(input => !input.isForSlips && !step.accuracy).flatMap(input => inputOf(step.inputs[input.name], input, titles, share)),
    share ? boundsOf(share, step) : generalBounds(step),
    constantsOf(definition, convention, step),
    readOffWords(step, definition),
    step.accuracy ? `Accuracy, half-width: ${decimal(step.accuracy.own)} ${formatUnit(step.unit)} for your instrument, ${decimal(step.accuracy.station)} ${formatUnit(step.unit)} for the station.` : '',
    answerOf(step, definition),
  ].filter(part => part !== '').join(' ')
}

const sentence = (text: string): string => /[.:!?]$/.test(text.trim()) ? text.trim() : `${text.trim()}.`

function methodOf(step: AskedNumber, definition: QuantityDefinition, convention: Convention): string {
  if (definition.variants.length < 2) return ''
  const key = step.variant ?? convention.variants[definition.key] ?? definition.variants[0]?.key
  const variant = definition.variants.find(entry => entry.key === key)
  return variant ? `Formula taught: ${sentence(variant.label)}` : ''
}

function inputOf(source: InputSource | undefined, input: InputDefinition, titles: Readonly<Record<string, string>>, share: AskedShare | null): string[] {
  if (!source) return []
  const name = `${input.label[0]?.toUpperCase() ?? ''}${input.label.slice(1)} ${input.symbol}`
  switch (source.from) {
    case 'text': return [`${name}: ${decimal(source.value)} ${formatUnit(source.unit)}.`]
    case 'constant': return [`${name}: the constant ${source.name}.`]
    case 'step': return [`${name}: your result of “${titles[source.key] ?? source.key}”.`]
    case 'share': return [`${name}: ${readingWords(source, share)}.`]
  }
}

function readingWords({ column, read, row: rowOf }: Extract<InputSource, { from: 'share' }>, share: AskedShare | null): string {
  if (read === 'lowBound') return share ? `the layer’s base, ${decimal(share.item.lowM)} m` : 'the layer’s base'
  if (read === 'highBound') return share ? `the layer’s top, ${decimal(share.item.highM)} m` : 'the layer’s top'
  const served = share ? columnOf(share.rows, column) : undefined
  const named = served ? `column ${served.name}` : (findMeasuredQuantity(column)?.label ?? column)
  if (read === 'layer') return `${named}, every row with use = 1`
  if (read === 'mean') return `mean of ${named} over the rows with use = 1`
  if (read === 'row') {
    const at = share && rowOf ? tableRow(share.rows, rowOf.no, rowOf.of) : null
    return `${named} in ${at === null ? 'the row of the table' : `row ${at + 1} of your data`}`
  }
  const row = share ? edgeRow(share.rows, read) : null
  const which = read === 'lowest' ? 'the lowest' : 'the highest'
  return `${named} in ${which} row with use = 1${row === null ? '' : ` (row ${row + 1})`}`
}

const takesRows = (step: AskedNumber): boolean => !step.accuracy && Object.values(step.inputs).some(source => source.from === 'share')

function boundsOf(share: AskedShare, step: AskedNumber): string {
  if (!takesRows(step)) return ''
  const used = share.rows.use.filter(Boolean).length
  return `Layer: ${decimal(share.item.lowM)} m to ${decimal(share.item.highM)} m ${datumWords(share.heightDatum)}, both bounds included, ${legWords[share.item.leg]}; ${used} of ${share.rows.count} rows.`
}

function generalBounds(step: AskedNumber): string {
  return takesRows(step) ? 'Layer: the one of your data, both bounds included; only rows with use = 1.' : ''
}

/** What a plot's division is worth: half of it is granted on what is read off. */
function readOffWords(step: AskedNumber, definition: QuantityDefinition): string {
  const named = Object.entries(step.divisions).map(([name, { division, unit }]) => {
    const label = name === 'result' ? 'the value' : definition.inputs.find(input => input.name === name)?.label ?? name
    return `${label} to half a division of ${decimal(division)} ${formatUnit(unit)}`
  })
  return named.length === 0 ? '' : `Read off the plot of your data: ${named.join(', ')}.`
}

function constantsOf(definition: QuantityDefinition, convention: Convention, step: AskedNumber): string {
  const named = [...definition.constants, ...Object.values(step.inputs).flatMap(source => source.from === 'constant' ? [source.name] : [])]
  const listed = [...new Set(named)].flatMap(name => constantWords(name, convention.constants[name]) ?? [])
  return listed.length === 0 ? '' : `Constants (${convention.title}): ${listed.join(', ')}.`
}

/** "cp = 1004 J kg⁻¹ K⁻¹", "p₀ = 1000 hPa"; null where the convention does not set it. */
export function constantWords(name: string, value: number | undefined): string | null {
  if (value === undefined) return null
  if (name === 'p0') return `p₀ = ${decimal(value / 100)} hPa`
  if (name === 'zeroCelsius') return `0 °C = ${decimal(value)} K`
  if (name === 'neutralTolerance') return `neutral within ${decimal(Number((value * 1000).toPrecision(6)))} K km⁻¹ of Γd`
  const unit = formatUnit(constantDefinitions.find(definition => definition.name === name)?.unit ?? '1')
  return `${name === 'kappa' ? 'κ' : name} = ${decimal(value)}${unit === '' ? '' : ` ${unit}`}`
}

function answerOf(step: AskedNumber, definition: QuantityDefinition): string {
  if (definition.classes) return `Answer with one of: ${definition.classes.map(entry => entry.label).join(', ')}.`
  // The zero of a temperature is arbitrary: its digits are a fixed place, and the ask says which.
  const unit = formatUnit(step.unit)
  if (definition.kind === 'temperature') return `Answer in ${unit}, ${digitsInWords(definition, step.digits, unit)} or finer.`
  return `Answer in ${unit}, to at least ${digitsInWords(definition, step.digits)}.`
}
