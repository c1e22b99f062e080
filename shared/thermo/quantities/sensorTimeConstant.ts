import type { Inputs, QuantityDefinition } from '../definition'
import { numberOf } from '../inputs'
import { timeConstantOfStep } from '../sensorLag'
import { slip } from '../slips'
import { texFactor, texNumber, texQuantity } from '../tex'

/** Time constant of a first-order sensor from its response to a step: see `timeConstantOfStep`. */
export const sensorTimeConstantDefinition: QuantityDefinition = {
  key: 'sensor-time-constant',
  name: 'time constant of a sensor from its step response',
  symbol: 'τ',
  unit: 's',
  shownUnit: 's',
  kind: 'ratio',
  nearZero: 0.1,
  inputs: [
    { name: 'temperatureStart', label: 'temperature of the sensor at the start', symbol: 'T_0', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range: [100, 400] },
    { name: 'airTemperature', label: 'air temperature after the step', symbol: 'T_a', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range: [100, 400] },
    { name: 'elapsedTime', label: 'time since the step', symbol: 't', unit: 's', shownUnit: 's', kind: 'ratio', shape: 'number', range: [0.001, 86_400] },
    { name: 'indicatedTemperature', label: 'temperature that the sensor shows then', symbol: 'T_i', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range: [100, 400] },
  ],
  variants: [{
    key: 'exponential', label: 'first-order response',
    source: { text: 'WMO-No. 8, Guide to Instruments and Methods of Observation, vol. I, ch. 1, time constant', status: 'common practice' },
    validity: 'a sensor with one time constant', knownError: 'grows where the indication has nearly arrived',
    evaluate(inputs) {
      const value = timeConstantOfStep(given(inputs))
      return value === null ? { is: 'not_defined', why: 'The indication has not come closer to the air, or has passed it.' } : { is: 'value', value }
    },
  }],
  constants: [],
  ask: 'The time constant τ of the first-order sensor from what it shows at the given time after the step; "not defined" where it has not come closer to the air.',
  trace(inputs) {
    const { start, air, elapsed, indicated } = given(inputs), value = timeConstantOfStep(given(inputs))
    const first = { text: 'Step, and what is left of it', formula: 'T_0 - T_a;\\quad T_i - T_a', filled: `${texQuantity(start - air, 'K')};\\quad ${texQuantity(indicated - air, 'K')}` }
    if (value === null) return [first]
    return [first, { text: 'Time constant', formula: '\\tau = \\frac{t}{\\ln \\frac{T_0 - T_a}{T_i - T_a}}', filled: `\\tau = \\frac{${texNumber(elapsed)}\\,\\mathrm{s}}{\\ln (${texFactor(start - air)} / ${texFactor(indicated - air)})} = ${texQuantity(value, 's')}`, value, unit: 's' }]
  },
  slips: [
    slip('base-ten', 'log₁₀ for ln', 'This takes the logarithm to base 10: the natural one is needed.', (_i, _c, right) => right * 2.302585092994046),
    slip('multiplied', 'logarithm multiplied', 'This multiplies by the logarithm in place of dividing.', (inputs, _c, right) => numberOf(inputs, 'elapsedTime') * numberOf(inputs, 'elapsedTime') / right),
    slip('inverted', '1/τ for τ', 'This is 1/τ.', (_i, _c, right) => 1 / right),
    slip('in-minutes', 'minutes for seconds', 'Your number is in minutes; the unit beside it says seconds.', (_i, _c, right) => right / 60),
  ],
  example: { inputs: { temperatureStart: 295.15, airTemperature: 288.15, elapsedTime: 30, indicatedTemperature: 289.7119 }, gives: 20, within: 0.001 },
}

const given = (inputs: Inputs) => ({ start: numberOf(inputs, 'temperatureStart'), air: numberOf(inputs, 'airTemperature'), elapsed: numberOf(inputs, 'elapsedTime'), indicated: numberOf(inputs, 'indicatedTemperature') })
