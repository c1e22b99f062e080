import { saturatedPathDefinition } from '../saturatedPathDefinition'

/** Temperature after saturated ascent along the pseudoadiabat. Formula and source: `pseudoadiabat.ts`. */
export const saturatedAscentTemperatureDefinition = saturatedPathDefinition({
  key: 'saturated-ascent-temperature',
  name: 'temperature after pseudoadiabatic ascent of saturated air',
  direction: 'up',
  ask: 'The temperature of saturated air after it is lifted along its pseudoadiabat, over liquid water; condensed water leaves at once.',
  example: { inputs: { pressureStart: 92_500, temperature: 278.15, pressureEnd: 70_000 }, gives: 264.2758, within: 0.0002 },
})
