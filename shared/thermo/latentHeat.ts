/** Latent heats as functions of the temperature: plain numbers, because they stand in the innermost loops of parcels. */
import { exp } from '../numerics/elementary'
import { constant } from './constants'
import type { Constants, Source } from './definition'
import { texFactor, texNumber, texQuantity } from './tex'

export interface LatentHeatForm {
  key: string
  label: string
  source: Source
  validity: string
  knownError: string
  /** Inclusive, K; none where it is taken for constant. */
  holds?: readonly [number, number]
  constants: readonly string[]
  /** J kg⁻¹ from K. */
  of: (constants: Constants) => (temperature: number) => number
  formula: string
  filled: (temperature: number, constants: Constants, value: number) => string
}

const zeroCelsius = 273.15
const shown = (value: number): string => texQuantity(value / 1000, 'kJ/kg', 6)

/**
 * Latent heat of vaporization, linear in the temperature.
 *
 *   L = 2.501·10⁶ − 2370 t     t in °C, J kg⁻¹
 *
 * Source: Bolton (1980), Mon. Wea. Rev. 108, 1046–1053, Eq. 2. Valid: −30 to 40 °C, within 1 kJ kg⁻¹ of the steam tables above 0 °C.
 *
 * @example linearLatentHeat(293.15) // 2453600 J kg⁻¹
 */
export const linearLatentHeat = (temperature: number): number => 2.501e6 - 2370 * (temperature - zeroCelsius)

/**
 * Latent heat of vaporization by Kirchhoff's relation with constant specific heats.
 *
 *   L = L₀ − (c_w − c_pv) t     t in °C, J kg⁻¹; L₀ at 0 °C
 *
 * Source: AMS Glossary of Meteorology, "Kirchhoff's equation"; Emanuel (1994), Atmospheric Convection, Eq. 4.4.4.
 * Valid: −40 to 40 °C. Limits: as good as its specific heats, 3 kJ kg⁻¹ at 40 °C.
 *
 * @example kirchhoffLatentHeat(293.15, { latentHeat: 2.501e6, cw: 4190, cpv: 1870 }) // 2454600 J kg⁻¹
 */
export function kirchhoffLatentHeat(temperature: number, constants: Constants): number {
  return constant(constants, 'latentHeat') - (constant(constants, 'cw') - constant(constants, 'cpv')) * (temperature - zeroCelsius)
}

/**
 * Latent heat of vaporization, a cubic fitted to tables.
 *
 *   L = 2500.8 − 2.36 t + 0.0016 t² − 0.00006 t³     t in °C, kJ kg⁻¹
 *
 * Source: Rogers & Yau (1989), A Short Course in Cloud Physics, Table 2.1, as a fit (from memory). Valid: −25 to 40 °C.
 *
 * @example cubicLatentHeat(293.15) // 2453760 J kg⁻¹
 */
export function cubicLatentHeat(temperature: number): number {
  const t = temperature - zeroCelsius
  return 1000 * (2500.8 - 2.36 * t + 0.0016 * t * t - 0.00006 * t * t * t)
}

/**
 * Latent heat of sublimation.
 *
 *   L = 46782.5 + 35.8925 T − 0.07414 T² + 541.5 exp[−(T/123.75)²]     J mol⁻¹, over 0.018015 kg mol⁻¹
 *
 * Source: Murphy & Koop (2005), Q. J. R. Meteorol. Soc. 131, 1539–1565, Eq. 5. Valid: above 30 K.
 *
 * @example murphyKoopSublimation(273.15) // 2834250 J kg⁻¹
 */
export function murphyKoopSublimation(temperature: number): number {
  const scaled = temperature / 123.75
  return (46782.5 + 35.8925 * temperature - 0.07414 * temperature * temperature + 541.5 * exp(-scaled * scaled)) / 0.018015
}

/**
 * Latent heat of sublimation, a quadratic fitted to tables.
 *
 *   L = 2834.1 − 0.29 t − 0.004 t²     t in °C, kJ kg⁻¹
 *
 * Source: Rogers & Yau (1989), A Short Course in Cloud Physics, Table 2.1, as a fit (read in transcriptions). Valid: −40 to 0 °C.
 *
 * @example quadraticSublimation(253.15) // 2838300 J kg⁻¹
 */
export function quadraticSublimation(temperature: number): number {
  const t = temperature - zeroCelsius
  return 1000 * (2834.1 - 0.29 * t - 0.004 * t * t)
}

