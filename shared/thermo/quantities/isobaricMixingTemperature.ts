import { isobaricMixingDefinition } from '../isobaricMixingDefinition'
import { fineMoistSlip } from '../moistQuantity'
import { kelvinAsCelsiusSlip } from '../moistSlips'

/** Temperature of two bodies of air mixed at one pressure. Formula and source: `isobaricMixingDefinition.ts`. */
export const isobaricMixingTemperatureDefinition = isobaricMixingDefinition({
  key: 'isobaric-mixing-temperature',
  name: 'temperature after isobaric mixing',
  symbol: 'T',
  unit: 'K', shownUnit: 'Cel', kind: 'temperature',
  part: 'temperature',
  ask: 'The temperature of the mixture of the two bodies of air at one pressure, before anything condenses.',
  slips: [
    fineMoistSlip('plain-mean', 'mean without the masses', 'This is the plain mean: the masses differ.', ({ given }) => given('massFirst') === given('massSecond') ? null : (given('temperatureFirst') + given('temperatureSecond')) / 2),
    fineMoistSlip('masses-swapped', 'masses swapped', 'This comes from the masses in each other’s place.', ({ given, again }) => given('massFirst') === given('massSecond') ? null : again({ massFirst: given('massSecond'), massSecond: given('massFirst') })),
    kelvinAsCelsiusSlip,
  ],
  example: { inputs: { massFirst: 1, temperatureFirst: 273.15, massSecond: 1, temperatureSecond: 303.15 }, gives: 288.15, within: 1e-9 },
})
