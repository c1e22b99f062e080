import { isothermalQuantity } from '../isothermal'

/** Heat taken up, isothermal: R T ln(p₁/p₂), J kg⁻¹. Formula, source and range: `isothermal.ts`. */
export const isothermalHeatDefinition = isothermalQuantity({
  key: 'isothermal-heat',
  name: 'heat taken up, isothermal',
  symbol: 'q',
  ask: 'The heat q that the air takes up in an isothermal change of pressure, positive when taken up, per kilogram of dry air.',
  signSentence: 'The heat is counted positive when the air takes it up.',
  example: { inputs: { temperature: 293.15, pressureStart: 100_000, pressureEnd: 70_000 }, gives: 30008.5, within: 0.1 },
})
