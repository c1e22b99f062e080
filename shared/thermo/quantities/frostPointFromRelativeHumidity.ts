import { dewpointFunction, frostPoint } from '../dewpoints'
import { relativeHumidityInput, temperatureInput } from '../moistInputs'
import { fineMoistSlip, moistQuantity } from '../moistQuantity'
import { kelvinAsCelsiusSlip } from '../moistSlips'
import { inCelsius, inHectopascal, saturationStep } from '../moistTex'
import { iceSaturationPressureFunction } from '../saturationFunction'
import { glossary } from '../sources'
import { texNumber } from '../tex'

/** Frost point from temperature and relative humidity over liquid water: eᵢ(T_f) = RH eₛ(T). Formula and source: `dewpoints.ts`. */
export const frostPointFromRelativeHumidityDefinition = moistQuantity({
  key: 'frost-point-from-relative-humidity',
  name: 'frost point from the relative humidity',
  symbol: 'T_f',
  unit: 'K', shownUnit: 'Cel', kind: 'temperature',
  inputs: [{ ...temperatureInput, range: [180, 310] }, relativeHumidityInput],
  variants: [{ key: 'over-ice', label: 'eᵢ(T_f) = RH eₛ(T)', source: glossary('frost point'), validity: 'up to the triple point', knownError: '0.05 K by the formulae', value: ({ given, air, constants, formulae }) => frostPoint(given('relativeHumidity') * air.es(given('temperature')), constants, formulae) }],
  constants: [],
  inside: ['es', 'ei'],
  notedAt: { es: given => [given('temperature')] },
  ask: 'The frost point, at which the vapor pressure is that of saturation over ice, from the temperature and the relative humidity over liquid water; not defined where that lies above 0 °C.',
  working: ({ given, air }, value) => {
    const es = air.es(given('temperature')), e = given('relativeHumidity') * es
    return [
      saturationStep('e_s', 'T', given('temperature'), es),
      { text: 'Vapor pressure', formula: 'e = \\mathit{RH}\\,e_s', filled: `e = ${texNumber(given('relativeHumidity'))} \\cdot ${texNumber(es / 100)} = ${inHectopascal(e)}`, value: e, unit: 'Pa' },
      { text: 'The temperature at which this is saturation over ice', formula: 'e_i(T_f) = e', filled: `e_i(${inCelsius(value)}) = ${inHectopascal(e)}` },
    ]
  },
  slips: [
    fineMoistSlip('dewpoint', 'dewpoint for frost point', 'This is the dewpoint, over liquid water; the frost point refers to ice and lies higher.', ({ given, air, constants, formulae }) => dewpointFunction(constants, formulae)(given('relativeHumidity') * air.es(given('temperature')))),
    fineMoistSlip('humidity-over-ice', 'RH taken over ice', 'This takes the relative humidity for one over ice; it refers to liquid water.', ({ given, constants, formulae }) => {
      if (given('temperature') > 273.15 || given('relativeHumidity') === 1) return null
      const outcome = frostPoint(given('relativeHumidity') * iceSaturationPressureFunction(constants, formulae)(given('temperature')), constants, formulae)
      return outcome.is === 'value' ? outcome.value : null
    }),
    kelvinAsCelsiusSlip,
  ],
  example: { inputs: { temperature: 263.15, relativeHumidity: 0.7 }, gives: 260.2731, within: 0.0001 },
})
