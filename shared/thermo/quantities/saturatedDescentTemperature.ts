import { saturatedPathDefinition } from '../saturatedPathDefinition'

/** Temperature after saturated descent along the pseudoadiabat. Formula and source: `pseudoadiabat.ts`. */
export const saturatedDescentTemperatureDefinition = saturatedPathDefinition({
  key: 'saturated-descent-temperature',
  name: 'temperature after saturated descent along the pseudoadiabat',
  direction: 'down',
  ask: 'The temperature of air that is kept saturated as it is lowered along its pseudoadiabat, by water that evaporates into it; air without liquid water warms dry-adiabatically instead.',
  example: { inputs: { pressureStart: 70_000, temperature: 264.2758, pressureEnd: 92_500 }, gives: 278.15, within: 0.0005 },
})
