import { noChange } from '../noChange'

/** Change of enthalpy, isothermal: exactly 0. Why, and its slips: `noChange.ts`. */
export const isothermalEnthalpyChangeDefinition = noChange({
  key: 'isothermal-enthalpy-change',
  name: 'change of enthalpy, isothermal',
  symbol: 'Δh',
  tex: '\\Delta h = c_p\\,\\Delta T',
  process: 'isothermal',
  because: 'The enthalpy of an ideal gas depends on its temperature alone',
  source: 'AMS Glossary of Meteorology, "isothermal process"',
  ask: 'The change of enthalpy Δh in an isothermal change of pressure, end less start, per kilogram of dry air.',
  example: { inputs: { temperature: 293.15, pressureStart: 100_000, pressureEnd: 70_000 }, gives: 0, within: 0 },
})
