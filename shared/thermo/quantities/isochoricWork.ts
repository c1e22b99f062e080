import { noChange } from '../noChange'

/** Work done by the air, isochoric: exactly 0. Why, and its slips: `noChange.ts`. */
export const isochoricWorkDefinition = noChange({
  key: 'isochoric-work',
  name: 'work done by the air, isochoric',
  symbol: 'w',
  tex: 'w = \\int p\\,d\\alpha',
  process: 'isochoric',
  because: 'At constant volume nothing is pushed away',
  source: 'AMS Glossary of Meteorology, "isochoric"; w is the integral of p dα',
  ask: 'The work w done by the air in a change at constant volume, per kilogram of dry air.',
  example: { inputs: { temperatureStart: 283.15, temperatureEnd: 303.15 }, gives: 0, within: 0 },
})
