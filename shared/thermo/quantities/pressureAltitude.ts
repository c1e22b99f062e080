import { log, pow } from '../../numerics/elementary'
import { pascal } from '../../units/brands'
import type { Inputs } from '../definition'
import { pressureInput } from '../inputKinds'
import { numberOf } from '../inputs'
import { oneFormula } from '../oneFormula'
import { slip } from '../slips'
import { standardConstants, standardHeight } from '../standardAtmosphere'
import { texNumber, worked } from '../tex'

const p = (inputs: Inputs) => numberOf(inputs, 'pressure')
const value = (inputs: Inputs) => standardHeight(pascal(p(inputs)))
const { gravity, gasConstant, temperature, pressure: groundPressure } = standardConstants

/**
 * Pressure altitude: the geopotential height at which the standard atmosphere has a pressure. Formula and source: `standardAtmosphere.ts`.
 * It is no height of an instrument: in air 15 K colder than the standard, a pressure altitude of 1000 m is at 947 m.
 */
export const pressureAltitudeDefinition = oneFormula({
  key: 'pressure-altitude',
  name: 'pressure altitude',
  symbol: 'H_p',
  unit: 'm',
  shownUnit: 'm',
  kind: 'difference',
  nearZero: 100,
  inputs: [pressureInput('pressure', 'pressure', 'p', [868, 127_774])],
  constants: [],
  formula: {
    key: 'standard', label: 'height in the standard atmosphere', source: { text: 'ISO 2533:1975; ICAO Doc 7488/3 (1993); U.S. Standard Atmosphere 1976, Eqs. 33a, 33b', status: 'verified' },
    validity: '−2 to 32 km', knownError: 'R 287.05 for 287.05287: 0.3 m at 3 km',
  },
  ask: 'The pressure altitude: the geopotential height at which the standard atmosphere has the pressure. It is not the height of the instrument.',
  value,
  working(inputs, _constants, result) {
    const shown = texNumber(p(inputs) / 100, 6)
    if (result <= 11_000) {
      return [worked('Standard atmosphere, solved for the height', 'H_p = \\frac{T_0}{0.0065}\\left[1 - \\left(\\frac{p}{p_0}\\right)^{0.0065\\,R/g_0}\\right]', `H_p = \\frac{${texNumber(temperature, 6)}}{0.0065}\\left[1 - \\left(\\frac{${shown}}{1013.25}\\right)^{${texNumber(gasConstant * 0.0065 / gravity, 6)}}\\right]`, result, 'm', undefined, 7)]
    }
    if (result <= 20_000) return [worked('Standard atmosphere, isothermal above 11 km', 'H_p = 11\\,000 + \\frac{R\\,T}{g_0} \\ln\\frac{p_{11}}{p}', `H_p = 11\\,000 + \\frac{${texNumber(gasConstant, 8)} \\cdot 216.65}{${texNumber(gravity, 6)}} \\ln\\frac{226.321}{${shown}}`, result, 'm', undefined, 7)]
    return [worked('Standard atmosphere above 20 km, 1 K warmer for each kilometer', 'H_p = 20\\,000 + \\frac{216.65}{0.001}\\left[\\left(\\frac{p_{20}}{p}\\right)^{0.001\\,R/g_0} - 1\\right]', `H_p = 20\\,000 + \\frac{216.65}{0.001}\\left[\\left(\\frac{54.7489}{${shown}}\\right)^{${texNumber(gasConstant * 0.001 / gravity, 6)}} - 1\\right]`, result, 'm', undefined, 7)]
  },
  slips: [
    slip('isothermal', 'one temperature throughout', 'This takes 288.15 K all the way up: the standard atmosphere is colder aloft.', inputs => gasConstant * temperature / gravity * log(groundPressure / p(inputs))),
    slip('from-1000', '1000 hPa at sea level', 'This starts from 1000 hPa: the standard atmosphere has 1013.25 hPa at sea level.', (inputs) => {
      const raised = p(inputs) * groundPressure / 100_000
      return raised > 127_773 ? null : standardHeight(pascal(raised))
    }),
    slip('inverted-exponent', 'exponent turned round', 'This comes from the exponent turned round, its inverse.', inputs => temperature / 0.0065 * (1 - pow(p(inputs) / groundPressure, gravity / (gasConstant * 0.0065)))),
    slip('dry-adiabat', '9.8 K km⁻¹ for 6.5', 'This comes from the dry adiabatic lapse rate: the standard atmosphere has 6.5 K km⁻¹.', inputs => temperature / 0.0098 * (1 - pow(p(inputs) / groundPressure, gasConstant * 0.0098 / gravity))),
    slip('feet', 'feet given as meters', 'Your number is in feet; the unit beside it says meters.', (_i, _c, right) => right / 0.3048),
    slip('kilometers', 'km given as m', 'Your number is in kilometers; the unit beside it says meters.', (_i, _c, right) => right / 1000),
  ],
  example: { inputs: { pressure: 89_874.57 }, gives: 1000, within: 0.01 },
})
