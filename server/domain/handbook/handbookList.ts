import { referenceVersion } from '#shared/marking/version'
import type { HandbookReply } from '#shared/schemas/handbook'
import { conventions, defaultConvention } from '#shared/thermo/conventions/index'
import { quantityGroups } from '#shared/thermo/registry'
import { formatUnit } from '#shared/units/formatQuantity'

/** The contents of the handbook: a chapter a group, a page a quantity, and the conventions. */
export function handbookList(): HandbookReply {
  return {
    version: referenceVersion,
    groups: quantityGroups.filter(group => group.quantities.length > 0).map(({ key, title, quantities }) => ({
      key, title, quantities: quantities.map(one => ({ key: one.key, name: one.name, symbol: one.symbol, unit: one.kind === 'class' ? 'a class' : formatUnit(one.shownUnit) || '1', variants: one.variants.length })),
    })),
    conventions: conventions.map(one => ({ key: one.key, title: one.title, isDefault: one.key === defaultConvention.key })),
  }
}
