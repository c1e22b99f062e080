/** Slips that quantities of moist air share, worded alike. */
import { zeroCelsius } from './slips'
import { fineMoistSlip, moistSlip, optionally, type MoistSlip, type SlipHand } from './moistQuantity'
import { iceSaturationPressureFunction } from './saturationFunction'

export const pascalSlip = moistSlip('pascal-for-hectopascal', 'Pa given as hPa', 'Your number is in pascal; the unit beside it says hectopascal.', ({ right }) => right * 100)
export const kilopascalSlip = moistSlip('kilopascal-for-hectopascal', 'kPa given as hPa', 'Your number is in kilopascal; the unit beside it says hectopascal.', ({ right }) => right / 10)
export const kilogramSlip = moistSlip('kilogram-for-gram', 'kg kg⁻¹ given as g kg⁻¹', 'Your number is in kg kg⁻¹; the unit beside it says g kg⁻¹.', ({ right }) => right / 1000)
export const kelvinAsCelsiusSlip = moistSlip('end-unit', 'kelvin and °C mixed up', 'Your number is in kelvin; the unit beside it says °C.', ({ right }) => right + zeroCelsius)
export const celsiusAsKelvinSlip = moistSlip('end-unit', '°C given as kelvin', 'Your number is the temperature in °C; the unit beside it says kelvin.', ({ right }) => (right > zeroCelsius + 1 ? right - zeroCelsius : null))
export const fractionAsPercentSlip = moistSlip('fraction-for-percent', 'fraction given as percent', 'Your number is the fraction; the unit beside it says percent.', ({ right }) => right / 100)

/** Over ice at a temperature below 0 °C; null above, where there is no ice. */
export function overIce({ constants, formulae }: SlipHand, temperature: number): number | null {
  return temperature < zeroCelsius ? iceSaturationPressureFunction(constants, formulae)(temperature) : null
}

/** w at T for w at T_d: what belongs to the dewpoint is taken at the air temperature. */
export const atTemperatureSlip = (what: string): MoistSlip => fineMoistSlip('temperature-for-dewpoint', 'temperature for dewpoint', `This is ${what} at the air temperature, that of saturation: the dewpoint tells what the air holds.`, (hand) => {
  const temperature = optionally(hand, 'temperature')
  return temperature === null || temperature === hand.given('dewpoint') ? null : hand.again({ dewpoint: temperature })
})

/** T and T_d in each other's place. */
export const swappedSlip: MoistSlip = moistSlip('swapped', 'temperature and dewpoint swapped', 'This comes from the temperature and the dewpoint in each other’s place.', ({ given, again }) => again({ temperature: given('dewpoint'), dewpoint: given('temperature') }))
