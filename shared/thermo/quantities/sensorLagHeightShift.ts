import type { Inputs, QuantityDefinition } from '../definition'
import { numberOf } from '../inputs'
import { timeConstantInput, verticalSpeedInput } from '../sensorLag'
import { signSlip, slip } from '../slips'
import { texFactor, texNumber, texQuantity } from '../tex'

/**
 * How far a lagging sensor shifts a feature of the profile.
 *
 *   Δz = τ w     upwards on ascent, downwards on descent
 *
 * Source: the delay of a first-order sensor behind a steady change is τ (closed form). SI.
 *
 * @example τ 12 s at 2 m/s: 24 m
 */
export const sensorLagHeightShiftDefinition: QuantityDefinition = {
  key: 'sensor-lag-height-shift',
  name: 'shift of a profile’s features by a sensor’s lag',
  symbol: 'Δz',
  unit: 'm',
  shownUnit: 'm',
  kind: 'difference',
  nearZero: 1,
  inputs: [timeConstantInput, verticalSpeedInput],
  variants: [{
    key: 'steady', label: 'delay of one time constant',
    source: { text: 'closed form: first-order sensor behind a steady change; WMO-No. 8, vol. I, ch. 1', status: 'verified' },
    validity: 'features deeper than the shift', knownError: 'sharp features are smeared as well as shifted',
    evaluate: inputs => ({ is: 'value', value: shift(inputs) }),
  }],
  constants: [],
  ask: 'The height Δz by which the sensor’s lag shifts a feature of the profile, positive upwards; vertical speed positive on ascent.',
  trace(inputs) {
    const value = shift(inputs)
    return [{ text: 'Delay times speed', formula: '\\Delta z = \\tau\\,w', filled: `\\Delta z = ${texNumber(numberOf(inputs, 'timeConstant'))}\\,\\mathrm{s} \\times ${texFactor(numberOf(inputs, 'verticalSpeed'))}\\,\\mathrm{m\\,s^{-1}} = ${texQuantity(value, 'm')}`, value, unit: 'm' }]
  },
  slips: [
    signSlip('The sensor shows a feature late: higher up on ascent, lower down on descent.'),
    slip('divided', 'divided in place of multiplied', 'This divides the speed by the time constant.', inputs => numberOf(inputs, 'verticalSpeed') / numberOf(inputs, 'timeConstant')),
    slip('inverted', 'τ/w for τ w', 'This divides the time constant by the speed.', inputs => numberOf(inputs, 'timeConstant') / numberOf(inputs, 'verticalSpeed')),
    slip('feet-for-meters', 'feet for meters', 'Your number is in feet; the unit beside it says meters.', (_i, _c, right) => right / 0.3048),
  ],
  example: { inputs: { timeConstant: 12, verticalSpeed: 2 }, gives: 24, within: 1e-12 },
}

const shift = (inputs: Inputs): number => numberOf(inputs, 'timeConstant') * numberOf(inputs, 'verticalSpeed')
