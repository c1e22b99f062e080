import { findQuantity } from '#shared/thermo/registry'

/** A class of a quantity in words: "superadiabatic". */
export const classLabel = (quantity: string, key: string): string => findQuantity(quantity)?.classes?.find(one => one.key === key)?.label ?? key
