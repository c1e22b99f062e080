import type { InputSource } from '#shared/schemas/steps'
import type { InputDefinition, QuantityDefinition } from '#shared/thermo/definition'
import { quantityGroups } from '#shared/thermo/registry'
import { formatUnit } from '#shared/units/formatQuantity'
import { isSameDimension } from '../shares/units'

/** Units in which a step may ask, in the order in which an author would look for them. */
const offered = ['K', 'Cel', '[degF]', 'K/km', 'K/m', 'K/hm', 'Pa', 'hPa', 'kPa', 'm', 'km', '[ft_i]', 'J/kg', 'kJ/kg', 'J', 'kJ', 'MJ', 'kg/m3', 'g/m3', 'm/s', 'J/(kg.K)', 's-2', '1', '%']

/** What a column has to measure for an input of this name to be taken from it without a choice. */
const usualColumns: Readonly<Record<string, string>> = { temperature: 'air-temperature', height: 'height', pressure: 'pressure' }

/** The definitions of the reference as an editor needs them. */
export function listQuantities() {
  return quantityGroups.flatMap(group => group.quantities.map(definition => ({
    group: group.title, key: definition.key, name: definition.name, symbol: definition.symbol, unit: definition.unit, shownUnit: definition.shownUnit, shownUnitLabel: formatUnit(definition.shownUnit),
    units: unitsFor(definition), kind: definition.kind, ask: definition.ask, constants: [...definition.constants],
    inputs: definition.inputs.map(input => ({ name: input.name, label: input.label, symbol: input.symbol, unit: input.unit, shownUnit: input.shownUnit, shape: input.shape, isOptional: input.isOptional === true, usual: usualSource(input) })),
    variants: definition.variants.map(variant => ({ key: variant.key, label: variant.label, source: variant.source.text, status: variant.source.status, validity: variant.validity })),
    classes: (definition.classes ?? []).map(({ key, label }) => ({ key, label })),
  })))
}

function unitsFor(definition: QuantityDefinition): { ucum: string, label: string }[] {
  if (definition.kind === 'class') return [{ ucum: '1', label: 'a class' }]
  // A step of temperature is asked in kelvin: a degree of a scale would leave open whether the scale is meant.
  const isScale = (code: string) => code === 'Cel' || code === '[degF]'
  const fitting = offered.filter(code => isSameDimension(code, definition.unit) && (definition.kind === 'temperature' || !isScale(code)))
  return [...new Set([definition.shownUnit, ...fitting, definition.unit])].map(ucum => ({ ucum, label: formatUnit(ucum) || '1' }))
}

/** Where an input usually comes from: the share's column of the same name, over the layer for a series. */
function usualSource(input: InputDefinition): InputSource | null {
  const column = usualColumns[input.name]
  if (input.isOptional || column === undefined) return null
  return { from: 'share', column, read: input.shape === 'series' ? 'layer' : 'lowest' }
}
