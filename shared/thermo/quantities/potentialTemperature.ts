import { pow } from '../../numerics/elementary'
import { type Kelvin, kelvin, type Pascal, pascal } from '../../units/brands'
import { constant, kappaOf } from '../constants'
import type { Constants, Inputs, QuantityDefinition } from '../definition'
import { numberOf } from '../inputs'
import { poissonTemperature } from '../poisson'
import { constantSlip, slip, zeroCelsius } from '../slips'
import { texNumber, texQuantity } from '../tex'

/**
 * Potential temperature of dry air.
 *
 *   θ = T (p₀ / p)^κ     p₀ = 1000 hPa, κ = R/cp
 *
 * Source: AMS Glossary of Meteorology, "potential temperature".
 * Valid: 150–400 K, 10–1200 hPa. Limits: no water vapor, cp constant.
 *
 * @example potentialTemperature(kelvin(293.15), pascal(85000), closed1004.constants) // 307.09 K
 */
export function potentialTemperature(temperature: Kelvin, pressure: Pascal, constants: Constants): Kelvin {
  return poissonTemperature(temperature, pressure, pascal(constant(constants, 'p0')), constants)
}

const T = (inputs: Inputs) => numberOf(inputs, 'temperature')
const ratio = (inputs: Inputs, constants: Constants) => constant(constants, 'p0') / numberOf(inputs, 'pressure')

export const potentialTemperatureDefinition: QuantityDefinition = {
  key: 'potential-temperature',
  name: 'potential temperature',
  symbol: 'θ',
  unit: 'K',
  shownUnit: 'K',
  kind: 'temperature',
  inputs: [
    { name: 'pressure', label: 'pressure', symbol: 'p', unit: 'Pa', shownUnit: 'hPa', kind: 'ratio', shape: 'number', range: [1000, 120_000] },
    { name: 'temperature', label: 'air temperature', symbol: 'T', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range: [150, 400] },
    { name: 'stationPressure', label: 'station pressure, to know the slip of taking it for 1000 hPa', symbol: 'p_s', unit: 'Pa', shownUnit: 'hPa', kind: 'ratio', shape: 'number', range: [40_000, 120_000], isOptional: true, isForSlips: true },
  ],
  variants: [{
    key: 'poisson',
    label: 'Poisson’s relation, p₀ = 1000 hPa',
    source: { text: 'AMS Glossary of Meteorology, "potential temperature"', status: 'verified' },
    validity: '150–400 K, 10–1200 hPa',
    knownError: 'κ 0.2854 to 0.286: 0.06 K at 700 hPa, 0.57 K at 100 hPa',
    evaluate: (inputs, constants) => ({ is: 'value', value: potentialTemperature(kelvin(T(inputs)), pascal(numberOf(inputs, 'pressure')), constants) }),
  }],
  constants: ['R', 'cp', 'p0', 'kappa'],
  ask: 'The potential temperature θ, referred to 1000 hPa, with κ = R/cp.',
  trace(inputs, constants) {
    const kappa = kappaOf(constants)
    const value = potentialTemperature(kelvin(T(inputs)), pascal(numberOf(inputs, 'pressure')), constants)
    return [
      constants.kappa === undefined
        ? { text: 'Exponent', formula: '\\kappa = \\frac{R}{c_p}', filled: `\\kappa = \\frac{${texNumber(constant(constants, 'R'))}}{${texNumber(constant(constants, 'cp'), 6)}} = ${texNumber(kappa)}`, value: kappa, unit: '1' }
        : { text: 'Exponent, as the convention names it', formula: '\\kappa', filled: `\\kappa = ${texNumber(kappa)}`, value: kappa, unit: '1' },
      { text: 'Poisson’s relation, with T in kelvin', formula: '\\theta = T \\left(\\frac{p_0}{p}\\right)^{\\kappa}', filled: `\\theta = ${texNumber(T(inputs))} \\left(\\frac{${texNumber(constant(constants, 'p0') / 100)}}{${texNumber(numberOf(inputs, 'pressure') / 100)}}\\right)^{${texNumber(kappa)}} = ${texQuantity(value, 'K')}`, value, unit: 'K' },
    ]
  },
  slips: [
    slip('standard-pressure', '1013.25 hPa for 1000 hPa', 'This refers to 1013.25 hPa: θ refers to 1000 hPa.', (_i, constants, right) => right * pow(101_325 / constant(constants, 'p0'), kappaOf(constants))),
    slip('station-pressure', 'station pressure for 1000 hPa', 'This refers to the pressure of the station: θ refers to 1000 hPa.', (inputs, constants, right) => {
      const station = inputs.stationPressure
      return typeof station === 'number' && station !== constant(constants, 'p0') ? right * pow(station / constant(constants, 'p0'), kappaOf(constants)) : null
    }),
    slip('celsius-for-kelvin', 'Celsius put in for kelvin', 'This is what comes out with the temperature in °C: Poisson’s relation takes kelvin.', (inputs, constants) => {
      return zeroCelsius + (T(inputs) - zeroCelsius) * pow(ratio(inputs, constants), kappaOf(constants))
    }),
    slip('celsius-for-kelvin-as-kelvin', 'Celsius put in, given as kelvin', 'This is what comes out with the temperature in °C, and the result called kelvin.', (inputs, constants) => {
      const t = (T(inputs) - zeroCelsius) * pow(ratio(inputs, constants), kappaOf(constants))
      return t > 0 ? t : null
    }),
    slip('inverted-ratio', 'ratio of pressures turned round', 'This comes from p/p₀ in place of p₀/p.', (inputs, constants) => T(inputs) * pow(ratio(inputs, constants), -kappaOf(constants))),
    slip('inverted-exponent', 'exponent turned round', 'This comes from the exponent cp/R in place of R/cp.', (inputs, constants) => {
      const value = T(inputs) * pow(ratio(inputs, constants), 1 / kappaOf(constants))
      return Number.isFinite(value) ? value : null
    }),
    slip('cv-for-cp', 'cv for cp', 'This comes from the exponent R/cv in place of R/cp.', (inputs, constants) => T(inputs) * pow(ratio(inputs, constants), constant(constants, 'R') / constant(constants, 'cv'))),
    slip('end-unit', '°C given as kelvin', 'Your number is the temperature in °C; the unit beside it says kelvin.', (_i, _c, right) => right > zeroCelsius ? right - zeroCelsius : null),
    constantSlip('zero-273', '273 for 273.15', 'This comes from 273 in place of 273.15 between °C and kelvin.', (inputs, constants) => (T(inputs) - 0.15) * pow(ratio(inputs, constants), kappaOf(constants))),
  ],
  example: { inputs: { pressure: 85_000, temperature: 293.15 }, gives: 307.0902, within: 0.0001 },
}
