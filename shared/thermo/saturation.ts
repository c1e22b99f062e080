/**
 * Saturation vapor pressure of pure water, by the forms that are in use: over liquid water and over ice. Each with its source, stated range and
 * known error against the saturation line of IAPWS-95 (Wagner & Pruß) above 0 °C and Murphy & Koop (2005) below, as a test measures them.
 *
 * The forms are plain numbers in and out (K, Pa), because they stand in the innermost loops of parcels.
 */
import { exp, log, log10, pow } from '../numerics/elementary'
import type { Source } from './definition'
import { texFactor, texNumber, texQuantity } from './tex'

export interface SaturationForm {
  key: string
  label: string
  source: Source
  validity: string
  knownError: string
  /** Inclusive, K. */
  holds: readonly [number, number]
  /** Pa from K. */
  pressure: (temperature: number) => number
  /** K from Pa, where the form can be solved for the temperature in closed form. */
  temperature?: (pressure: number) => number
  formula: string
  filled: (temperature: number) => string
}

const zeroCelsius = 273.15

/** A form of Magnus' kind: a exp[b t / (t + c)], with t in °C. It can be solved for t. */
interface MagnusCoefficients { a: number, b: number, c: number }

function magnus({ a, b, c }: MagnusCoefficients, symbol: string): Pick<SaturationForm, 'pressure' | 'temperature' | 'formula' | 'filled'> {
  return {
    pressure: (temperature) => {
      const t = temperature - zeroCelsius
      return a * exp((b * t) / (t + c))
    },
    temperature: (pressure) => {
      const logarithm = log(pressure / a)
      return zeroCelsius + (c * logarithm) / (b - logarithm)
    },
    formula: `${symbol} = ${texNumber(a / 100, 6)} \\exp\\frac{${texNumber(b, 6)}\\,t}{t + ${texNumber(c, 6)}}`,
    filled: (temperature) => {
      const t = temperature - zeroCelsius
      return `${symbol} = ${texNumber(a / 100, 6)} \\exp\\frac{${texNumber(b, 6)} \\cdot ${texFactor(t)}}{${texNumber(t)} + ${texNumber(c, 6)}} = ${texQuantity(a * exp((b * t) / (t + c)) / 100, 'hPa', 6)}`
    },
  }
}

/** A form whose terms are too many to print with numbers: the temperature is put in, and the result stands behind. */
const long = (symbol: string, formula: string, pressure: (temperature: number) => number): Pick<SaturationForm, 'pressure' | 'formula' | 'filled'> => ({
  pressure, formula,
  filled: temperature => `${symbol}(${texQuantity(temperature, 'K', 6)}) = ${texQuantity(pressure(temperature) / 100, 'hPa', 6)}`,
})

/**
 * Saturation vapor pressure over liquid water.
 *
 *   eₛ = 611.2 exp[17.67 t / (t + 243.5)]     t in °C, eₛ in Pa
 *
 * Source: Bolton (1980), Mon. Wea. Rev. 108, 1046–1053, Eq. 10.
 * Valid: 243.15–308.15 K, within 0.1 % of the tables it was fitted to. Limits: no ice, no enhancement factor.
 *
 * @example boltonOverWater(293.15) // 2336.95 Pa
 */
export function boltonOverWater(temperature: number): number {
  const t = temperature - zeroCelsius
  return 611.2 * exp((17.67 * t) / (t + 243.5))
}

/**
 * Saturation vapor pressure over liquid water, supercooled or not.
 *
 *   ln e = 54.842763 − 6763.22/T − 4.210 ln T + 0.000367 T + tanh[0.0415 (T − 218.8)] (53.878 − 1331.22/T − 9.44523 ln T + 0.014025 T)
 *
 * Source: Murphy & Koop (2005), Q. J. R. Meteorol. Soc. 131, 1539–1565, Eq. 10.
 * Valid: 123–332 K, within 0.05 % of the data above 0 °C, less certain when supercooled.
 *
 * @example murphyKoopOverWater(300) // 3536.77 Pa
 */
export function murphyKoopOverWater(temperature: number): number {
  const logT = log(temperature)
  const tanh = 1 - 2 / (exp(2 * 0.0415 * (temperature - 218.8)) + 1)
  return exp(54.842763 - 6763.22 / temperature - 4.21 * logT + 0.000367 * temperature
    + tanh * (53.878 - 1331.22 / temperature - 9.44523 * logT + 0.014025 * temperature))
}

