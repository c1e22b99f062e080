import type { FieldProblem } from '#shared/errors'
import { findMeasuredQuantity } from '#shared/schemas/measured'
import { askedNumbers, askedOf, isNumber, type AskedNumber } from '#shared/schemas/askedSteps'
import type { LabBody } from '#shared/schemas/lab'
import type { InputSource, LabStep } from '#shared/schemas/steps'
import type { InputDefinition, QuantityDefinition } from '#shared/thermo/definition'
import { findQuantity } from '#shared/thermo/registry'
import type { Convention } from '#shared/marking/types'
import { isSameDimension } from '../shares/units'
import { columnOf, type Flight } from '../shares/servedData'
import { isFromFlight } from './practice/isFromFlight'
import type { PreparedLab } from './prepareLab'

/** What stops a lab from being asked, each with the field in which it stands. Empty where every step is bound and every flight has what the steps need. */
export function bindingProblems(lab: PreparedLab): FieldProblem[] {
  const { body } = lab.revision
  return [
    ...(body.steps.length === 0 ? [{ path: 'steps', message: 'A lab asks at least one step.' }] : []),
    ...(body.supply.length === 0 ? [{ path: 'supply', message: 'Choose at least one flight and layer: shares are drawn from them.' }] : []),
    ...body.steps.flatMap((step, at) => problemsOfStep(body, step, lab.convention).map(problem => ({ path: `steps.${at}.${problem.path}`, message: problem.message }))),
    ...supplyProblems(lab),
    ...practiceProblems(lab),
  ]
}

/** The problems of everything that a step asks; those of a table stand at its columns. */
function problemsOfStep(body: LabBody, step: LabStep, convention: Convention): FieldProblem[] {
  const parts = askedOf(step).filter(isNumber)
  const found = parts.flatMap((part) => {
    const column = step.kind === 'table' ? step.columns.findIndex(each => part.key.endsWith(`-${each.key}`)) : -1
    return stepProblems(body, part, convention).map(({ path, message }) => ({ path: column < 0 ? path : `columns.${column}.${path}`, message }))
  })
  return [...new Map(found.map(problem => [`${problem.path} ${problem.message}`, problem])).values()]
}

function stepProblems(body: LabBody, step: AskedNumber, convention: Convention): FieldProblem[] {
  const definition = findQuantity(step.quantity)
  if (!definition) return [{ path: 'quantity', message: `The reference has no quantity "${step.quantity}".` }]
  const problems: FieldProblem[] = []
  if (step.variant !== null && !definition.variants.some(variant => variant.key === step.variant)) problems.push({ path: 'variant', message: `${definition.name} has no formula "${step.variant}".` })
  if (definition.kind !== 'class' && !isSameDimension(step.unit, definition.unit)) problems.push({ path: 'unit', message: `${definition.name} is not measured in "${step.unit}".` })
  if (definition.kind === 'temperature' && step.granted.relative) problems.push({ path: 'granted.relative', message: 'A temperature takes an absolute width: a part of it depends on where the scale has its zero.' })
  if (step.digitsMilli > step.pointsMilli) problems.push({ path: 'digitsMilli', message: 'The digits cannot earn more than the step holds.' })
  if ((step.near?.milli ?? 0) > step.pointsMilli) problems.push({ path: 'near.milli', message: 'A near miss cannot earn more than the step holds.' })
  for (const name of Object.keys(step.divisions)) {
    if (name !== 'result' && !definition.inputs.some(input => input.name === name && input.shape === 'number')) problems.push({ path: `divisions.${name}`, message: `${definition.name} has no single value "${name}" to be read off.` })
    else if (!isSameDimension(step.divisions[name]?.unit ?? '', name === 'result' ? definition.unit : definition.inputs.find(input => input.name === name)?.unit ?? '')) problems.push({ path: `divisions.${name}.unit`, message: 'Not a unit of what is read off.' })
  }
  if (step.kind === 'diagram' && Object.keys(step.divisions).length === 0) problems.push({ path: 'divisions', message: 'Say what is read off the plot, and how fine its axis is divided.' })
  if (step.kind === 'reading' && !definition.key.startsWith('observed-')) problems.push({ path: 'quantity', message: 'An own reading asks for something that students read on an instrument.' })
  if (step.kind !== 'reading' && definition.key.startsWith('observed-')) problems.push({ path: 'quantity', message: `${definition.name} needs a step of the kind “own reading”.` })
  if (step.slipMilli > step.pointsMilli) problems.push({ path: 'slipMilli', message: 'A slip cannot earn more than the step holds.' })
  for (const name of Object.keys(step.inputs)) {
    if (!definition.inputs.some(input => input.name === name)) problems.push({ path: `inputs.${name}`, message: `${definition.name} takes no "${name}".` })
  }
  for (const input of definition.inputs) {
    const source = step.inputs[input.name]
    const message = source ? sourceProblem(body, definition, input, source, convention) : input.isOptional ? null : `Say where ${input.label} comes from.`
    if (message) problems.push({ path: `inputs.${input.name}`, message })
  }
  return problems
}

