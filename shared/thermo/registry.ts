import type { QuantityDefinition, QuantityGroup } from './definition'
import { dryAir } from './groups/dryAir'
import { hydrostatics } from './groups/hydrostatics'
import { instruments } from './groups/instruments'
import { moistProcesses } from './groups/moistProcesses'
import { moisture } from './groups/moisture'
import { parcels } from './groups/parcels'
import { profiles } from './groups/profiles'
import { readings } from './groups/readings'

/** Every quantity by its group, in the order in which a course meets them. A test sees to it that each file of `quantities/` is in one. */
export const quantityGroups: readonly QuantityGroup[] = [dryAir, hydrostatics, moisture, moistProcesses, profiles, parcels, instruments, readings]

export const quantities: readonly QuantityDefinition[] = quantityGroups.flatMap(group => group.quantities)

const byKey = new Map(quantities.map(definition => [definition.key, definition]))

/** The definition of a key; null where there is none. */
export const findQuantity = (key: string): QuantityDefinition | null => byKey.get(key) ?? null