/**
 * Saturation line of ordinary water, from its triple to its critical point.
 *
 *   ln(p/p_c) = (T_c/T)(a₁τ + a₂τ^1.5 + a₃τ³ + a₄τ^3.5 + a₅τ⁴ + a₆τ^7.5)     τ = 1 − T/T_c
 *
 * Source: Wagner & Pruß (2002), J. Phys. Chem. Ref. Data 31, 387–535, Eq. 2.5; IAPWS SR1-86(1992).
 * Valid: 273.16–647.096 K, within 0.02 % of IAPWS-95. Limits: an extrapolation below 0 °C.
 *
 * @example wagnerPrussOverWater(300) // 3536.7 Pa
 */
export function wagnerPrussOverWater(temperature: number): number {
  const tau = 1 - temperature / 647.096
  const root = pow(tau, 0.5)
  const cube = tau * tau * tau
  const sum = -7.85951783 * tau + 1.84408259 * tau * root - 11.7866497 * cube + 22.6807411 * cube * root - 15.9618719 * cube * tau + 1.80122502 * cube * cube * tau * root
  return 22_064_000 * exp((647.096 / temperature) * sum)
}

/**
 * Saturation pressure of the industrial formulation: a quadratic in p^¼ whose coefficients are quadratics in ϑ.
 *
 *   p = 10⁶ [2C / (−B + √(B² − 4AC))]⁴     ϑ = T + n₉/(T − n₁₀), A = ϑ² + n₁ϑ + n₂, B = n₃ϑ² + n₄ϑ + n₅, C = n₆ϑ² + n₇ϑ + n₈
 *
 * Source: IAPWS R7-97(2012), Eq. 30, Table 34. Valid: 273.15–647.096 K, within 0.025 % of IAPWS-95.
 *
 * @example industrialOverWater(300) // 3536.59 Pa
 */
export function industrialOverWater(temperature: number): number {
  const theta = temperature - 0.23855557567849 / (temperature - 650.17534844798)
  const A = theta * theta + 1167.0521452767 * theta - 724213.16703206
  const B = -17.073846940092 * theta * theta + 12020.824702470 * theta - 3232555.0322333
  const C = 14.915108613530 * theta * theta - 4823.2657361591 * theta + 405113.40542057
  const root = 2 * C / (-B + pow(B * B - 4 * A * C, 0.5))
  return 1e6 * root * root * root * root
}

/**
 * Saturation vapor pressure over liquid water by the table that was printed for half a century.
 *
 *   log₁₀ e = −7.90298 (T_s/T − 1) + 5.02808 log₁₀(T_s/T) − 1.3816·10⁻⁷ (10^[11.344 (1 − T/T_s)] − 1)
 *             + 8.1328·10⁻³ (10^[−3.49149 (T_s/T − 1)] − 1) + log₁₀ 1013.246     T_s = 373.16 K, e in hPa
 *
 * Source: Goff & Gratch (1946), Trans. ASHVE 52, 95–121; Smithsonian Meteorological Tables (List 1951), Table 94.
 * Valid: 223.15–375.15 K. Limits: 0.1 % below newer forms. In its kelvin 0 °C is 273.16, so 0.01 is added to T.
 *
 * @example goffGratchOverWater(293.15) // 2337.3 Pa
 */
export function goffGratchOverWater(temperature: number): number {
  const ratio = 373.16 / (temperature + 0.01)
  const exponent = -7.90298 * (ratio - 1) + 5.02808 * log10(ratio)
    - 1.3816e-7 * (pow(10, 11.344 * (1 - 1 / ratio)) - 1) + 8.1328e-3 * (pow(10, -3.49149 * (ratio - 1)) - 1)
  return 101_324.6 * pow(10, exponent)
}

/**
 * Saturation vapor pressure over ice.
 *
 *   ln e = 9.550426 − 5723.265/T + 3.53068 ln T − 0.00728332 T
 *
 * Source: Murphy & Koop (2005), Q. J. R. Meteorol. Soc. 131, 1539–1565, Eq. 7. Valid: 110–273.16 K.
 *
 * @example murphyKoopOverIce(240) // 27.272 Pa
 */
export function murphyKoopOverIce(temperature: number): number {
  return exp(9.550426 - 5723.265 / temperature + 3.53068 * log(temperature) - 0.00728332 * temperature)
}

