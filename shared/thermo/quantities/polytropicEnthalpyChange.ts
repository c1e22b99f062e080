import { perKilogram } from '../firstLaw'

/** Change of enthalpy, polytropic: cp ΔT, J kg⁻¹. Formula, source and range: `firstLaw.ts`. */
export const polytropicEnthalpyChangeDefinition = perKilogram({
  key: 'polytropic-enthalpy-change',
  name: 'change of enthalpy, polytropic',
  symbol: 'Δh',
  tex: '\\Delta h',
  process: 'polytropic',
  coefficient: 'cp',
  sign: 1,
  ask: 'The change of enthalpy Δh in a polytropic change of pressure (p αⁿ constant), end less start, per kilogram of dry air.',
  signSentence: 'A change is the end less the start.',
  example: { inputs: { temperatureStart: 293.15, pressureStart: 100_000, pressureEnd: 70_000, polytropicExponent: 1.2 }, gives: -16986.4, within: 0.1 },
})
