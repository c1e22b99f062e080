import type { Inputs, QuantityDefinition } from '../definition'
import { numberOf } from '../inputs'
import { lagCorrected, timeConstantInput, verticalSpeedInput } from '../sensorLag'
import { fineSlip, slip, zeroCelsius } from '../slips'
import { texFactor, texNumber, texQuantity } from '../tex'

/**
 * Air temperature from the indication of a first-order sensor that moves through a layer.
 *
 *   T = T_i − τ w Γ_i     Γ_i = −dT_i/dz the lapse rate as indicated, w positive on ascent
 *
 * Source: T = T_i + τ dT_i/dt with dT_i/dt = −w Γ_i. In a normal lapse the correction is negative on ascent and positive on descent, the other way in an inversion.
 *
 * @example 12.4 °C, 9.8 K/km, τ 12 s: 12.165 °C on ascent at 2 m/s, 12.635 °C on descent
 */
export const lagCorrectedTemperatureInFlightDefinition: QuantityDefinition = {
  key: 'lag-corrected-temperature-in-flight',
  name: 'temperature corrected for a sensor’s lag on ascent or descent',
  symbol: 'T',
  unit: 'K',
  shownUnit: 'Cel',
  kind: 'temperature',
  inputs: [
    { name: 'indicatedTemperature', label: 'indicated temperature', symbol: 'T_i', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range: [100, 400] },
    { name: 'indicatedLapseRate', label: 'lapse rate as indicated on this leg', symbol: 'Γ_i', unit: 'K/m', shownUnit: 'K/km', kind: 'difference', shape: 'number', range: [-1, 1] },
    verticalSpeedInput, timeConstantInput,
  ],
  variants: [{
    key: 'first-order', label: 'first-order sensor, steady motion',
    source: { text: 'WMO-No. 8, Guide to Instruments and Methods of Observation, vol. I, ch. 1, time constant', status: 'common practice' },
    validity: 'a sensor with one time constant', knownError: 'the time constant depends on ventilation',
    evaluate: inputs => ({ is: 'value', value: corrected(inputs) }),
  }],
  constants: [],
  ask: 'The air temperature T = T_i − τ w Γ_i from the indication of a first-order sensor in flight, with the vertical speed w positive on ascent and the indicated lapse rate Γ_i positive where the indication falls with height.',
  trace(inputs) {
    const { indicated, rate, timeConstant } = given(inputs), value = corrected(inputs)
    return [
      { text: 'How fast the indication changes', formula: '\\frac{dT_i}{dt} = -w\\,\\Gamma_i', filled: `\\frac{dT_i}{dt} = ${texQuantity(rate, 'K/s')}`, value: rate, unit: 'K/s' },
      { text: 'Air temperature', formula: 'T = T_i + \\tau \\frac{dT_i}{dt}', filled: `T = ${texQuantity(indicated - zeroCelsius, 'Cel')} + ${texNumber(timeConstant)} \\times ${texFactor(rate)}\\,\\mathrm{K} = ${texQuantity(value - zeroCelsius, 'Cel')}`, value, unit: 'K' },
    ]
  },
  slips: [
    fineSlip('sign-of-correction', 'correction with its sign turned', 'The correction has its sign turned: on ascent through air that cools with height the sensor is too warm.', (inputs) => {
      const { indicated, rate, timeConstant } = given(inputs)
      return indicated - timeConstant * rate
    }),
    fineSlip('speed-left-out', 'vertical speed left out', 'The vertical speed is left out.', inputs => given(inputs).indicated - given(inputs).timeConstant * numberOf(inputs, 'indicatedLapseRate')),
    fineSlip('time-constant-left-out', 'time constant left out', 'The time constant is left out.', inputs => given(inputs).indicated + given(inputs).rate),
    slip('per-kilometer', 'K km⁻¹ in place of K m⁻¹', 'The lapse rate went in in K per kilometer: per meter is needed.', inputs => given(inputs).indicated + 1000 * given(inputs).timeConstant * given(inputs).rate),
  ],
  example: { inputs: { indicatedTemperature: 285.55, indicatedLapseRate: 0.0098, verticalSpeed: 2, timeConstant: 12 }, gives: 285.3148, within: 1e-9 },
}

const given = (inputs: Inputs) => ({ indicated: numberOf(inputs, 'indicatedTemperature'), rate: -numberOf(inputs, 'verticalSpeed') * numberOf(inputs, 'indicatedLapseRate'), timeConstant: numberOf(inputs, 'timeConstant') })
const corrected = (inputs: Inputs): number => lagCorrected(given(inputs))
