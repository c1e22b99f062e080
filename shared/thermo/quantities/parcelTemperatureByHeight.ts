import { type Kelvin, kelvin, type KelvinPerMeter, kelvinPerMeter, type Meter, meter } from '../../units/brands'
import { constant, dryRateOf } from '../constants'
import type { Constants, Inputs, QuantityDefinition, Variant } from '../definition'
import { numberOf } from '../inputs'
import { slip, zeroCelsius } from '../slips'
import { texFactor, texNumber, texQuantity } from '../tex'
import { printedDryRate } from './dryAdiabaticLapseRate'

/**
 * Temperature of a parcel lifted dry-adiabatically by a height; lowered where the height is negative.
 *
 *   T(z) = T₀ − Γd Δz
 *
 * Source: AMS Glossary of Meteorology, "adiabatic lapse rate". Valid for unsaturated air near the temperature of its surroundings.
 * By pressure (Poisson) is another quantity: the two differ unless the height comes from the same column.
 *
 * @example parcelTemperatureByHeight(kelvin(288.15), meter(1500), kelvinPerMeter(0.0097709)) // 273.49 K
 */
export function parcelTemperatureByHeight(temperature: Kelvin, height: Meter, rate: KelvinPerMeter): Kelvin {
  return kelvin(temperature - rate * height)
}

const start = (inputs: Inputs) => numberOf(inputs, 'temperature')
const height = (inputs: Inputs) => numberOf(inputs, 'heightDifference')

/** Γd: from an earlier step where the lab takes it from there, else of the variant. */
function rateOf(inputs: Inputs, constants: Constants, variant: string): number {
  const given = inputs.lapseRate
  if (typeof given === 'number') return given
  return variant === 'printed-rate' ? printedDryRate : dryRateOf(constants)
}

function variantWith(key: string, label: string, status: Variant['source']['status'], knownError: string): Variant {
  return {
    key, label, source: { text: 'AMS Glossary of Meteorology, "adiabatic lapse rate"', status }, validity: 'unsaturated air', knownError,
    evaluate: (inputs, constants) => ({ is: 'value', value: parcelTemperatureByHeight(kelvin(start(inputs)), meter(height(inputs)), kelvinPerMeter(rateOf(inputs, constants, key))) }),
  }
}

export const parcelTemperatureByHeightDefinition: QuantityDefinition = {
  key: 'parcel-temperature-by-height',
  name: 'temperature of a parcel lifted dry-adiabatically by height',
  symbol: 'T(z)',
  unit: 'K',
  shownUnit: 'Cel',
  kind: 'temperature',
  inputs: [
    { name: 'temperature', label: 'temperature at the start', symbol: 'T₀', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range: [150, 350] },
    { name: 'heightDifference', label: 'height above the start, negative where the parcel is lowered', symbol: 'Δz', unit: 'm', shownUnit: 'm', kind: 'difference', shape: 'number', range: [-12_000, 12_000] },
    { name: 'lapseRate', label: 'dry adiabatic lapse rate from an earlier step', symbol: 'Γd', unit: 'K/m', shownUnit: 'K/km', kind: 'difference', shape: 'number', range: [-0.1, 0.1], isOptional: true, trivialWithin: 0.0001 },
  ],
  variants: [
    variantWith('g-over-cp', 'Γd = g/cp', 'verified', '0.05 K per km of height by the constants taught'),
    variantWith('printed-rate', 'Γd = 9.8 K km⁻¹ as usually printed', 'common practice', '0.03 K per km of height'),
  ],
  constants: ['g', 'cp'],
  ask: 'The temperature of the parcel after it is lifted dry-adiabatically by the height, at Γd.',
  trace(inputs, constants, variant) {
    const rate = rateOf(inputs, constants, variant)
    const value = parcelTemperatureByHeight(kelvin(start(inputs)), meter(height(inputs)), kelvinPerMeter(rate))
    return [
      typeof inputs.lapseRate === 'number' || variant === 'printed-rate'
        ? { text: 'Dry adiabatic lapse rate, as given', formula: '\\Gamma_d', filled: `\\Gamma_d = ${texQuantity(rate * 1000, 'K/km')}`, value: rate, unit: 'K/m' }
        : { text: 'Dry adiabatic lapse rate', formula: '\\Gamma_d = \\frac{g}{c_p}', filled: `\\Gamma_d = \\frac{${texNumber(constant(constants, 'g'), 6)}}{${texNumber(constant(constants, 'cp'), 6)}} = ${texQuantity(rate * 1000, 'K/km')}`, value: rate, unit: 'K/m' },
      { text: 'Along the height', formula: 'T(z) = T_0 - \\Gamma_d\\,\\Delta z', filled: `T(z) = ${texNumber(start(inputs), 6)} - ${texNumber(rate * 1000)} \\cdot ${texFactor(height(inputs) / 1000)} = ${texQuantity(value, 'K', 6)} = ${texQuantity(value - zeroCelsius, 'Cel')}`, value, unit: 'K' },
    ]
  },
  slips: [
    slip('sign', 'warmed where it cools', 'A parcel cools as it rises and warms as it sinks: your value goes the other way.', (inputs, _c, right) => 2 * start(inputs) - right),
    slip('standard-atmosphere', '6.5 K km⁻¹ for Γd', 'This comes from 6.5 K km⁻¹, the mean rate of the standard atmosphere, not that of a dry parcel.', inputs => start(inputs) - 0.0065 * height(inputs)),
    slip('autoconvective', 'g/R for g/cp', 'This comes from g/R in place of g/cp.', (inputs, constants) => start(inputs) - constant(constants, 'g') / constant(constants, 'R') * height(inputs)),
    slip('feet-for-meters', 'feet taken for meters', 'This comes from the height in feet at a rate per kilometer.', (inputs, _c, right) => start(inputs) - (start(inputs) - right) / 0.3048),
    slip('change-only', 'change for temperature', 'This is the change of temperature: add it to the temperature at the start.', (inputs, _c, right) => zeroCelsius + right - start(inputs)),
    slip('end-unit', 'kelvin and °C mixed up', 'Your number is in kelvin; the unit beside it says °C.', (_i, _c, right) => right + zeroCelsius),
  ],
  example: { inputs: { temperature: 288.15, heightDifference: 1500 }, gives: 273.494, within: 0.001 },
}
