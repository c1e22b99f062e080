import { isobaricMixingDefinition, mixedTemperature, vaporOf } from '../isobaricMixingDefinition'
import { fineMoistSlip } from '../moistQuantity'
import { kilopascalSlip, pascalSlip } from '../moistSlips'

/** Vapor pressure of two bodies of air mixed at one pressure. Formulae and source: `isobaricMixingDefinition.ts`. */
export const isobaricMixingVaporPressureDefinition = isobaricMixingDefinition({
  key: 'isobaric-mixing-vapor-pressure',
  name: 'vapor pressure after isobaric mixing',
  symbol: 'e',
  unit: 'Pa', shownUnit: 'hPa', kind: 'ratio',
  part: 'vapor-pressure',
  ask: 'The vapor pressure of the mixture of the two bodies of air at one pressure, before anything condenses: it may be supersaturated.',
  slips: [
    fineMoistSlip('mean-humidity', 'mean of the relative humidities', 'This comes from the mean of the relative humidities at the mean temperature: vapor is kept, relative humidity is not.', (hand) => {
      const share = hand.given('massFirst') / (hand.given('massFirst') + hand.given('massSecond'))
      return (share * hand.given('relativeHumidityFirst') + (1 - share) * hand.given('relativeHumiditySecond')) * hand.air.es(mixedTemperature(hand))
    }),
    fineMoistSlip('plain-mean', 'mean without the masses', 'This is the plain mean of the vapor pressures: the masses differ.', hand => hand.given('massFirst') === hand.given('massSecond') ? null : (vaporOf(hand, 'First') + vaporOf(hand, 'Second')) / 2),
    fineMoistSlip('saturation', 'saturation at the mixture’s temperature', 'This is saturation at the temperature of the mixture: what it holds is the mean of what the two held.', hand => hand.air.es(mixedTemperature(hand))),
    fineMoistSlip('masses-swapped', 'masses swapped', 'This comes from the masses in each other’s place.', ({ given, again }) => given('massFirst') === given('massSecond') ? null : again({ massFirst: given('massSecond'), massSecond: given('massFirst') })),
    pascalSlip, kilopascalSlip,
  ],
  example: { inputs: { massFirst: 1, temperatureFirst: 273.15, massSecond: 1, temperatureSecond: 303.15, relativeHumidityFirst: 1, relativeHumiditySecond: 0.8, pressure: 100_000 }, gives: 2011.219, within: 0.001 },
})
