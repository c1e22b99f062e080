import { heatingAssumption, heatingFormula, heatingInputs, temperatureTendency } from '../heating'
import { constant } from '../constants'
import { differenceAsTemperatureSlip, otherConstantSlip } from '../composedSlips'
import type { Constants, Inputs } from '../definition'
import { numberOf } from '../inputs'
import { oneFormula } from '../oneFormula'
import { signSlip, slip } from '../slips'
import { texFactor, texNumber, worked } from '../tex'

const value = (inputs: Inputs, constants: Constants) => constant(constants, 'cp') * temperatureTendency(inputs)

/** Heating per kilogram, q̇ = cp ΔT/Δt, W kg⁻¹. Formula, source and assumption: `heating.ts`. */
export const specificHeatingRateDefinition = oneFormula({
  key: 'specific-heating-rate',
  name: 'heating per kilogram from an observed change of temperature',
  symbol: 'q̇',
  unit: 'W/kg',
  shownUnit: 'W/kg',
  kind: 'difference',
  nearZero: 0.01,
  inputs: heatingInputs,
  constants: ['cp'],
  formula: { ...heatingFormula, label: 'cp ΔT/Δt' },
  ask: `The heating q̇ of the air per kilogram, positive where it is heated, ${heatingAssumption}.`,
  value,
  working(inputs, constants, result) {
    const rate = temperatureTendency(inputs)
    return [
      worked('Rate of temperature, in seconds', '\\frac{\\Delta T}{\\Delta t} = \\frac{T_2 - T_1}{\\Delta t}', `\\frac{\\Delta T}{\\Delta t} = \\frac{${texNumber(numberOf(inputs, 'temperatureEnd'), 6)} - ${texNumber(numberOf(inputs, 'temperatureStart'), 6)}}{${texNumber(numberOf(inputs, 'timeBetween'), 6)}}`, rate, 'K/s', undefined, 5),
      worked('Without advection and vertical motion heating alone changes the temperature', '\\dot q = c_p \\frac{\\Delta T}{\\Delta t}', `\\dot q = ${texNumber(constant(constants, 'cp'), 6)} \\cdot ${texFactor(rate)}`, result, 'W/kg', undefined, 5),
    ]
  },
  slips: [
    signSlip('The heating is positive where the air warms: the end less the start.'),
    slip('hours-for-seconds', 'hours put in for seconds', 'This is per hour: a watt is a joule a second.', (_i, _c, right) => right * 3600),
    slip('minutes-for-seconds', 'minutes put in for seconds', 'This is per minute: a watt is a joule a second.', (_i, _c, right) => right * 60),
    slip('time-left-out', 'not divided by the time', 'This is the heat cp ΔT: divide it by the time that it took.', (inputs, _c, right) => right * numberOf(inputs, 'timeBetween')),
    otherConstantSlip(value, 'cp', 'cv'),
    slip('cp-left-out', 'cp left out', 'This is the rate of temperature in K s⁻¹: multiply it by cp.', (_i, constants, right) => right / constant(constants, 'cp')),
    differenceAsTemperatureSlip(value, 'temperatureEnd'),
  ],
  example: { inputs: { temperatureStart: 285.15, temperatureEnd: 288.15, timeBetween: 7200 }, gives: 0.418333, within: 0.000001 },
})
