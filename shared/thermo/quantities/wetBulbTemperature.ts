import { mixingRatioFrom } from '../humidity'
import { lclFunction } from '../liftingCondensation'
import { dewpointInput, pressureInput, temperatureInput } from '../moistInputs'
import { fineMoistSlip, foggy, moistQuantity } from '../moistQuantity'
import { kelvinAsCelsiusSlip } from '../moistSlips'
import { inCelsius, mixingRatioStep } from '../moistTex'
import { glossary } from '../sources'
import { isobaricWetBulb, pseudoadiabaticWetBulb } from '../wetBulb'

/** Isobaric wet-bulb temperature from the dewpoint. Formula and source: `wetBulb.ts`. */
export const wetBulbTemperatureDefinition = moistQuantity({
  key: 'wet-bulb-temperature',
  name: 'wet-bulb temperature',
  symbol: 'T_w',
  unit: 'K', shownUnit: 'Cel', kind: 'temperature',
  inputs: [pressureInput, temperatureInput, dewpointInput],
  variants: [
    { key: 'isobaric', label: 'isobaric, with the heat capacity of the vapor', source: glossary('wet-bulb temperature'), validity: 'liquid water on the bulb', knownError: '0.05 K by the formulae inside', value: ({ given, air }) => isobaricWetBulb(given('temperature'), mixingRatioFrom(air.es(given('dewpoint')), given('pressure'), air.epsilon), given('pressure'), air) },
    { key: 'dry-heat', label: 'isobaric, with the heat capacity of dry air', source: glossary('wet-bulb temperature', 'common practice'), validity: 'liquid water on the bulb', knownError: '0.1 K', value: ({ given, air }) => isobaricWetBulb(given('temperature'), mixingRatioFrom(air.es(given('dewpoint')), given('pressure'), air.epsilon), given('pressure'), air, false) },
  ],
  constants: ['R', 'Rv', 'cp', 'cpv', 'latentHeat', 'cw', 'enhancementFactor'],
  inside: ['es', 'L'],
  notedAt: { es: given => [given('dewpoint')] },
  remarks: ({ given }) => [foggy(given('temperature'), given('dewpoint'))],
  ask: 'The isobaric wet-bulb temperature over liquid water, at which the air is saturated by water that evaporates into it at constant pressure, not by lifting.',
  working: ({ given, air }, value) => [
    { ...mixingRatioStep('w', 'e', air.es(given('dewpoint')), given('pressure'), air), text: 'Mixing ratio of the air, with e = es(Td)' },
    { text: 'The temperature at which the air’s heat has paid for saturation, found by a bracket', formula: '(c_p + w\\,c_{pv})\\,(T - T_w) = L\\,[w_s(T_w) - w]', filled: `T_w = ${inCelsius(value)}` },
  ],
  slips: [
    fineMoistSlip('pseudoadiabatic', 'by lifting and lowering', 'This is the pseudoadiabatic wet bulb, by lifting to condensation and lowering: asked is the isobaric one.', ({ given, air, constants, formulae }) => given('dewpoint') >= given('temperature') ? null : pseudoadiabaticWetBulb(given('pressure'), lclFunction(constants, formulae)(given('temperature'), given('dewpoint'), given('pressure')), air)),
    fineMoistSlip('mean', 'mean of temperature and dewpoint', 'This is the mean of temperature and dewpoint.', ({ given }) => given('dewpoint') === given('temperature') ? null : (given('temperature') + given('dewpoint')) / 2),
    fineMoistSlip('third', 'a third of the way to the dewpoint', 'This is the rule of thumb T − (T − Td)/3.', ({ given }) => given('dewpoint') === given('temperature') ? null : given('temperature') - (given('temperature') - given('dewpoint')) / 3),
    fineMoistSlip('dewpoint', 'dewpoint for wet bulb', 'This is the dewpoint: the wet bulb lies between it and the temperature.', ({ given }) => given('dewpoint') === given('temperature') ? null : given('dewpoint')),
    kelvinAsCelsiusSlip,
  ],
  example: { inputs: { pressure: 95_461, temperature: 303.15, dewpoint: 296.49 }, gives: 298.1741, within: 0.0001 },
})
