import { refuse } from '#shared/errors'
import { taughtVariant } from '#shared/marking/alternatives'
import type { Alternative } from '#shared/marking/types'
import type { HandbookConvention } from '#shared/schemas/handbook'
import { constantDefinitions, type ConstantDefinition } from '#shared/thermo/constants'
import { defaultConvention, findConvention } from '#shared/thermo/conventions/index'
import { findQuantity, quantities } from '#shared/thermo/registry'
import { formatUnit } from '#shared/units/formatQuantity'
import { constantWords, grouped } from './inWords'

const beyondWords = {
  compute: 'computed all the same, with its known error shown',
  next: 'computed by the next formula that holds there',
  refuse: 'refused',
} as const

/** @throws {DomainError} `not_found` */
export function describeConvention(key: string): HandbookConvention {
  const convention = findConvention(key)
  if (!convention) refuse('not_found')
  const { cp = NaN, cv = NaN, R = NaN } = convention.constants
  return {
    key, title: convention.title, source: convention.source, isDefault: key === defaultConvention.key, beyond: beyondWords[convention.beyond ?? 'compute'],
    constants: constantWords(convention.constants),
    closes: `cp − cv = ${cp} − ${cv} = ${Number((cp - cv).toFixed(4))} and R = ${R} J kg⁻¹ K⁻¹`,
    variants: quantities.filter(one => one.variants.length > 1).map(one => ({
      key: one.key, quantity: one.name, variant: one.variants.find(variant => variant.key === taughtVariant(one, convention, undefined))?.label ?? '', isNamed: one.key in convention.variants,
    })),
    accepted: convention.accepted.map(alternative => ({ label: alternative.label, group: alternative.group ?? 'on its own', changes: changesOf(alternative) })),
  }
}

/** As it is spoken of: by its letters where these are its name (cp, Rv), else by the words before the first comma. */
const shortName = ({ name, label }: ConstantDefinition): string => name.length <= 3 ? name : label.split(',')[0] ?? label

function changesOf({ constants = {}, variants = {} }: Alternative): string {
  const numbers = Object.entries(constants).map(([name, value]) => {
    const definition = constantDefinitions.find(one => one.name === name)
    const unit = definition?.unit ?? '1'
    return `${definition ? shortName(definition) : name} ${grouped(Number(value.toPrecision(7)))}${unit === '1' ? '' : ` ${formatUnit(unit)}`}`
  })
  const formulae = Object.entries(variants).map(([quantity, key]) => {
    const definition = findQuantity(quantity)
    return `${definition?.name ?? quantity}: ${definition?.variants.find(one => one.key === key)?.label ?? key}`
  })
  return [...numbers, ...formulae].join('; ')
}
