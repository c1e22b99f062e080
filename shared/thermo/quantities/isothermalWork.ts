import { isothermalQuantity } from '../isothermal'

/** Work done by the air, isothermal: R T ln(p₁/p₂), J kg⁻¹. Formula, source and range: `isothermal.ts`. */
export const isothermalWorkDefinition = isothermalQuantity({
  key: 'isothermal-work',
  name: 'work done by the air, isothermal',
  symbol: 'w',
  ask: 'The work w done by the air in an isothermal change of pressure, positive when the air expands, per kilogram of dry air.',
  signSentence: 'The work is counted positive when the air does it, by expanding.',
  example: { inputs: { temperature: 293.15, pressureStart: 100_000, pressureEnd: 70_000 }, gives: 30008.5, within: 0.1 },
})
