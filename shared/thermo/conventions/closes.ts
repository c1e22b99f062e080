import { constantDefinitions } from '../constants'
import type { Alternative, Convention } from '../convention'
import type { Constants } from '../definition'

/** cp − cv has to be R to so many J kg⁻¹ K⁻¹: what decimals cannot tell apart, and not the 0.05 between 287 and 287.05. */
const slack = 1e-6

/**
 * The constants of an alternative put over the convention's own. Where it changes cp or R and names no κ, κ is R/cp again.
 * @example withAlternative({ cp: 1004, R: 287 }, { cp: 1005 }) // { cp: 1005, R: 287 }
 */
export function withAlternative(own: Constants, alternative: Constants | undefined): Constants {
  if (!alternative) return own
  const merged: Record<string, number> = { ...own, ...alternative }
  const changesKappa = ('cp' in alternative || 'R' in alternative) && !('kappa' in alternative)
  if (changesKappa) delete merged.kappa
  return merged
}

/** What is wrong with a convention, in sentences; empty when it can be saved. */
export function conventionFaults(convention: Pick<Convention, 'constants' | 'accepted'>): string[] {
  const faults = constantsFaults(convention.constants, 'The convention')
  convention.accepted.forEach((alternative: Alternative) => {
    faults.push(...constantsFaults(withAlternative(convention.constants, alternative.constants), `The alternative "${alternative.label}"`))
  })
  return faults
}

function constantsFaults(constants: Constants, whose: string): string[] {
  const faults: string[] = []
  for (const { name, range, isOptional } of constantDefinitions) {
    const value = constants[name]
    if (value === undefined && isOptional) continue
    if (value === undefined || !(value >= range[0] && value <= range[1])) faults.push(`${whose} sets ${name} to ${String(value)}; it lies within ${range[0]} to ${range[1]}.`)
  }
  for (const name of Object.keys(constants)) {
    if (!constantDefinitions.some(definition => definition.name === name)) faults.push(`${whose} sets ${name}, which nothing uses.`)
  }
  const { cp = NaN, cv = NaN, R = NaN } = constants
  if (!(Math.abs(cp - cv - R) <= slack)) faults.push(`${whose} does not close: cp − cv is ${Number((cp - cv).toFixed(6))}, R is ${R}.`)
  return faults
}
