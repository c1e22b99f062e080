import type { Inputs, QuantityDefinition } from '../definition'
import { numberOf } from '../inputs'
import { steadyLagError, timeConstantInput, verticalSpeedInput } from '../sensorLag'
import { signSlip, slip } from '../slips'
import { texFactor, texNumber, texQuantity } from '../tex'

/** Error of a lagging sensor in steady ascent or descent: see `steadyLagError`. */
export const sensorLagErrorDefinition: QuantityDefinition = {
  key: 'sensor-lag-error',
  name: 'lag error of a sensor in steady ascent or descent',
  symbol: 'T_i − T',
  unit: 'K',
  shownUnit: 'K',
  kind: 'difference',
  nearZero: 0.01,
  inputs: [
    timeConstantInput, verticalSpeedInput,
    { name: 'lapseRate', label: 'lapse rate of the layer', symbol: 'Γ', unit: 'K/m', shownUnit: 'K/km', kind: 'difference', shape: 'number', range: [-1, 1] },
  ],
  variants: [{
    key: 'steady', label: 'first-order sensor, steady motion, start forgotten',
    source: { text: 'closed form: first-order sensor in a layer of one lapse rate; WMO-No. 8, vol. I, ch. 1', status: 'verified' },
    validity: 'after about five time constants in a layer of one lapse rate', knownError: 'the time constant depends on ventilation',
    evaluate: inputs => ({ is: 'value', value: error(inputs) }),
  }],
  constants: [],
  ask: 'The error T_i − T of a first-order sensor that moves steadily through the layer, once its start is forgotten: indicated less true, vertical speed positive on ascent.',
  trace(inputs) {
    const { timeConstant, verticalSpeed, lapseRate } = given(inputs), value = error(inputs)
    return [
      { text: 'How fast the air’s temperature falls for the sensor', formula: '-\\frac{dT}{dt} = w\\,\\Gamma', filled: `w\\,\\Gamma = ${texFactor(verticalSpeed)} \\times ${texFactor(lapseRate)}\\,\\mathrm{K\\,s^{-1}} = ${texQuantity(verticalSpeed * lapseRate, 'K/s')}` },
      { text: 'Error', formula: 'T_i - T = \\tau\\,w\\,\\Gamma', filled: `T_i - T = ${texNumber(timeConstant)}\\,\\mathrm{s} \\times ${texFactor(verticalSpeed * lapseRate)}\\,\\mathrm{K\\,s^{-1}} = ${texQuantity(value, 'K')}`, value, unit: 'K' },
    ]
  },
  slips: [
    signSlip('On ascent through air that cools with height the sensor is too warm: indicated less true is positive.'),
    slip('speed-left-out', 'vertical speed left out', 'The vertical speed is left out.', inputs => given(inputs).timeConstant * given(inputs).lapseRate),
    slip('time-constant-left-out', 'time constant left out', 'The time constant is left out.', inputs => given(inputs).verticalSpeed * given(inputs).lapseRate),
    slip('per-kilometer', 'K km⁻¹ in place of K m⁻¹', 'The lapse rate went in in K per kilometer: per meter is needed.', (_i, _c, right) => right * 1000),
    slip('feet-per-minute', 'speed in feet per minute', 'The vertical speed went in in feet per minute.', (_i, _c, right) => right * 60 / 0.3048),
  ],
  example: { inputs: { timeConstant: 10, verticalSpeed: 5, lapseRate: 0.0065 }, gives: 0.325, within: 1e-12 },
}

const given = (inputs: Inputs) => ({ timeConstant: numberOf(inputs, 'timeConstant'), verticalSpeed: numberOf(inputs, 'verticalSpeed'), lapseRate: numberOf(inputs, 'lapseRate') })
const error = (inputs: Inputs): number => steadyLagError(given(inputs))
