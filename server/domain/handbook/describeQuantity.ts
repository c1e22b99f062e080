import { refuse } from '#shared/errors'
import { formulaeOf, taughtVariant } from '#shared/marking/alternatives'
import type { HandbookQuantity } from '#shared/schemas/handbook'
import { conventions, defaultConvention } from '#shared/thermo/conventions/index'
import type { InputDefinition, QuantityDefinition } from '#shared/thermo/definition'
import { findQuantity, quantityGroups } from '#shared/thermo/registry'
import { formatUnit } from '#shared/units/formatQuantity'
import { listQuantities } from '../labs/listQuantities'
import { constantWords, inUnit, needsWords, rangeWords, valueWords, workedLines } from './inWords'

/** @throws {DomainError} `not_found` */
export function describeQuantity(key: string): HandbookQuantity {
  const definition = findQuantity(key)
  const group = quantityGroups.find(one => one.quantities.some(each => each.key === key))
  const listed = listQuantities().find(one => one.key === key)
  if (!definition || !group || !listed) refuse('not_found')
  return {
    key, name: definition.name, symbol: definition.symbol, ask: definition.ask, group: { key: group.key, title: group.title }, kind: definition.kind,
    unit: { ucum: definition.shownUnit, label: formatUnit(definition.shownUnit) || '1' }, units: listed.units,
    inputs: definition.inputs.map(input => ({
      name: input.name, label: input.label, symbol: input.symbol, unit: { ucum: input.shownUnit, label: formatUnit(input.shownUnit) || '1' }, shape: input.shape,
      isOptional: input.isOptional === true, isForSlips: input.isForSlips === true, range: rangeWords(input), needs: needsWords(input), start: startOf(definition, input),
    })),
    variants: definition.variants.map(({ key: variant, label, source, validity, knownError }) => ({ key: variant, label, source: source.text, status: source.status, validity, knownError, formulas: formulasOf(definition, variant) })),
    constants: constantWords(defaultConvention.constants, definition.constants),
    uses: (definition.uses ?? []).map(used => ({ key: used, name: findQuantity(used)?.name ?? used, isListed: findQuantity(used) !== null })),
    classes: (definition.classes ?? []).map(one => one.label),
    slips: definition.slips.map(({ key: slip, label, sentence }) => ({ key: slip, label, sentence: sentence.replace('{value}', 'the value').replace('{unit}', 'the unit') })),
    taught: conventions.map(convention => ({ key: convention.key, title: convention.title, variant: definition.variants.find(one => one.key === taughtVariant(definition, convention, undefined))?.label ?? '' })),
  }
}

/** What the calculator starts with: the definition's worked example, as a person would type it. */
function startOf(definition: QuantityDefinition, input: InputDefinition): string {
  const value = definition.example.inputs[input.name]
  if (value === undefined) return ''
  if (typeof value === 'number') return valueWords(value, input.shownUnit, input.kind)
  return value.map(one => String(Number(inUnit(one, input.shownUnit, input.kind !== 'temperature').toPrecision(8)))).join(' ')
}

/** The formulas of a variant, in the order in which its working uses them. */
function formulasOf(definition: QuantityDefinition, variant: string): string[] {
  const steps = definition.trace(definition.example.inputs, defaultConvention.constants, variant, formulaeOf(defaultConvention))
  // a step that names what it finds and no more says nothing by itself, unless all do
  const relations = steps.filter(step => step.formula.includes('='))
  return workedLines(relations.length > 0 ? relations : steps).map(line => line.formulaHtml).filter((html, at, all) => html !== '' && all.indexOf(html) === at)
}
