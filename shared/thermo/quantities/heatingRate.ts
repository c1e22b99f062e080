import { heatingAssumption, heatingFormula, heatingInputs, temperatureTendency } from '../heating'
import { differenceAsTemperatureSlip } from '../composedSlips'
import { numberOf } from '../inputs'
import { oneFormula } from '../oneFormula'
import { signSlip, slip } from '../slips'
import { texFactor, texNumber, worked } from '../tex'

/** Heating rate as a rate of temperature, q̇/cp = ΔT/Δt, K s⁻¹. Formula, source and assumption: `heating.ts`. */
export const heatingRateDefinition = oneFormula({
  key: 'heating-rate',
  name: 'heating rate from an observed change of temperature',
  symbol: 'q̇/cp',
  unit: 'K/s',
  shownUnit: 'K/h',
  kind: 'difference',
  nearZero: 0.1 / 3600,
  inputs: heatingInputs,
  constants: [],
  formula: { ...heatingFormula, label: 'ΔT/Δt' },
  ask: `The rate q̇/cp at which heating warms the air, positive where it warms, ${heatingAssumption}.`,
  value: temperatureTendency,
  working(inputs, _constants, result) {
    const change = numberOf(inputs, 'temperatureEnd') - numberOf(inputs, 'temperatureStart'), hours = numberOf(inputs, 'timeBetween') / 3600
    return [
      worked('Change of temperature', '\\Delta T = T_2 - T_1', `\\Delta T = ${texNumber(numberOf(inputs, 'temperatureEnd'), 6)} - ${texNumber(numberOf(inputs, 'temperatureStart'), 6)}`, change, 'K'),
      worked('Without advection and vertical motion heating alone changes the temperature', '\\frac{\\dot q}{c_p} = \\frac{\\Delta T}{\\Delta t}', `\\frac{\\dot q}{c_p} = \\frac{${texFactor(change)}}{${texNumber(hours)}}`, result, 'K/s', { value: result * 3600, unit: 'K/h' }, 5),
    ]
  },
  slips: [
    signSlip('The rate is positive where the air warms: the end less the start.'),
    slip('per-day', 'K per day given as K h⁻¹', 'Your value is the rate per day: divide it by 24 for the rate per hour.', (_i, _c, right) => right * 24),
    slip('per-minute', 'K per minute given as K h⁻¹', 'Your value is the rate per minute: multiply it by 60 for the rate per hour.', (_i, _c, right) => right / 60),
    slip('per-second', 'K per second given as K h⁻¹', 'Your value is the rate per second: multiply it by 3600 for the rate per hour.', (_i, _c, right) => right / 3600),
    slip('time-left-out', 'not divided by the time', 'This is the change of temperature: divide it by the time that it took.', (inputs, _c, right) => right * numberOf(inputs, 'timeBetween') / 3600),
    slip('inverted', 'time over temperature', 'This is Δt/ΔT, turned round.', (_i, _c, right) => right === 0 ? null : 1 / (right * 3600) / 3600),
    slip('clock-hour', 'an hour too few', 'This takes an hour less than has passed, as where the clock was set back in between: time is counted in UTC.', (inputs, _c, right) =>
      numberOf(inputs, 'timeBetween') > 3600 ? right * numberOf(inputs, 'timeBetween') / (numberOf(inputs, 'timeBetween') - 3600) : null),
    differenceAsTemperatureSlip(temperatureTendency, 'temperatureEnd'),
  ],
  example: { inputs: { temperatureStart: 285.15, temperatureEnd: 288.15, timeBetween: 7200 }, gives: 0.000416667, within: 1e-9 },
})
