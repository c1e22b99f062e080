/** What formulas of moist air take from a convention, resolved once: hand it on, and no loop looks anything up. */
import { constant, epsilonOf, kappaOf } from './constants'
import type { Constants, Formulae } from './definition'
import { latentHeatFunction, saturationPressureFunction } from './saturationFunction'

export interface MoistAir {
  /** eₛ(T) over liquid water: K to Pa. */
  es: (temperatureK: number) => number
  /** L(T) of vaporization: K to J kg⁻¹. */
  L: (temperatureK: number) => number
  epsilon: number
  R: number
  Rv: number
  cp: number
  cpv: number
  cw: number
  g: number
  kappa: number
}

/** @example moistAir(constants, formulae).es(293.15) // 2336.95 Pa */
export function moistAir(constants: Constants, formulae: Formulae): MoistAir {
  return {
    es: saturationPressureFunction(constants, formulae), L: latentHeatFunction(constants, formulae),
    epsilon: epsilonOf(constants), R: constant(constants, 'R'), Rv: constant(constants, 'Rv'), cp: constant(constants, 'cp'), cpv: constant(constants, 'cpv'),
    cw: constant(constants, 'cw'), g: constant(constants, 'g'), kappa: kappaOf(constants),
  }
}
