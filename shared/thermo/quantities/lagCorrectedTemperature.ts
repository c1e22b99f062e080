import type { Inputs, QuantityDefinition } from '../definition'
import { numberOf } from '../inputs'
import { lagCorrected, timeConstantInput } from '../sensorLag'
import { slip, zeroCelsius } from '../slips'
import { texFactor, texNumber, texQuantity } from '../tex'

/** Air temperature from the indication of a first-order sensor and its rate of change in time: see `lagCorrected`. */
export const lagCorrectedTemperatureDefinition: QuantityDefinition = {
  key: 'lag-corrected-temperature',
  name: 'temperature corrected for a sensor’s lag',
  symbol: 'T',
  unit: 'K',
  shownUnit: 'Cel',
  kind: 'temperature',
  inputs: [
    { name: 'indicatedTemperature', label: 'indicated temperature', symbol: 'T_i', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range: [100, 400] },
    { name: 'indicatedRate', label: 'rate of change of the indicated temperature in time', symbol: 'dT_i/dt', unit: 'K/s', shownUnit: 'K/s', kind: 'difference', shape: 'number', range: [-10, 10] },
    timeConstantInput,
  ],
  variants: [{
    key: 'first-order', label: 'first-order sensor',
    source: { text: 'WMO-No. 8, Guide to Instruments and Methods of Observation, vol. I, ch. 1, time constant', status: 'common practice' },
    validity: 'a sensor with one time constant, on ascent and descent', knownError: 'noise of the indication is enlarged by τ/Δt',
    evaluate: inputs => ({ is: 'value', value: lagCorrected(given(inputs)) }),
  }],
  constants: [],
  ask: 'The air temperature T = T_i + τ dT_i/dt from the indication of a first-order sensor.',
  trace(inputs) {
    const { indicated, rate, timeConstant } = given(inputs), value = lagCorrected(given(inputs))
    return [
      { text: 'Correction', formula: '\\tau \\frac{dT_i}{dt}', filled: `${texNumber(timeConstant)}\\,\\mathrm{s} \\times ${texFactor(rate)}\\,\\mathrm{K\\,s^{-1}} = ${texQuantity(timeConstant * rate, 'K')}`, value: timeConstant * rate, unit: 'K' },
      { text: 'Air temperature', formula: 'T = T_i + \\tau \\frac{dT_i}{dt}', filled: `T = ${texQuantity(indicated - zeroCelsius, 'Cel')} + ${texFactor(timeConstant * rate)}\\,\\mathrm{K} = ${texQuantity(value - zeroCelsius, 'Cel')}`, value, unit: 'K' },
    ]
  },
  slips: [
    slip('sign-of-correction', 'correction with its sign turned', 'The correction has its sign turned: a sensor that falls is still too warm.', (inputs) => {
      const { indicated, rate, timeConstant } = given(inputs)
      return indicated - timeConstant * rate
    }),
    slip('rate-alone', 'rate without the time constant', 'The rate has to be multiplied by the time constant.', inputs => given(inputs).indicated + given(inputs).rate),
    slip('divided', 'rate divided by the time constant', 'The rate is divided by the time constant: multiply.', (inputs) => {
      const { indicated, rate, timeConstant } = given(inputs)
      return timeConstant > 0 ? indicated + rate / timeConstant : null
    }),
    slip('per-minute', 'rate per minute', 'The rate went in per minute: per second is needed.', (inputs) => {
      const { indicated, rate, timeConstant } = given(inputs)
      return indicated + timeConstant * rate * 60
    }),
  ],
  example: { inputs: { indicatedTemperature: 285.55, indicatedRate: -0.03, timeConstant: 12 }, gives: 285.19, within: 1e-9 },
}

const given = (inputs: Inputs) => ({ indicated: numberOf(inputs, 'indicatedTemperature'), rate: numberOf(inputs, 'indicatedRate'), timeConstant: numberOf(inputs, 'timeConstant') })
