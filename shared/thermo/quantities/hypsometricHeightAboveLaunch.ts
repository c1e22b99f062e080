import { kelvin, pascal } from '../../units/brands'
import { celsiusSlip } from '../composedSlips'
import { constant } from '../constants'
import type { Constants, Inputs } from '../definition'
import { OutOfRangeError } from '../errors'
import { lengthInput, pressureInput, temperatureInput, timeInput } from '../inputKinds'
import { numberOf } from '../inputs'
import { oneFormula } from '../oneFormula'
import { fineSlip, slip } from '../slips'
import { standardHeight } from '../standardAtmosphere'
import { texFactor, texNumber, worked } from '../tex'
import { hypsometricThickness } from './hypsometricThickness'

const optional = (inputs: Inputs, name: string): number => (inputs[name] === undefined ? 0 : numberOf(inputs, name))
const p = (inputs: Inputs) => numberOf(inputs, 'pressure')
const Tv = (inputs: Inputs) => numberOf(inputs, 'meanVirtualTemperature')
const datum = (inputs: Inputs) => optional(inputs, 'barometerHeight')
/** Station pressure at the time of the sample: at the launch, and the tendency since. */
const anchor = (inputs: Inputs) => numberOf(inputs, 'stationPressure') + optional(inputs, 'pressureTendency') * optional(inputs, 'timeSinceLaunch')
const corrected = (inputs: Inputs) => p(inputs) - optional(inputs, 'pressureOffset')

/**
 * Height of a tethersonde above its launch point from station pressure and its own.
 *
 *   z = z_b + (R T̄v/g) ln[(p_s + ṗ Δt)/(p − δ)]     z_b height of the barometer above the launch point, δ the sonde's offset on the ground
 *
 * Source: AMS Glossary of Meteorology, "hypsometric equation"; corrections by common practice. The anchor is the station pressure, never the
 * pressure at sea level nor the standard's; below the barometer the height comes out smaller than z_b.
 *
 * @throws {OutOfRangeError} where the sonde's pressure, its offset taken off, is none
 * @example hypsometricHeightAboveLaunch({ stationPressure: 97500, pressure: 94000, meanVirtualTemperature: 283.15 }, closed1004.constants) // 302.84 m
 */
export function hypsometricHeightAboveLaunch(inputs: Inputs, constants: Constants): number {
  const from = anchor(inputs), to = corrected(inputs)
  if (!(from > 0)) throw new OutOfRangeError('pressureTendency', optional(inputs, 'pressureTendency'), 'the tendencies that leave a station pressure')
  if (!(to > 0)) throw new OutOfRangeError('pressureOffset', optional(inputs, 'pressureOffset'), 'the offsets below the sonde’s pressure')
  if (to === from) return datum(inputs)
  const thickness = to < from ? hypsometricThickness(pascal(from), pascal(to), kelvin(Tv(inputs)), constants) : -hypsometricThickness(pascal(to), pascal(from), kelvin(Tv(inputs)), constants)
  return datum(inputs) + thickness
}

const value = hypsometricHeightAboveLaunch
const without = (name: string) => (inputs: Inputs, constants: Constants) => (optional(inputs, name) === 0 ? null : value({ ...inputs, [name]: 0 }, constants))
const turned = (name: string) => (inputs: Inputs, constants: Constants) => (optional(inputs, name) === 0 ? null : value({ ...inputs, [name]: -optional(inputs, name) }, constants))

