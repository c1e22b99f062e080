import type { Constants } from './definition'

export interface ConstantDefinition { name: string, symbol: string, label: string, unit: string, range: readonly [number, number], isOptional?: true }

/** Every constant that a convention may set, SI. A value outside its range is a slip of the pen and refused when a convention is saved. */
export const constantDefinitions: readonly ConstantDefinition[] = [
  { name: 'cp', symbol: 'c_p', label: 'specific heat of dry air at constant pressure', unit: 'J/(kg.K)', range: [990, 1020] },
  { name: 'cv', symbol: 'c_v', label: 'specific heat of dry air at constant volume', unit: 'J/(kg.K)', range: [705, 730] },
  { name: 'R', symbol: 'R', label: 'gas constant of dry air', unit: 'J/(kg.K)', range: [286, 288] },
  { name: 'g', symbol: 'g', label: 'acceleration of gravity', unit: 'm/s2', range: [9.7, 9.9] },
  { name: 'p0', symbol: 'p_0', label: 'reference pressure of potential temperature', unit: 'Pa', range: [100_000, 100_000] },
  { name: 'zeroCelsius', symbol: 'T_0', label: '0 °C in kelvin', unit: 'K', range: [273, 273.16] },
  { name: 'neutralTolerance', symbol: '\\delta', label: 'tolerance of a neutral layer about Γd', unit: 'K/m', range: [0, 0.001] },
  { name: 'Rv', symbol: 'R_v', label: 'gas constant of water vapor', unit: 'J/(kg.K)', range: [460, 463] },
  { name: 'cpv', symbol: 'c_{pv}', label: 'specific heat of water vapor at constant pressure', unit: 'J/(kg.K)', range: [1800, 2000] },
  { name: 'cw', symbol: 'c_w', label: 'specific heat of liquid water', unit: 'J/(kg.K)', range: [4100, 4300] },
  { name: 'latentHeat', symbol: 'L_v', label: 'latent heat of vaporization at 0 °C, or the constant that is taught', unit: 'J/kg', range: [2.4e6, 2.6e6] },
  { name: 'latentHeatIce', symbol: 'L_s', label: 'latent heat of sublimation at 0 °C', unit: 'J/kg', range: [2.8e6, 2.9e6] },
  { name: 'earthRadius', symbol: 'a', label: 'radius of the earth, between geometric and geopotential height', unit: 'm', range: [6_350_000, 6_380_000] },
  { name: 'vonKarman', symbol: 'k', label: 'von Kármán constant', unit: '1', range: [0.35, 0.43] },
  { name: 'kappa', symbol: '\\kappa', label: 'exponent of Poisson’s relation, where it is not R/cp', unit: '1', range: [0.28, 0.29], isOptional: true },
  { name: 'enhancementFactor', symbol: 'f', label: 'saturation vapor pressure in moist air over that of pure water, where it is used', unit: '1', range: [1, 1.006], isOptional: true },
]

/** The factor by which vapor in saturated moist air exceeds pure vapor: 1 where the convention does not name it. */
export const enhancementOf = (constants: Constants): number => constants.enhancementFactor ?? 1

/** A constant that the convention has to name: a definition that asks for another is a fault in the program. */
export function constant(constants: Constants, name: string): number {
  const value = constants[name]
  if (value === undefined || !Number.isFinite(value)) throw new Error(`the convention sets no ${name}`)
  return value
}

/** κ of Poisson's relation: as the convention names it, else R/cp. */
export const kappaOf = (constants: Constants): number => constants.kappa ?? constant(constants, 'R') / constant(constants, 'cp')

/** The dry adiabatic lapse rate g/cp, K/m. */
export const dryRateOf = (constants: Constants): number => constant(constants, 'g') / constant(constants, 'cp')

/** ε = R/Rv, the ratio of the gas constants of dry air and of water vapor. */
export const epsilonOf = (constants: Constants): number => constant(constants, 'R') / constant(constants, 'Rv')