/**
 * Sublimation pressure of ice.
 *
 *   ln(p/p_t) = θ⁻¹ Σ aᵢ θ^bᵢ     θ = T/273.16 K, p_t = 611.657 Pa
 *
 * Source: IAPWS R14-08(2011), Eq. 6, Table 3. Valid: 50–273.16 K.
 *
 * @example sublimationPressure(230) // 8.94735 Pa
 */
export function sublimationPressure(temperature: number): number {
  const theta = temperature / 273.16
  const sum = -21.2144006 * pow(theta, 0.00333333333) + 27.3203819 * pow(theta, 1.20666667) - 6.1059813 * pow(theta, 1.70333333)
  return 611.657 * exp(sum / theta)
}

/**
 * Saturation vapor pressure over ice by the Smithsonian tables.
 *
 *   log₁₀ e = −9.09718 (T₀/T − 1) − 3.56654 log₁₀(T₀/T) + 0.876793 (1 − T/T₀) + log₁₀ 6.1071     T₀ = 273.16 K, e in hPa
 *
 * Source: Goff & Gratch (1946); Smithsonian Meteorological Tables (List 1951), Table 96. Valid: 173.15–273.16 K. In its kelvin 0 °C is 273.16.
 *
 * @example goffGratchOverIce(253.15) // 103.17 Pa
 */
export function goffGratchOverIce(temperature: number): number {
  const ratio = 273.16 / (temperature + 0.01)
  return 610.71 * pow(10, -9.09718 * (ratio - 1) - 3.56654 * log10(ratio) + 0.876793 * (1 - 1 / ratio))
}

const water = 'e_s', ice = 'e_i'
const murphyKoop: Source = { text: 'Murphy & Koop (2005), Q. J. R. Meteorol. Soc. 131, 1539–1565, Eq. 10', status: 'verified' }
const goffGratch: Source = { text: 'Goff & Gratch (1946), Trans. ASHVE 52, 95–121; Smithsonian Meteorological Tables (List 1951), Table 94; coefficients read in transcriptions', status: 'verified' }

/** The first is the default; where a convention says "next", the order is that of the ranges. */
export const overWaterForms: readonly SaturationForm[] = [
  {
    key: 'bolton', label: 'Bolton (1980)', source: { text: 'Bolton (1980), Mon. Wea. Rev. 108, 1046–1053, Eq. 10', status: 'verified' },
    validity: '−30 to 35 °C', knownError: '0.1 % above −10 °C and 0.2 % at −30 °C; +0.14 % at 40 °C, +0.26 % at 45 °C', holds: [243.15, 308.15],
    ...magnus({ a: 611.2, b: 17.67, c: 243.5 }, water), pressure: boltonOverWater,
  },
  {
    key: 'wmo', label: 'Magnus form of WMO-No. 8', source: { text: 'WMO-No. 8, Guide to Instruments and Methods of Observation, Annex 4.B', status: 'verified' },
    validity: '−45 to 60 °C', knownError: '−0.3 % at 20 to 35 °C, +0.5 % at −30 °C', holds: [228.15, 333.15],
    ...magnus({ a: 611.2, b: 17.62, c: 243.12 }, water),
  },
  {
    key: 'murphy-koop', label: 'Murphy & Koop (2005)', source: murphyKoop,
    validity: '123 to 332 K', knownError: '0.05 % above 0 °C', holds: [123, 332],
    ...long(water, '\\ln e_s = 54.842763 - \\frac{6763.22}{T} - 4.210 \\ln T + 0.000367\\,T + \\tanh[0.0415\\,(T - 218.8)]\\left(53.878 - \\frac{1331.22}{T} - 9.44523 \\ln T + 0.014025\\,T\\right)', murphyKoopOverWater),
  },
  {
    key: 'wagner-pruss', label: 'Wagner & Pruß, saturation line of IAPWS-95', source: { text: 'Wagner & Pruß (2002), J. Phys. Chem. Ref. Data 31, 387–535, Eq. 2.5', status: 'verified' },
    validity: '0.01 °C to the critical point', knownError: '0.02 %', holds: [273.16, 647.096],
    ...long(water, '\\ln\\frac{e_s}{p_c} = \\frac{T_c}{T}\\left(a_1\\tau + a_2\\tau^{1.5} + a_3\\tau^{3} + a_4\\tau^{3.5} + a_5\\tau^{4} + a_6\\tau^{7.5}\\right),\\quad \\tau = 1 - \\frac{T}{T_c}', wagnerPrussOverWater),
  },
  {
    key: 'industrial', label: 'IAPWS industrial formulation (IF97)', source: { text: 'IAPWS R7-97(2012), Eq. 30, Table 34', status: 'verified' },
    validity: '0 °C to the critical point', knownError: '0.03 %', holds: [273.15, 647.096],
    ...long(water, 'e_s = \\left[\\frac{2C}{-B + \\sqrt{B^2 - 4AC}}\\right]^4,\\quad A, B, C \\text{ quadratic in } \\vartheta = T + \\frac{n_9}{T - n_{10}}', industrialOverWater),
  },
  {
    key: 'goff-gratch', label: 'Goff & Gratch (1946)', source: goffGratch,
    validity: '−50 to 102 °C', knownError: '0.1 % above −40 °C', holds: [223.15, 375.15],
    ...long(water, '\\log_{10} e_s = -7.90298\\left(\\frac{T_s}{T} - 1\\right) + 5.02808 \\log_{10}\\frac{T_s}{T} - 1.3816\\times 10^{-7}\\left(10^{11.344(1 - T/T_s)} - 1\\right) + 8.1328\\times 10^{-3}\\left(10^{-3.49149(T_s/T - 1)} - 1\\right) + \\log_{10} 1013.246', goffGratchOverWater),
  },
  {
    key: 'buck', label: 'Buck (1981)', source: { text: 'Buck (1981), J. Appl. Meteor. 20, 1527–1532, Table 2, e_w1; coefficients read in transcriptions', status: 'verified' },
    validity: '−20 to 50 °C', knownError: '0.14 %', holds: [253.15, 323.15],
    ...magnus({ a: 611.21, b: 17.502, c: 240.97 }, water),
  },
  {
    key: 'tetens', label: 'Tetens (1930)', source: { text: 'Tetens (1930), Z. Geophys. 6, 297–309, with the coefficients 17.27 and 237.3 of FAO Irrigation and Drainage Paper 56, Eq. 11', status: 'verified' },
    validity: '0 to 40 °C', knownError: '0.13 % within; −0.7 % at −20 °C', holds: [273.15, 313.15],
    ...magnus({ a: 610.78, b: 17.27, c: 237.3 }, water),
  },
]