function sourceProblem(body: LabBody, definition: QuantityDefinition, input: InputDefinition, source: InputSource, convention: Convention): string | null {
  switch (source.from) {
    case 'text':
      if (input.shape === 'series') return `${input.label} is a series: take it from the share.`
      return isSameDimension(source.unit, input.unit) ? null : `${input.label} is not measured in "${source.unit}".`
    case 'constant':
      if (input.shape === 'series') return `${input.label} is a series: take it from the share.`
      return convention.constants[source.name] === undefined ? `The convention has no constant "${source.name}".` : null
    case 'step': {
      if (input.shape === 'series') return `${input.label} is a series: take it from the share.`
      const earlier = askedNumbers(body).find(step => step.key === source.key)
      const from = earlier ? findQuantity(earlier.quantity) : undefined
      if (!from) return 'The earlier step is not bound yet.'
      if (from.kind === 'class' || from.kind === 'temperature' !== (input.kind === 'temperature') || !isSameDimension(from.unit, input.unit)) return `${from.name} cannot stand for ${input.label}.`
      return null
    }
    case 'share': return shareSourceProblem(definition, input, source)
  }
}

function shareSourceProblem(definition: QuantityDefinition, input: InputDefinition, source: Extract<InputSource, { from: 'share' }>): string | null {
  const isBound = source.read === 'lowBound' || source.read === 'highBound'
  const isSeries = source.read === 'layer'
  if (source.read === 'row' && source.row === undefined) return 'A row is a row of a table.'
  if (isSeries !== (input.shape === 'series')) return input.shape === 'series' ? `${definition.name} takes ${input.label} as the whole layer.` : `${definition.name} takes one value for ${input.label}, not the whole layer.`
  if (isBound) return isSameDimension('m', input.unit) ? null : `A bound of the layer is a height; ${input.label} is not.`
  const column = findMeasuredQuantity(source.column)
  if (!column) return `"${source.column}" is not a quantity that a column can be.`
  if (column.key === definition.key) return 'A step cannot take its own answer as its input.'
  return isSameDimension(column.canonical, input.unit) ? null : `A column of ${column.label} cannot stand for ${input.label}.`
}

function supplyProblems(lab: PreparedLab): FieldProblem[] {
  const { body } = lab.revision
  const needed = new Set(['height', ...askedNumbers(body).flatMap(step => Object.values(step.inputs).flatMap(source => source.from === 'share' && source.read !== 'lowBound' && source.read !== 'highBound' ? [source.column] : []))])
  return body.supply.flatMap((item, at): FieldProblem[] => {
    // A flight of another course reads like one that does not exist.
    if (!lab.flights.has(item.versionId)) return [{ path: `supply.${at}.versionId`, message: 'Not a flight of this course.' }]
    const { flight } = lab.flightOf(item.versionId)
    const missing = [...needed].filter(quantity => !columnOf({ columns: flight.columns.filter(isValue) }, quantity))
    return [
      ...missing.map(quantity => ({ path: `supply.${at}.versionId`, message: `${flight.title} has no column of ${findMeasuredQuantity(quantity)?.label ?? quantity}.` })),
      ...(item.lowM < 0 && flight.heightDatum !== 'sea level' && flight.heightDatum !== 'unknown' ? [{ path: `supply.${at}.lowM`, message: 'Below the ground.' }] : []),
    ]
  })
}

/** Readings for the practice are shown with their worked answers: they must be of a flight that is nobody's share. */
function practiceProblems(lab: PreparedLab): FieldProblem[] {
  const { practice, supply } = lab.revision.body
  if (!practice) return []
  const flights = new Set(supply.map(item => item.versionId).filter(versionId => lab.flights.has(versionId)))
  return [...flights].filter(versionId => isFromFlight(practice, lab.flightOf(versionId).served)).map(versionId => ({ path: 'practice', message: `The readings for the practice are those of ${lab.flightOf(versionId).flight.title}, from which shares are drawn: their worked answers would give shares away.` }))
}

const isValue = (column: Flight['columns'][number]): boolean => column.role === 'value'
