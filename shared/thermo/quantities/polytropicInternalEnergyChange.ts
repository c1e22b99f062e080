import { perKilogram } from '../firstLaw'

/** Change of internal energy, polytropic: cv ΔT, J kg⁻¹. Formula, source and range: `firstLaw.ts`. */
export const polytropicInternalEnergyChangeDefinition = perKilogram({
  key: 'polytropic-internal-energy-change',
  name: 'change of internal energy, polytropic',
  symbol: 'Δu',
  tex: '\\Delta u',
  process: 'polytropic',
  coefficient: 'cv',
  sign: 1,
  ask: 'The change of internal energy Δu in a polytropic change of pressure (p αⁿ constant), end less start, per kilogram of dry air.',
  signSentence: 'A change is the end less the start.',
  example: { inputs: { temperatureStart: 293.15, pressureStart: 100_000, pressureEnd: 70_000, polytropicExponent: 1.2 }, gives: -12130.7, within: 0.1 },
})
