import { daviesJonesWetBulbPotential, equivalentPotentialTemperature } from '../equivalentPotential'
import { lclFunction, lclTemperatureKey } from '../liftingCondensation'
import { dewpointInput, pressureInput, temperatureInput } from '../moistInputs'
import { fineMoistSlip, foggy, moistQuantity, type Hand } from '../moistQuantity'
import { kelvinAsCelsiusSlip } from '../moistSlips'
import { inCelsius, inHectopascal, inKelvin } from '../moistTex'
import { pow } from '../../numerics/elementary'
import { pseudoadiabaticWetBulb } from '../wetBulb'

const lclOf = ({ given, constants, formulae }: Hand) => lclFunction(constants, formulae)(given('temperature'), given('dewpoint'), given('pressure'))
const thetaE = ({ given, air }: Hand) => equivalentPotentialTemperature(given('temperature'), given('dewpoint'), given('pressure'), air)

/** Wet-bulb potential temperature: where the parcel's pseudoadiabat meets 1000 hPa. Formulae and sources: `pseudoadiabat.ts`, `equivalentPotential.ts`. */
export const wetBulbPotentialTemperatureDefinition = moistQuantity({
  key: 'wet-bulb-potential-temperature',
  name: 'wet-bulb potential temperature',
  symbol: 'θw',
  unit: 'K', shownUnit: 'Cel', kind: 'temperature',
  inputs: [pressureInput, temperatureInput, dewpointInput],
  variants: [
    { key: 'pseudoadiabat', label: 'down the pseudoadiabat to 1000 hPa', source: { text: 'AMS Glossary of Meteorology, "wet-bulb potential temperature"', status: 'verified' }, validity: 'over liquid water', knownError: '0.2 K by the latent heat', value: hand => pseudoadiabaticWetBulb(100_000, lclOf(hand), hand.air) },
    { key: 'davies-jones', label: 'Davies-Jones’ fit to θe', source: { text: 'Davies-Jones (2008), Mon. Wea. Rev. 136, 2764–2785, Eq. 3.8; coefficients read in transcriptions', status: 'verified' }, validity: 'θe 257–377 K', knownError: '0.02 K of its pseudoadiabats', value: hand => daviesJonesWetBulbPotential(thetaE(hand)) },
  ],
  constants: ['R', 'Rv', 'cp', 'kappa', 'cpv', 'latentHeat', 'cw', 'enhancementFactor'],
  inside: ['es', 'L', lclTemperatureKey],
  notedAt: { es: given => [given('dewpoint')] },
  remarks: ({ given }) => [foggy(given('temperature'), given('dewpoint'))],
  ask: 'The wet-bulb potential temperature: the temperature that the parcel’s pseudoadiabat has at 1000 hPa.',
  working: (hand, value) => {
    if (hand.variant === 'davies-jones') return [
      { text: 'Equivalent potential temperature by Bolton’s equation 39', formula: '\\theta_e', filled: `\\theta_e = ${inKelvin(thetaE(hand))}`, value: thetaE(hand), unit: 'K' },
      { text: 'Davies-Jones’ fit, with X = θe/273.15 K', formula: '\\theta_w = \\theta_e - \\exp\\frac{7.101574 - 20.68208 X + 16.11182 X^2 + 2.574631 X^3 - 5.205688 X^4}{1 - 3.552497 X + 3.781782 X^2 - 0.6899655 X^3 - 0.5929340 X^4}', filled: `\\theta_w = ${inKelvin(value)} = ${inCelsius(value)}` },
    ]
    const lcl = lclOf(hand)
    return [
      { text: 'Up the dry adiabat to the lifting condensation level', formula: 'T \\to T_L,\\ p \\to p_L', filled: `T_L = ${inCelsius(lcl.temperature)},\\ p_L = ${inHectopascal(lcl.pressure)}`, value: lcl.temperature, unit: 'K' },
      { text: 'Along the pseudoadiabat to 1000 hPa', formula: 'T_L \\to \\theta_w', filled: `\\theta_w = ${inCelsius(value)} = ${inKelvin(value)}` },
    ]
  },
  slips: [
    fineMoistSlip('wet-bulb', 'wet bulb at its own pressure', 'This is the wet-bulb temperature at the parcel’s own pressure: it is still to be taken to 1000 hPa.', hand => hand.given('pressure') === 100_000 ? null : pseudoadiabaticWetBulb(hand.given('pressure'), lclOf(hand), hand.air)),
    fineMoistSlip('dry-down', 'down the dry adiabat', 'This takes the wet-bulb temperature to 1000 hPa along the dry adiabat: it goes along the pseudoadiabat.', hand => hand.given('pressure') === 100_000 ? null : pseudoadiabaticWetBulb(hand.given('pressure'), lclOf(hand), hand.air) * pow(100_000 / hand.given('pressure'), hand.air.kappa)),
    fineMoistSlip('theta', 'potential temperature', 'This is the potential temperature of the parcel.', ({ given, air }) => given('dewpoint') >= given('temperature') && given('pressure') === 100_000 ? null : given('temperature') * pow(100_000 / given('pressure'), air.kappa)),
    fineMoistSlip('theta-e', 'equivalent potential temperature', 'This is the equivalent potential temperature of the parcel.', thetaE),
    kelvinAsCelsiusSlip,
  ],
  example: { inputs: { pressure: 85_000, temperature: 293.15, dewpoint: 291.15 }, gives: 297.4164, within: 0.0001 },
})
