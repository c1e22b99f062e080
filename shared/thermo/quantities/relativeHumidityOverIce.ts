import { dewpointInput, temperatureInput } from '../moistInputs'
import { fineMoistSlip, moistQuantity, moistSlip } from '../moistQuantity'
import { fractionAsPercentSlip } from '../moistSlips'
import { saturationStep, inHectopascal } from '../moistTex'
import { iceSaturationPressureFunction } from '../saturationFunction'
import { wmoHumidity } from '../sources'
import { texNumber, texQuantity } from '../tex'

/** Relative humidity over ice: e/eᵢ(T), with e from the dewpoint over liquid water. Source: WMO-No. 8, Annex 4.A. */
export const relativeHumidityOverIceDefinition = moistQuantity({
  key: 'relative-humidity-over-ice',
  name: 'relative humidity over ice',
  symbol: 'RHi',
  unit: '1', shownUnit: '%', kind: 'fraction',
  inputs: [{ ...temperatureInput, range: [180, 273.16] }, { ...dewpointInput, range: [160, 275] }],
  variants: [{ key: 'vapor-pressures', label: 'e/eᵢ, ratio of vapor pressures', source: wmoHumidity, validity: 'below 0 °C', knownError: '0.5 of a percent by the formulae', value: ({ given, air, constants, formulae }) => air.es(given('dewpoint')) / iceSaturationPressureFunction(constants, formulae)(given('temperature')) }],
  constants: [],
  inside: ['es', 'ei'],
  notedAt: { es: given => [given('dewpoint')], ei: given => [given('temperature')] },
  remarks: (_hand, value) => [value > 1 + 1e-12 ? 'Supersaturated over ice, as cold air without ice often is.' : null],
  ask: 'The relative humidity over ice, e over the saturation vapor pressure over ice; the dewpoint refers to liquid water.',
  working: ({ given, air, constants, formulae }, value) => {
    const e = air.es(given('dewpoint')), ei = iceSaturationPressureFunction(constants, formulae)(given('temperature'))
    return [
      saturationStep('e', 'T_d', given('dewpoint'), e, 'Vapor pressure: that of saturation over water at the dewpoint'),
      { text: 'Saturation vapor pressure over ice', formula: 'e_i(T)', filled: `e_i = ${inHectopascal(ei)}`, value: ei, unit: 'Pa' },
      { text: 'Their ratio', formula: '\\mathit{RH}_i = \\frac{e}{e_i}', filled: `\\frac{${texNumber(e / 100)}}{${texNumber(ei / 100)}} = ${texQuantity(value * 100, '%')}` },
    ]
  },
  slips: [
    fineMoistSlip('water-for-ice', 'over water for over ice', 'This is relative to saturation over liquid water; asked is that over ice.', ({ given, air }) => air.es(given('dewpoint')) / air.es(given('temperature'))),
    fineMoistSlip('frost-point', 'dewpoint taken for a frost point', 'This takes the vapor pressure over ice at the dewpoint; the dewpoint refers to liquid water.', ({ given, constants, formulae }) => {
      const ei = iceSaturationPressureFunction(constants, formulae)
      return given('dewpoint') < 273.16 ? ei(given('dewpoint')) / ei(given('temperature')) : null
    }),
    moistSlip('swapped', 'vapor pressures swapped', 'This is the ratio turned round.', ({ right }) => right === 1 ? null : 1 / right),
    fractionAsPercentSlip,
  ],
  example: { inputs: { temperature: 263.15, dewpoint: 261.85 }, gives: 0.9952592, within: 1e-6 },
})
