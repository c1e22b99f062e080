import { constant } from './constants'
import type { QuantityDefinition, Slip } from './definition'
import { changeOf, processInputs, type Process } from './firstLaw'
import { isothermalWork } from './isothermal'
import { numberOf } from './inputs'
import { oneFormula } from './oneFormula'
import { slip } from './slips'
import { kelvin, pascal } from '../units/brands'

export interface NoChange { key: string, name: string, symbol: string, tex: string, process: Process, because: string, source: string, ask: string, example: QuantityDefinition['example'] }

/**
 * A term of the first law that is exactly 0 by what the process is: no work at constant volume, no change of internal energy or enthalpy
 * of an ideal gas at constant temperature. Its band is absolute, since a share of nothing is nothing.
 */
export function noChange(of: NoChange): QuantityDefinition {
  return oneFormula({
    key: of.key, name: of.name, symbol: of.symbol, unit: 'J/kg', shownUnit: 'kJ/kg', kind: 'difference', nearZero: 1000,
    inputs: processInputs[of.process],
    constants: [],
    formula: { key: 'definition', label: 'by definition', source: { text: of.source, status: 'common practice' }, validity: `every ${of.process} process of an ideal gas`, knownError: 'none' },
    ask: of.ask,
    value: () => 0,
    working: () => [{ text: of.because, formula: of.tex, filled: `${of.symbol.replace('Δ', '\\Delta ')} = 0\\,\\mathrm{kJ\\,kg^{-1}}`, value: 0, unit: 'J/kg' }],
    slips: of.process === 'isothermal' ? isothermalSlips : isochoricSlips,
    example: of.example,
  })
}

const isothermalSlips: readonly Slip[] = [
  slip('work-for-it', 'work taken for it', 'This is the work done by the air, R T ln(p₁/p₂): at constant temperature the heat pays for it.', (inputs, constants) =>
    isothermalWork(kelvin(numberOf(inputs, 'temperature')), pascal(numberOf(inputs, 'pressureStart')), pascal(numberOf(inputs, 'pressureEnd')), constants)),
  slip('heat-given-off', 'work with its sign turned', 'This is the work done on the air: at constant temperature it leaves as heat.', (inputs, constants) =>
    -isothermalWork(kelvin(numberOf(inputs, 'temperature')), pascal(numberOf(inputs, 'pressureStart')), pascal(numberOf(inputs, 'pressureEnd')), constants)),
]

const isochoricSlips: readonly Slip[] = [
  slip('isobaric-work', 'work at constant pressure', 'This is R ΔT, the work at constant pressure: at constant volume nothing is pushed away.', (inputs, constants) => constant(constants, 'R') * changeOf('isochoric', inputs, constants)),
  slip('heat-for-work', 'heat taken for work', 'This is cv ΔT, the heat taken up.', (inputs, constants) => constant(constants, 'cv') * changeOf('isochoric', inputs, constants)),
]
