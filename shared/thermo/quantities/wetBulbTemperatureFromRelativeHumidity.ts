import { mixingRatioFrom } from '../humidity'
import { pressureInput, relativeHumidityInput, temperatureInput } from '../moistInputs'
import { fineMoistSlip, moistQuantity, moistSlip, supersaturated, type Hand } from '../moistQuantity'
import { kelvinAsCelsiusSlip } from '../moistSlips'
import { inCelsius, mixingRatioStep } from '../moistTex'
import { zeroCelsius } from '../slips'
import { glossary } from '../sources'
import { isobaricWetBulb, stullWetBulb } from '../wetBulb'

const vapor = ({ given, air }: Hand) => given('relativeHumidity') * air.es(given('temperature'))
const solved = (hand: Hand, vaporHeat: boolean) => isobaricWetBulb(hand.given('temperature'), mixingRatioFrom(vapor(hand), hand.given('pressure'), hand.air.epsilon), hand.given('pressure'), hand.air, vaporHeat)

/** Isobaric wet-bulb temperature from the relative humidity. Formulae and sources: `wetBulb.ts`; Stull's fit where a convention names it. */
export const wetBulbTemperatureFromRelativeHumidityDefinition = moistQuantity({
  key: 'wet-bulb-temperature-from-relative-humidity',
  name: 'wet-bulb temperature from the relative humidity',
  symbol: 'T_w',
  unit: 'K', shownUnit: 'Cel', kind: 'temperature',
  inputs: [pressureInput, temperatureInput, relativeHumidityInput],
  variants: [
    { key: 'isobaric', label: 'isobaric, with the heat capacity of the vapor', source: glossary('wet-bulb temperature'), validity: 'liquid water on the bulb', knownError: '0.05 K by the formulae inside', value: hand => solved(hand, true) },
    { key: 'dry-heat', label: 'isobaric, with the heat capacity of dry air', source: glossary('wet-bulb temperature', 'common practice'), validity: 'liquid water on the bulb', knownError: '0.1 K', value: hand => solved(hand, false) },
    { key: 'stull', label: 'Stull’s fit at 1013.25 hPa', source: { text: 'Stull (2011), J. Appl. Meteor. Climatol. 50, 2267–2269, Eq. 1; coefficients read in transcriptions', status: 'verified' }, validity: 'about 1013.25 hPa, RH 5–99 %, −20 to 50 °C', knownError: '−1.0 to +0.65 K by its paper, which leaves out air both cold and dry; −1.2 to +1.3 K above 0 °C as measured, farthest where it is dry', holds: { pressure: [98_000, 104_000], temperature: [253.15, 323.15], relativeHumidity: [0.05, 0.99] }, value: ({ given }) => stullWetBulb(given('temperature'), given('relativeHumidity')) },
  ],
  constants: ['R', 'Rv', 'cp', 'cpv', 'latentHeat', 'cw', 'enhancementFactor'],
  inside: ['es', 'L'],
  notedAt: { es: given => [given('temperature')] },
  remarks: ({ given }) => [supersaturated(given('relativeHumidity'))],
  ask: 'The isobaric wet-bulb temperature over liquid water, from the temperature, the relative humidity e/es and the pressure.',
  working: (hand, value) => hand.variant === 'stull'
    ? [{ text: 'Stull’s fit, with t in °C and RH in percent', formula: 'T_w = t \\arctan[0.151977\\,(\\mathit{RH} + 8.313659)^{1/2}] + \\arctan(t + \\mathit{RH}) - \\arctan(\\mathit{RH} - 1.676331) + 0.00391838\\,\\mathit{RH}^{3/2}\\arctan(0.023101\\,\\mathit{RH}) - 4.686035', filled: `T_w = ${inCelsius(value)}` }]
    : [
        { ...mixingRatioStep('w', 'e', vapor(hand), hand.given('pressure'), hand.air), text: 'Mixing ratio of the air, with e = RH es(T)' },
        { text: 'The temperature at which the air’s heat has paid for saturation, found by a bracket', formula: '(c_p + w\\,c_{pv})\\,(T - T_w) = L\\,[w_s(T_w) - w]', filled: `T_w = ${inCelsius(value)}` },
      ],
  slips: [
    fineMoistSlip('stull', 'Stull’s fit', 'This is a fit that holds at 1013.25 hPa only: asked is the wet bulb at this pressure.', ({ given, variant }) => variant === 'stull' || given('relativeHumidity') > 1 ? null : stullWetBulb(given('temperature'), given('relativeHumidity'))),
    moistSlip('share-of-celsius', 'T in °C times RH', 'This is the temperature in °C times the relative humidity.', ({ given }) => given('relativeHumidity') === 1 || given('temperature') === zeroCelsius ? null : zeroCelsius + given('relativeHumidity') * (given('temperature') - zeroCelsius)),
    kelvinAsCelsiusSlip,
  ],
  example: { inputs: { pressure: 101_325, temperature: 293.15, relativeHumidity: 0.5 }, gives: 286.9318, within: 0.0001 },
})
