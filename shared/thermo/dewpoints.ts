/** The temperature at which air with a vapor pressure is saturated: over liquid water the dewpoint, over ice the frost point. Plain numbers, SI. */
import { findRoot } from '../numerics/rootFinding'
import type { Constants, Formulae, Outcome } from './definition'
import { enhancementOf } from './constants'
import { overIceForms, overWaterForms } from './saturation'
import { iceSaturationPressureFunction, overIceKey, overWaterKey, saturationPressureFunction } from './saturationFunction'

/** Where the search begins and ends, K. */
const coldest = 130, hottest = 373

/**
 * Dewpoint: eₛ(T_d) = e, in closed form where the formula of eₛ can be solved, else by a bracket.
 *
 * Source: AMS Glossary of Meteorology, "dewpoint". Valid: as of the formula of eₛ.
 *
 * @example dewpointFunction(constants, formulae)(1401.539) // 285.15 K
 */
export function dewpointFunction(constants: Constants, formulae: Formulae): (vaporPressurePa: number) => number {
  const solved = overWaterForms.find(form => form.key === (formulae.variants[overWaterKey] ?? overWaterForms[0]?.key))?.temperature
  if (solved && formulae.beyond === 'compute') return e => solved(e / enhancementOf(constants))
  const es = saturationPressureFunction(constants, formulae)
  return e => findRoot(T => es(T) / e - 1, coldest, hottest)
}

/**
 * Frost point: eᵢ(T_f) = e; not defined where the air holds more than ice can be in equilibrium with.
 *
 * Source: AMS Glossary of Meteorology, "frost point".
 *
 * @example frostPoint(200, constants, formulae) // value 260.23 K
 */
export function frostPoint(vaporPressure: number, constants: Constants, formulae: Formulae): Exclude<Outcome, { is: 'class' }> {
  const ei = iceSaturationPressureFunction(constants, formulae)
  const triple = 273.16
  if (vaporPressure > ei(triple)) return { is: 'not_defined', why: 'The vapor pressure is above that of the triple point of water: at saturation there is no ice.' }
  const solved = overIceForms.find(form => form.key === (formulae.variants[overIceKey] ?? overIceForms[0]?.key))?.temperature
  return { is: 'value', value: solved && formulae.beyond === 'compute' ? solved(vaporPressure / enhancementOf(constants)) : findRoot(T => ei(T) / vaporPressure - 1, 120, triple) }
}
