import { exp } from '../../numerics/elementary'
import type { Inputs, QuantityDefinition } from '../definition'
import { numberOf } from '../inputs'
import { stepResponse, timeConstantInput } from '../sensorLag'
import { slip, zeroCelsius } from '../slips'
import { texFactor, texNumber, texQuantity } from '../tex'

/** What a first-order sensor shows some time after a step: see `stepResponse`. */
export const sensorStepResponseDefinition: QuantityDefinition = {
  key: 'sensor-step-response',
  name: 'indication of a first-order sensor after a step',
  symbol: 'T_i',
  unit: 'K',
  shownUnit: 'Cel',
  kind: 'temperature',
  inputs: [
    { name: 'temperatureStart', label: 'temperature of the sensor at the start', symbol: 'T_0', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range: [100, 400] },
    { name: 'airTemperature', label: 'air temperature after the step', symbol: 'T_a', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range: [100, 400] },
    { name: 'elapsedTime', label: 'time since the step', symbol: 't', unit: 's', shownUnit: 's', kind: 'ratio', shape: 'number', range: [0, 86_400] },
    { ...timeConstantInput, range: [0.001, 3600] },
  ],
  variants: [{
    key: 'exponential', label: 'first-order response',
    source: { text: 'WMO-No. 8, Guide to Instruments and Methods of Observation, vol. I, ch. 1, time constant', status: 'common practice' },
    validity: 'a sensor with one time constant', knownError: 'the time constant depends on ventilation',
    evaluate: inputs => ({ is: 'value', value: stepResponse(given(inputs)) }),
  }],
  constants: [],
  ask: 'The temperature T_i that a first-order sensor shows at the given time after it was brought into air of another temperature.',
  trace(inputs) {
    const { start, air, elapsed, timeConstant } = given(inputs), rest = exp(-elapsed / timeConstant), value = stepResponse(given(inputs))
    return [
      { text: 'Part of the step that is left', formula: 'e^{-t/\\tau}', filled: `e^{-${texNumber(elapsed)}/${texNumber(timeConstant)}} = ${texNumber(rest)}`, value: rest, unit: '1' },
      { text: 'Indication', formula: 'T_i = T_a + (T_0 - T_a) e^{-t/\\tau}', filled: `T_i = ${texNumber(air, 6)} + ${texFactor(start - air)} \\times ${texNumber(rest)}\\,\\mathrm{K} = ${texQuantity(value, 'K', 6)} = ${texQuantity(value - zeroCelsius, 'Cel')}`, value, unit: 'K' },
    ]
  },
  slips: [
    slip('parts-swapped', 'done part for the part left', 'This takes e^(−t/τ) for the part of the step that is done: it is the part that is left.', (inputs) => {
      const { start, air, elapsed, timeConstant } = given(inputs)
      return start + (air - start) * exp(-elapsed / timeConstant)
    }),
    slip('ratio-inverted', 'τ/t for t/τ', 'The exponent is t/τ, not τ/t.', (inputs) => {
      const { start, air, elapsed, timeConstant } = given(inputs)
      return elapsed > 0 ? air + (start - air) * exp(-timeConstant / elapsed) : null
    }),
    slip('sign-of-exponent', 'sign of the exponent', 'The exponent has to be negative: the difference shrinks.', (inputs) => {
      const { start, air, elapsed, timeConstant } = given(inputs)
      return elapsed / timeConstant < 20 ? air + (start - air) * exp(elapsed / timeConstant) : null
    }),
    slip('base-ten', '10 for e', 'This takes powers of 10 in place of e.', (inputs) => {
      const { start, air, elapsed, timeConstant } = given(inputs)
      return air + (start - air) * exp(-2.302585092994046 * elapsed / timeConstant)
    }),
    slip('linear', 'linear in time', 'This takes the step as done in proportion to t/τ: the response is exponential.', (inputs) => {
      const { start, air, elapsed, timeConstant } = given(inputs)
      return elapsed < timeConstant ? start + (air - start) * elapsed / timeConstant : null
    }),
  ],
  example: { inputs: { temperatureStart: 295.15, airTemperature: 288.15, elapsedTime: 30, timeConstant: 20 }, gives: 289.7119, within: 0.0001 },
}

const given = (inputs: Inputs) => ({ start: numberOf(inputs, 'temperatureStart'), air: numberOf(inputs, 'airTemperature'), elapsed: numberOf(inputs, 'elapsedTime'), timeConstant: numberOf(inputs, 'timeConstant') })
