import { mixingRatioFrom } from '../humidity'
import { lclFunction, lclTemperatureKey } from '../liftingCondensation'
import { dewpointInput, pressureInput, temperatureInput } from '../moistInputs'
import { fineMoistSlip, foggy, moistQuantity, type Hand } from '../moistQuantity'
import { kelvinAsCelsiusSlip } from '../moistSlips'
import { inCelsius, inHectopascal } from '../moistTex'
import { glossary } from '../sources'
import { isobaricWetBulb, pseudoadiabaticWetBulb } from '../wetBulb'

const lclOf = ({ given, constants, formulae }: Hand) => lclFunction(constants, formulae)(given('temperature'), given('dewpoint'), given('pressure'))

/** Pseudoadiabatic wet-bulb temperature, by Normand's rule. Formula and source: `wetBulb.ts`. Up to 0.3 K from the isobaric one, which is another quantity. */
export const pseudoadiabaticWetBulbTemperatureDefinition = moistQuantity({
  key: 'pseudoadiabatic-wet-bulb-temperature',
  name: 'pseudoadiabatic wet-bulb temperature',
  symbol: 'T_sw',
  unit: 'K', shownUnit: 'Cel', kind: 'temperature',
  inputs: [pressureInput, temperatureInput, dewpointInput],
  variants: [{ key: 'normand', label: 'Normand’s rule', source: glossary('wet-bulb temperature', 'common practice'), validity: 'over liquid water', knownError: '0.1 K by the formulae inside', value: hand => pseudoadiabaticWetBulb(hand.given('pressure'), lclOf(hand), hand.air) }],
  constants: ['R', 'Rv', 'cp', 'kappa', 'cpv', 'latentHeat', 'cw', 'enhancementFactor'],
  inside: ['es', 'L', lclTemperatureKey],
  notedAt: { es: given => [given('dewpoint')] },
  remarks: ({ given }) => [foggy(given('temperature'), given('dewpoint'))],
  ask: 'The pseudoadiabatic wet-bulb temperature: lifted dry-adiabatically to condensation, then lowered along the pseudoadiabat to the pressure of the start.',
  working: (hand, value) => {
    const lcl = lclOf(hand)
    return [
      { text: 'Up the dry adiabat to the lifting condensation level', formula: 'T \\to T_L,\\ p \\to p_L', filled: `T_L = ${inCelsius(lcl.temperature)},\\ p_L = ${inHectopascal(lcl.pressure)}`, value: lcl.temperature, unit: 'K' },
      { text: 'Down the pseudoadiabat to the pressure of the start', formula: 'T_L \\to T_{sw}', filled: `T_{sw} = ${inCelsius(value)}` },
    ]
  },
  slips: [
    fineMoistSlip('isobaric', 'isobaric wet bulb', 'This is the isobaric wet bulb: asked is that by lifting and lowering.', ({ given, air }) => given('dewpoint') >= given('temperature') ? null : isobaricWetBulb(given('temperature'), mixingRatioFrom(air.es(given('dewpoint')), given('pressure'), air.epsilon), given('pressure'), air)),
    fineMoistSlip('lcl', 'temperature at the condensation level', 'This is the temperature at the condensation level: it is still to be lowered to the start.', hand => hand.given('dewpoint') >= hand.given('temperature') ? null : lclOf(hand).temperature),
    fineMoistSlip('mean', 'mean of temperature and dewpoint', 'This is the mean of temperature and dewpoint.', ({ given }) => given('dewpoint') === given('temperature') ? null : (given('temperature') + given('dewpoint')) / 2),
    kelvinAsCelsiusSlip,
  ],
  example: { inputs: { pressure: 95_461, temperature: 303.15, dewpoint: 296.49 }, gives: 298.1528, within: 0.0001 },
})