export const overIceForms: readonly SaturationForm[] = [
  {
    key: 'murphy-koop', label: 'Murphy & Koop (2005)', source: { ...murphyKoop, text: 'Murphy & Koop (2005), Q. J. R. Meteorol. Soc. 131, 1539–1565, Eq. 7' },
    validity: '110 K to 0.01 °C', knownError: '0.07 % above −80 °C', holds: [110, 273.16],
    ...long(ice, '\\ln e_i = 9.550426 - \\frac{5723.265}{T} + 3.53068 \\ln T - 0.00728332\\,T', murphyKoopOverIce),
  },
  {
    key: 'sublimation', label: 'IAPWS sublimation curve', source: { text: 'IAPWS R14-08(2011), Eq. 6, Table 3', status: 'verified' },
    validity: '50 K to 0.01 °C', knownError: '0.1 % above −100 °C', holds: [50, 273.16],
    ...long(ice, '\\ln\\frac{e_i}{p_t} = \\frac{1}{\\theta}\\left(a_1\\theta^{b_1} + a_2\\theta^{b_2} + a_3\\theta^{b_3}\\right),\\quad \\theta = \\frac{T}{273.16}', sublimationPressure),
  },
  {
    key: 'wmo', label: 'Magnus form of WMO-No. 8', source: { text: 'WMO-No. 8, Guide to Instruments and Methods of Observation, Annex 4.B; coefficients read in transcriptions', status: 'verified' },
    validity: '−65 to 0 °C', knownError: '0.25 %', holds: [208.15, 273.16],
    ...magnus({ a: 611.2, b: 22.46, c: 272.62 }, ice),
  },
  {
    key: 'goff-gratch', label: 'Goff & Gratch (1946)', source: { ...goffGratch, text: 'Goff & Gratch (1946), Trans. ASHVE 52, 95–121; Smithsonian Meteorological Tables (List 1951), Table 96; coefficients read in transcriptions' },
    validity: '−100 to 0 °C', knownError: '0.35 %', holds: [173.15, 273.16],
    ...long(ice, '\\log_{10} e_i = -9.09718\\left(\\frac{T_0}{T} - 1\\right) - 3.56654 \\log_{10}\\frac{T_0}{T} + 0.876793\\left(1 - \\frac{T}{T_0}\\right) + \\log_{10} 6.1071', goffGratchOverIce),
  },
]
