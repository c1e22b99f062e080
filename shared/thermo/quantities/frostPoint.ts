import { dewpointFunction, frostPoint } from '../dewpoints'
import { vaporPressureInput } from '../moistInputs'
import { fineMoistSlip, moistQuantity } from '../moistQuantity'
import { kelvinAsCelsiusSlip } from '../moistSlips'
import { inCelsius, inHectopascal } from '../moistTex'
import { glossary } from '../sources'

/** Frost point from a vapor pressure. Formula and source: `dewpoints.ts`. */
export const frostPointDefinition = moistQuantity({
  key: 'frost-point',
  name: 'frost point from the vapor pressure',
  symbol: 'T_f',
  unit: 'K', shownUnit: 'Cel', kind: 'temperature',
  inputs: [{ ...vaporPressureInput, range: [0.01, 5000] }],
  variants: [{ key: 'over-ice', label: 'eᵢ(T_f) = e', source: glossary('frost point'), validity: 'up to the triple point', knownError: '0.05 K by the formula of eᵢ', value: ({ given, constants, formulae }) => frostPoint(given('vaporPressure'), constants, formulae) }],
  constants: ['enhancementFactor'],
  inside: ['ei'],
  ask: 'The frost point: the temperature at which the air’s vapor pressure is that of saturation over ice; not defined where that lies above 0 °C.',
  working: ({ given }, value) => [{ text: 'The temperature at which the vapor pressure is that of saturation over ice', formula: 'e_i(T_f) = e', filled: `e_i(${inCelsius(value)}) = ${inHectopascal(given('vaporPressure'))}` }],
  slips: [
    fineMoistSlip('dewpoint', 'dewpoint for frost point', 'This is the dewpoint, over liquid water; the frost point refers to ice and lies higher.', ({ given, constants, formulae }) => dewpointFunction(constants, formulae)(given('vaporPressure'))),
    kelvinAsCelsiusSlip,
  ],
  example: { inputs: { vaporPressure: 200 }, gives: 260.2325, within: 0.0001 },
})
