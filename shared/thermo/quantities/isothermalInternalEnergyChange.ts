import { noChange } from '../noChange'

/** Change of internal energy, isothermal: exactly 0. Why, and its slips: `noChange.ts`. */
export const isothermalInternalEnergyChangeDefinition = noChange({
  key: 'isothermal-internal-energy-change',
  name: 'change of internal energy, isothermal',
  symbol: 'Δu',
  tex: '\\Delta u = c_v\\,\\Delta T',
  process: 'isothermal',
  because: 'The internal energy of an ideal gas depends on its temperature alone',
  source: 'AMS Glossary of Meteorology, "isothermal process"',
  ask: 'The change of internal energy Δu in an isothermal change of pressure, end less start, per kilogram of dry air.',
  example: { inputs: { temperature: 293.15, pressureStart: 100_000, pressureEnd: 70_000 }, gives: 0, within: 0 },
})
