/** General slips composed with a quantity's own formula: what it gives with one thing put in wrongly. */
import type { Constants, Formulae, Inputs, Slip } from './definition'
import { numberOf } from './inputs'
import { constantSlip, slip, vaporGasConstant, zeroCelsius } from './slips'

export type Formula = (inputs: Inputs, constants: Constants, formulae: Formulae) => number

const finite = (value: number): number | null => (Number.isFinite(value) ? value : null)

/** The temperature put in in °C. `comesOutAs` °C where the result is a temperature that such a slip takes for °C. */
export const celsiusSlip = (formula: Formula, name: string, comesOutAs: 'Cel' | 'SI' = 'SI'): Slip =>
  slip('celsius-for-kelvin', 'Celsius put in for kelvin', 'This is what comes out with the temperature in °C: the formula takes kelvin.', (inputs, constants, _right, formulae) =>
    finite(formula({ ...inputs, [name]: numberOf(inputs, name) - zeroCelsius }, constants, formulae) + (comesOutAs === 'Cel' ? zeroCelsius : 0)))

export const hectopascalSlip = (formula: Formula, name: string): Slip =>
  slip('hectopascal-for-pascal', 'hPa put in for Pa', 'This is what comes out with the pressure in hPa: with constants in SI it goes in in pascal.', (inputs, constants, _right, formulae) =>
    finite(formula({ ...inputs, [name]: numberOf(inputs, name) / 100 }, constants, formulae)))

/** One input in the place of another. */
export const swappedSlip = (formula: Formula, first: string, second: string, key: string, label: string, sentence: string): Slip =>
  slip(key, label, sentence, (inputs, constants, _right, formulae) =>
    finite(formula({ ...inputs, [first]: numberOf(inputs, second), [second]: numberOf(inputs, first) }, constants, formulae)))

/** A length put in in feet. */
export const feetSlip = (formula: Formula, name: string): Slip =>
  slip('feet-for-meters', 'feet taken for meters', 'This comes from the height in feet where meters go in.', (inputs, constants, _right, formulae) =>
    finite(formula({ ...inputs, [name]: numberOf(inputs, name) / 0.3048 }, constants, formulae)))

const printed: Readonly<Record<string, string>> = { cp: 'cp', cv: 'cv', R: 'R' }

/** Another constant in the place of the right one, where the formula takes it as such and not in κ. */
export const otherConstantSlip = (formula: Formula, right: 'cp' | 'cv' | 'R', taken: 'cp' | 'cv' | 'R'): Slip =>
  slip(`${taken.toLowerCase()}-for-${right.toLowerCase()}`, `${printed[taken]} for ${printed[right]}`, `This comes from ${printed[taken]} in place of ${printed[right]}.`, (inputs, constants, _right, formulae) => {
    const value = constants[taken]
    return value === undefined ? null : finite(formula(inputs, { ...constants, [right]: value }, formulae))
  })

export const vaporConstantSlip = (formula: Formula): Slip =>
  slip('vapor-gas-constant', 'gas constant of vapor', 'This comes from the gas constant of water vapor in place of that of dry air.', (inputs, constants, _right, formulae) =>
    finite(formula(inputs, { ...constants, R: vaporGasConstant }, formulae)))

/** 273 for 273.15 on the way in; the result stays in kelvin. */
export const zero273Slip = (formula: Formula, name: string): Slip =>
  constantSlip('zero-273', '273 for 273.15', 'This comes from 273 in place of 273.15 between °C and kelvin.', (inputs, constants, _right, formulae) =>
    finite(formula({ ...inputs, [name]: numberOf(inputs, name) - 0.15 }, constants, formulae)))

/** °C called kelvin at the end, or the other way round, by the unit in which the quantity is asked. */
export const endUnitSlip = (shown: 'K' | 'Cel'): Slip => (shown === 'K'
  ? slip('end-unit', '°C given as kelvin', 'Your number is the temperature in °C; the unit beside it says kelvin.', (_i, _c, right) => (right > zeroCelsius ? right - zeroCelsius : null))
  : slip('end-unit', 'kelvin and °C mixed up', 'Your number is in kelvin; the unit beside it says °C.', (_i, _c, right) => right + zeroCelsius))

/** 273.15 added to a difference, which is the same in °C and in K. */
export const differenceAsTemperatureSlip = (formula: Formula, name: string): Slip =>
  slip('difference-as-temperature', '273.15 added to a difference', 'A difference of temperatures is the same in °C and in K: 273.15 is not added to it.', (inputs, constants, _right, formulae) =>
    finite(formula({ ...inputs, [name]: numberOf(inputs, name) + zeroCelsius }, constants, formulae)))
