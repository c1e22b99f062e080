import { lclDefinition } from '../lclDefinition'
import { fineMoistSlip, moistSlip } from '../moistQuantity'

/** Height of the lifting condensation level above the parcel's start. Formulae and sources: `liftingCondensation.ts`; the 125 m K⁻¹ rule where a convention names it. */
export const liftingCondensationLevelHeightDefinition = lclDefinition({
  key: 'lifting-condensation-level-height',
  name: 'height of the lifting condensation level above the start',
  symbol: 'z_L',
  unit: 'm', shownUnit: 'm', kind: 'difference',
  nearZero: 50,
  part: 'heightAboveStart',
  more: [{ key: 'espy', label: 'the 125 m per kelvin rule', source: { text: 'Lawrence (2005), Bull. Amer. Meteor. Soc. 86, 225–233', status: 'from memory' }, validity: 'RH above 50 %', knownError: '1 to 3 %', value: ({ given }) => 125 * Math.max(0, given('temperature') - given('dewpoint')) }],
  ask: 'The height of the lifting condensation level above the parcel’s start, lifted without mixing; above ground or sea level it is the start’s height more.',
  slips: [
    fineMoistSlip('whole-spread', 'T − Td at Γd', 'This takes the whole of T − Td at the dry adiabatic lapse rate: the dewpoint falls too as the parcel rises.', ({ given, air }) => given('dewpoint') >= given('temperature') ? null : air.cp / air.g * (given('temperature') - given('dewpoint'))),
    moistSlip('feet-for-meters', 'feet given as meters', 'Your number is in feet; the unit beside it says meters.', ({ right }) => right / 0.3048),
    moistSlip('kilometers-for-meters', 'km given as m', 'Your number is in kilometers; the unit beside it says meters.', ({ right }) => right / 1000),
    moistSlip('standard-atmosphere', '6.5 K km⁻¹ for Γd', 'This comes from 6.5 K km⁻¹, the mean rate of the standard atmosphere: an unsaturated parcel cools at Γd.', ({ right, air }) => right * (air.g / air.cp) / 0.0065),
  ],
  example: { inputs: { pressure: 100_000, temperature: 293.15, dewpoint: 285.15 }, gives: 1011.791, within: 0.01 },
})
