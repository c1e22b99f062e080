/**
 * Measures of humidity into each other: plain numbers, SI (Pa, kg kg⁻¹, K), because they stand in the innermost loops of parcels.
 * ε = R/Rv by the convention.
 */

/**
 * Mixing ratio, mass of vapor per mass of dry air.
 *
 *   w = ε e / (p − e)
 *
 * Source: AMS Glossary of Meteorology, "mixing ratio". Valid: e < p.
 *
 * @example mixingRatioFrom(1000, 100000, 0.62189) // 0.0062817 kg kg⁻¹
 */
export const mixingRatioFrom = (vaporPressure: number, pressure: number, epsilon: number): number => epsilon * vaporPressure / (pressure - vaporPressure)

/**
 * Vapor pressure of air with a mixing ratio.
 *
 *   e = w p / (ε + w)
 *
 * Source: AMS Glossary of Meteorology, "mixing ratio", solved for e.
 *
 * @example vaporPressureFrom(0.0062817, 100000, 0.62189) // 1000 Pa
 */
export const vaporPressureFrom = (mixingRatio: number, pressure: number, epsilon: number): number => mixingRatio * pressure / (epsilon + mixingRatio)

/**
 * Specific humidity, mass of vapor per mass of moist air.
 *
 *   q = w / (1 + w)
 *
 * Source: AMS Glossary of Meteorology, "specific humidity".
 *
 * @example specificHumidityFrom(0.015) // 0.014778 kg kg⁻¹
 */
export const specificHumidityFrom = (mixingRatio: number): number => mixingRatio / (1 + mixingRatio)

/**
 * Mixing ratio of air with a specific humidity.
 *
 *   w = q / (1 − q)
 *
 * Source: AMS Glossary of Meteorology, "specific humidity", solved for w. Valid: q < 1.
 *
 * @example mixingRatioOfSpecificHumidity(0.0147783) // 0.015 kg kg⁻¹
 */
export const mixingRatioOfSpecificHumidity = (specificHumidity: number): number => specificHumidity / (1 - specificHumidity)

/**
 * Virtual temperature: that of dry air of the same density at the same pressure.
 *
 *   Tv = T (1 + w/ε) / (1 + w)
 *
 * Source: AMS Glossary of Meteorology, "virtual temperature". T in kelvin.
 *
 * @example virtualTemperatureFrom(303.15, 0.02, 0.62189) // 306.76 K
 */
export const virtualTemperatureFrom = (temperature: number, mixingRatio: number, epsilon: number): number => temperature * (1 + mixingRatio / epsilon) / (1 + mixingRatio)
