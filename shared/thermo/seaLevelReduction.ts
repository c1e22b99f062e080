/**
 * Pressure between a station and sea level through a fictitious layer of air whose mean temperature is stated.
 *
 *   p₀ = p_s exp[g z/(R T̄)]     T̄ = T + ½ · 6.5 K km⁻¹ · z, or T̄ = T (isothermal)
 *
 * Source: WMO-No. 8 (Guide to Instruments and Methods of Observation), reduction of station pressure to mean sea level; common practice.
 * The two mean temperatures are two questions: 0.2 hPa apart at 320 m. Valid for stations below about 750 m. Limits: no humidity unless the
 * temperature given is a virtual one.
 */
import { meter, kelvin, pascal } from '../units/brands'
import { celsiusSlip, feetSlip, otherConstantSlip } from './composedSlips'
import { constant } from './constants'
import type { Constants, Inputs, QuantityDefinition } from './definition'
import { fictitiousMeanTemperature, pressureAtHeight, reductionLapseRate } from './hypsometry'
import { lengthInput, pressureInput, temperatureInput } from './inputKinds'
import { numberOf } from './inputs'
import { oneFormula } from './oneFormula'
import { fineSlip, slip } from './slips'
import { texFactor, texNumber, worked } from './tex'

export interface Reduction { key: string, name: string, symbol: string, to: 'sea level' | 'station', mean: 'standard lapse rate' | 'isothermal', ask: string, example: QuantityDefinition['example'] }

/** The definition of one direction with one mean temperature. */
export function seaLevelReduction(of: Reduction): QuantityDefinition {
  const from = of.to === 'sea level' ? 'stationPressure' : 'seaLevelPressure'
  const sign = of.to === 'sea level' ? -1 : 1
  const rate = of.mean === 'isothermal' ? 0 : reductionLapseRate
  const p = (inputs: Inputs) => numberOf(inputs, from), T = (inputs: Inputs) => numberOf(inputs, 'stationTemperature'), z = (inputs: Inputs) => numberOf(inputs, 'stationHeight')
  const through = (inputs: Inputs, constants: Constants, mean: number, direction = sign) => pressureAtHeight(pascal(p(inputs)), meter(direction * z(inputs)), kelvin(mean), constants)
  const meanOf = (inputs: Inputs) => fictitiousMeanTemperature(kelvin(T(inputs)), meter(z(inputs)), rate)
  const value = (inputs: Inputs, constants: Constants) => through(inputs, constants, meanOf(inputs))
  return oneFormula({
    key: of.key, name: of.name, symbol: of.symbol, unit: 'Pa', shownUnit: 'hPa', kind: 'ratio',
    inputs: [
      of.to === 'sea level' ? pressureInput(from, 'station pressure', 'p_s', [40_000, 120_000]) : pressureInput(from, 'pressure reduced to mean sea level', 'p₀', [85_000, 110_000]),
      lengthInput('stationHeight', 'height of the station’s barometer above mean sea level', 'z', [-500, 5000]),
      temperatureInput('stationTemperature', 'air temperature at the station', 'T', [200, 340]),
    ],
    constants: ['g', 'R'],
    formula: {
      key: 'hypsometric', label: `hypsometric equation, ${of.mean === 'isothermal' ? 'T̄ of the station' : '6.5 K km⁻¹'}`,
      source: { text: 'WMO-No. 8, reduction of station pressure to mean sea level; AMS Glossary of Meteorology, "reduction to sea level"', status: 'common practice' },
      validity: 'stations below about 750 m', knownError: 'the mean temperature of air that is not there: 0.2 hPa at 320 m, 2 hPa at 1000 m',
    },
    ask: of.ask, value,
    working(inputs, constants, result) {
      const mean = meanOf(inputs)
      const first = of.mean === 'isothermal'
        ? worked('Mean temperature of the fictitious layer: the station’s, isothermal', '\\overline{T} = T', '\\overline{T}', mean, 'K')
        : worked('Mean temperature of the fictitious layer, half way along 6.5 K km⁻¹', '\\overline{T} = T + \\tfrac12 \\cdot 0.0065\\,z', `\\overline{T} = ${texNumber(T(inputs), 6)} + \\tfrac12 \\cdot 0.0065 \\cdot ${texFactor(z(inputs), 6)}`, mean, 'K')
      const minus = sign > 0 ? '-' : '', symbols = of.to === 'sea level' ? ['p_0', 'p_s'] : ['p_s', 'p_0']
      return [first, worked('Hydrostatic balance through the layer', `${symbols[0]} = ${symbols[1]} \\exp\\frac{${minus}g\\,z}{R\\,\\overline{T}}`, `${symbols[0]} = ${texNumber(p(inputs) / 100, 6)} \\exp\\frac{${minus}${texNumber(constant(constants, 'g'), 6)} \\cdot ${texFactor(z(inputs), 6)}}{${texNumber(constant(constants, 'R'))} \\cdot ${texNumber(mean, 6)}}`, result, 'Pa', { value: result / 100, unit: 'hPa' })]
    },
    slips: [
      slip('wrong-way', 'reduced the other way', 'Sea level has the higher pressure of the two: your value goes the other way.', (inputs, constants) => through(inputs, constants, meanOf(inputs), -sign)),
      celsiusSlip(value, 'stationTemperature'),
      feetSlip(value, 'stationHeight'),
      fineSlip('linear', 'first term of the exponential', 'This takes 1 + x for the exponential of x.', (inputs, constants) => p(inputs) * (1 - sign * constant(constants, 'g') * z(inputs) / (constant(constants, 'R') * meanOf(inputs)))),
      fineSlip('other-mean', of.mean === 'isothermal' ? '6.5 K km⁻¹ for isothermal' : 'isothermal for 6.5 K km⁻¹', of.mean === 'isothermal' ? 'This takes the mean temperature along 6.5 K km⁻¹: here the layer is isothermal.' : 'This takes the station’s temperature for the whole layer: here it rises downwards at 6.5 K km⁻¹.', (inputs, constants) =>
        through(inputs, constants, fictitiousMeanTemperature(kelvin(T(inputs)), meter(z(inputs)), reductionLapseRate - rate))),
      ...(of.mean === 'isothermal' ? [] : [fineSlip('lapse-sign', 'cooled downwards', 'This cools the fictitious air downwards: it is warmer below.', (inputs: Inputs, constants: Constants) => through(inputs, constants, fictitiousMeanTemperature(kelvin(T(inputs)), meter(z(inputs)), -reductionLapseRate)))]),
      otherConstantSlip(value, 'R', 'cp'),
      slip('pascal-for-hectopascal', 'Pa given as hPa', 'Your number is in pascal; the unit beside it says hectopascal.', (_i, _c, right) => right * 100),
    ],
    example: of.example,
  })
}