export const hypsometricHeightAboveLaunchDefinition = oneFormula({
  key: 'hypsometric-height-above-launch',
  name: 'height above the launch point from pressure',
  symbol: 'z',
  unit: 'm',
  shownUnit: 'm',
  kind: 'difference',
  nearZero: 10,
  inputs: [
    pressureInput('stationPressure', 'station pressure at the barometer, at the launch', 'p_s', [40_000, 120_000]),
    pressureInput('pressure', 'pressure of the sonde', 'p', [1000, 120_000]),
    temperatureInput('meanVirtualTemperature', 'mean virtual temperature between barometer and sonde', 'T̄v', [150, 350]),
    { ...lengthInput('barometerHeight', 'height of the barometer above the launch point', 'z_b', [-500, 500]), isOptional: true },
    { name: 'pressureTendency', label: 'tendency of the station pressure', symbol: 'ṗ', unit: 'Pa/s', shownUnit: 'hPa/h', kind: 'difference', shape: 'number', range: [-1, 1], isOptional: true },
    { ...timeInput('timeSinceLaunch', 'time since the launch', 'Δt', [0, 172_800]), isOptional: true },
    { name: 'pressureOffset', label: 'offset of the sonde’s pressure on the ground, sonde less barometer', symbol: 'δ', unit: 'Pa', shownUnit: 'hPa', kind: 'difference', shape: 'number', range: [-2000, 2000], isOptional: true },
  ],
  constants: ['R', 'g'],
  formula: {
    key: 'hypsometric', label: 'hypsometric equation from the station’s barometer', source: { text: 'AMS Glossary of Meteorology, "hypsometric equation"; corrections by common practice', status: 'common practice' },
    validity: 'hydrostatic balance', knownError: 'g 9.81 or 9.80665, R 287 to 287.05: 0.05 %',
  },
  ask: 'The height z of the sonde above the launch point by the hypsometric equation from the station pressure at the barometer, with the corrections that are given: the barometer’s height above the launch point, the tendency of the station pressure since the launch, the sonde’s offset on the ground.',
  value,
  working(inputs, constants, result) {
    const rise = result - datum(inputs)
    return [
      ...(optional(inputs, 'pressureTendency') * optional(inputs, 'timeSinceLaunch') === 0 ? [] : [worked('Station pressure at the time of the sample', 'p_s(t) = p_s + \\dot p\\,\\Delta t', `p_s(t) = ${texNumber(numberOf(inputs, 'stationPressure') / 100, 6)} + ${texFactor(optional(inputs, 'pressureTendency') * 36)} \\cdot ${texNumber(optional(inputs, 'timeSinceLaunch') / 3600)}`, anchor(inputs), 'Pa', { value: anchor(inputs) / 100, unit: 'hPa' })]),
      ...(optional(inputs, 'pressureOffset') === 0 ? [] : [worked('Pressure of the sonde without its offset', 'p - \\delta', `${texNumber(p(inputs) / 100, 6)} - ${texFactor(optional(inputs, 'pressureOffset') / 100)}`, corrected(inputs), 'Pa', { value: corrected(inputs) / 100, unit: 'hPa' })]),
      worked('Height above the barometer', '\\frac{R\\,\\overline{T_v}}{g} \\ln\\frac{p_s(t)}{p - \\delta}', `\\frac{${texNumber(constant(constants, 'R'))} \\cdot ${texNumber(Tv(inputs), 6)}}{${texNumber(constant(constants, 'g'), 6)}} \\ln\\frac{${texNumber(anchor(inputs) / 100, 6)}}{${texNumber(corrected(inputs) / 100, 6)}}`, rise, 'm'),
      worked('Above the launch point', 'z = z_b + \\frac{R\\,\\overline{T_v}}{g} \\ln\\frac{p_s(t)}{p - \\delta}', `z = ${texNumber(datum(inputs))} + ${texFactor(rise, 6)}`, result, 'm'),
    ]
  },
  slips: [
    slip('standard-pressure', '1013.25 hPa for the station pressure', 'This starts from 1013.25 hPa: the anchor is the station pressure at the barometer.', (inputs, constants) => value({ ...inputs, stationPressure: 101_325, pressureTendency: 0 }, constants)),
    slip('pressure-altitude', 'pressure altitude for height', 'This is the pressure altitude, the height in the standard atmosphere: asked is the height above the launch point.', inputs => standardHeight(pascal(p(inputs)))),
    celsiusSlip(value, 'meanVirtualTemperature'),
    fineSlip('fixed-anchor', 'pressure of the launch throughout', 'This keeps the station pressure of the launch: it has changed since.', without('pressureTendency')),
    fineSlip('offset-left-in', 'offset left in', 'This leaves in the offset that the sonde showed on the ground.', without('pressureOffset')),
    fineSlip('offset-sign', 'offset added', 'This adds the sonde’s offset where it has to be taken off.', turned('pressureOffset')),
    fineSlip('barometer-height-left-out', 'height of the barometer left out', 'This is the height above the barometer: the launch point is another datum.', without('barometerHeight')),
    fineSlip('barometer-height-sign', 'height of the barometer taken off', 'This takes the barometer’s height off where it has to be added.', turned('barometerHeight')),
  ],
  example: { inputs: { stationPressure: 97_500, pressure: 94_000, meanVirtualTemperature: 283.15 }, gives: 302.836, within: 0.001 },
})
