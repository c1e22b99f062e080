import { constant } from '../constants'
import type { QuantityDefinition } from '../definition'
import { changeOf, processInputs } from '../firstLaw'
import { slip } from '../slips'

/**
 * Heat that the air takes up in an adiabatic process: exactly 0, by the definition of the word.
 *
 *   q = Δu + w = 0
 *
 * Source: AMS Glossary of Meteorology, "adiabatic process". Its band is absolute, since a share of nothing is nothing.
 */
export const adiabaticHeatDefinition: QuantityDefinition = {
  key: 'adiabatic-heat',
  name: 'heat taken up, adiabatic',
  symbol: 'q',
  unit: 'J/kg',
  shownUnit: 'kJ/kg',
  kind: 'difference',
  nearZero: 1000,
  inputs: processInputs.adiabatic,
  variants: [{
    key: 'definition',
    label: 'by definition',
    source: { text: 'AMS Glossary of Meteorology, "adiabatic process"', status: 'verified' },
    validity: 'every adiabatic process',
    knownError: 'none',
    evaluate: () => ({ is: 'value', value: 0 }),
  }],
  constants: [],
  ask: 'The heat q that the air takes up in a dry-adiabatic change of pressure, per kilogram of dry air.',
  trace: () => [{ text: 'An adiabatic process exchanges no heat', formula: 'q = \\Delta u + w', filled: 'q = 0\\,\\mathrm{kJ\\,kg^{-1}}', value: 0, unit: 'J/kg' }],
  slips: [
    slip('enthalpy-for-heat', 'cp ΔT taken for heat', 'This is cp ΔT, the change of enthalpy: it is heat only at constant pressure.', (inputs, constants) => constant(constants, 'cp') * changeOf('adiabatic', inputs, constants)),
    slip('internal-energy-for-heat', 'cv ΔT taken for heat', 'This is cv ΔT, the change of internal energy: it is heat only at constant volume.', (inputs, constants) => constant(constants, 'cv') * changeOf('adiabatic', inputs, constants)),
    slip('work-for-heat', 'work taken for heat', 'This is the work done by the air, which its internal energy pays for.', (inputs, constants) => -constant(constants, 'cv') * changeOf('adiabatic', inputs, constants)),
  ],
  example: { inputs: { temperatureStart: 293.15, pressureStart: 100_000, pressureEnd: 70_000 }, gives: 0, within: 0 },
}
