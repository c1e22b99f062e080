import { isobaricMixingDefinition, shareOf } from '../isobaricMixingDefinition'
import { fineMoistSlip } from '../moistQuantity'
import { fractionAsPercentSlip } from '../moistSlips'

/** Relative humidity of two bodies of air mixed at one pressure: it may be above 100 %, and that is the answer. Formulae and source: `isobaricMixingDefinition.ts`. */
export const isobaricMixingRelativeHumidityDefinition = isobaricMixingDefinition({
  key: 'isobaric-mixing-relative-humidity',
  name: 'relative humidity after isobaric mixing',
  symbol: 'RH',
  unit: '1', shownUnit: '%', kind: 'fraction',
  part: 'relative-humidity',
  ask: 'The relative humidity e/es over liquid water of the mixture of the two bodies of air at one pressure, before anything condenses: it may be above 100 %.',
  slips: [
    fineMoistSlip('mean-humidity', 'mean of the relative humidities', 'This is the mean of the relative humidities: vapor is kept, relative humidity is not.', hand => shareOf(hand) * hand.given('relativeHumidityFirst') + (1 - shareOf(hand)) * hand.given('relativeHumiditySecond')),
    fineMoistSlip('cut-off', 'cut off at 100 %', 'This stops at 100 %: before anything condenses the mixture is supersaturated, and that is asked.', ({ right }) => (right > 1.0005 ? 1 : null)),
    fineMoistSlip('masses-swapped', 'masses swapped', 'This comes from the masses in each other’s place.', ({ given, again }) => given('massFirst') === given('massSecond') ? null : again({ massFirst: given('massSecond'), massSecond: given('massFirst') })),
    fractionAsPercentSlip,
  ],
  example: { inputs: { massFirst: 1, temperatureFirst: 273.15, massSecond: 1, temperatureSecond: 303.15, relativeHumidityFirst: 1, relativeHumiditySecond: 0.8, pressure: 100_000 }, gives: 1.1802588, within: 1e-6 },
})