export const vaporizationForms: readonly LatentHeatForm[] = [
  {
    key: 'linear', label: 'linear in the temperature', source: { text: 'Bolton (1980), Mon. Wea. Rev. 108, 1046–1053, Eq. 2', status: 'verified' },
    validity: '−30 to 40 °C', knownError: '1 kJ kg⁻¹ above 0 °C', holds: [243.15, 313.15], constants: [],
    of: () => linearLatentHeat,
    formula: 'L_v = 2501 - 2.37\\,t',
    filled: (temperature, _constants, value) => `L_v = 2501 - 2.37 \\cdot ${texFactor(temperature - zeroCelsius)} = ${shown(value)}`,
  },
  {
    key: 'constant', label: 'a constant, as taught', source: { text: 'common practice: the value at 0 °C, 2.501 MJ kg⁻¹ (AMS Glossary of Meteorology, "latent heat")', status: 'common practice' },
    validity: 'near 0 °C', knownError: '2 % at 20 °C, 4 % at 40 °C', constants: ['latentHeat'],
    of: (constants) => {
      const value = constant(constants, 'latentHeat')
      return () => value
    },
    formula: 'L_v = \\text{const.}',
    filled: (_temperature, _constants, value) => `L_v = ${shown(value)}`,
  },
  {
    key: 'kirchhoff', label: 'Kirchhoff’s relation with constant specific heats', source: { text: 'AMS Glossary of Meteorology, "Kirchhoff’s equation"; Emanuel (1994), Atmospheric Convection, Eq. 4.4.4', status: 'from memory' },
    validity: '−40 to 40 °C', knownError: '3 kJ kg⁻¹ at 40 °C', holds: [233.15, 313.15], constants: ['latentHeat', 'cw', 'cpv'],
    of: constants => temperature => kirchhoffLatentHeat(temperature, constants),
    formula: 'L_v = L_0 - (c_w - c_{pv})\\,t',
    filled: (temperature, constants, value) => `L_v = ${texNumber(constant(constants, 'latentHeat') / 1000, 6)} - (${texNumber(constant(constants, 'cw') / 1000)} - ${texNumber(constant(constants, 'cpv') / 1000)}) \\cdot ${texFactor(temperature - zeroCelsius)} = ${shown(value)}`,
  },
  {
    key: 'cubic', label: 'cubic in the temperature', source: { text: 'Rogers & Yau (1989), A Short Course in Cloud Physics, Table 2.1, as a fit', status: 'from memory' },
    validity: '−25 to 40 °C', knownError: '2 kJ kg⁻¹', holds: [248.15, 313.15], constants: [],
    of: () => cubicLatentHeat,
    formula: 'L_v = 2500.8 - 2.36\\,t + 0.0016\\,t^2 - 0.00006\\,t^3',
    filled: (temperature, _constants, value) => `L_v = 2500.8 - 2.36 \\cdot ${texFactor(temperature - zeroCelsius)} + \\dots = ${shown(value)}`,
  },
]

export const sublimationForms: readonly LatentHeatForm[] = [
  {
    key: 'constant', label: 'a constant, as taught', source: { text: 'common practice: the value at 0 °C, 2.834 MJ kg⁻¹ (AMS Glossary of Meteorology, "latent heat")', status: 'common practice' },
    validity: '−40 to 0 °C', knownError: '0.2 %', holds: [233.15, 273.16], constants: ['latentHeatIce'],
    of: (constants) => {
      const value = constant(constants, 'latentHeatIce')
      return () => value
    },
    formula: 'L_s = \\text{const.}',
    filled: (_temperature, _constants, value) => `L_s = ${shown(value)}`,
  },
  {
    key: 'murphy-koop', label: 'Murphy & Koop (2005)', source: { text: 'Murphy & Koop (2005), Q. J. R. Meteorol. Soc. 131, 1539–1565, Eq. 5; coefficients read in transcriptions', status: 'verified' },
    validity: '30 K to 0.01 °C', knownError: '0.1 %', holds: [30, 273.16], constants: [],
    of: () => murphyKoopSublimation,
    formula: 'L_s = \\frac{46782.5 + 35.8925\\,T - 0.07414\\,T^2 + 541.5 \\exp[-(T/123.75)^2]}{0.018015}',
    filled: (temperature, _constants, value) => `L_s(${texQuantity(temperature, 'K', 6)}) = ${shown(value)}`,
  },
  {
    key: 'quadratic', label: 'quadratic in the temperature', source: { text: 'Rogers & Yau (1989), A Short Course in Cloud Physics, Table 2.1, as a fit; coefficients read in transcriptions', status: 'verified' },
    validity: '−40 to 0 °C', knownError: '0.1 %', holds: [233.15, 273.16], constants: [],
    of: () => quadraticSublimation,
    formula: 'L_s = 2834.1 - 0.29\\,t - 0.004\\,t^2',
    filled: (temperature, _constants, value) => `L_s = 2834.1 - 0.29 \\cdot ${texFactor(temperature - zeroCelsius)} - 0.004 \\cdot ${texFactor(temperature - zeroCelsius)}^2 = ${shown(value)}`,
  },
]
