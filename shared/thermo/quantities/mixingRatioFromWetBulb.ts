import { OutOfRangeError } from '../errors'
import { mixingRatioFrom } from '../humidity'
import { pressureInput, temperatureInput, wetBulbInput } from '../moistInputs'
import { fineMoistSlip, moistQuantity, moistSlip, type Hand } from '../moistQuantity'
import { kilogramSlip } from '../moistSlips'
import { inGrams, mixingRatioStep } from '../moistTex'
import { texNumber } from '../tex'
import { mixingRatioFromWetBulb } from '../wetBulb'

const ws = ({ given, air }: Hand) => mixingRatioFrom(air.es(given('wetBulb')), given('pressure'), air.epsilon)
const depression = ({ given }: Hand) => given('temperature') - given('wetBulb')

/** @throws {OutOfRangeError} where the bulb is colder than dry air would make it */
function checked(hand: Hand, w: number): number {
  if (!(w > 0)) throw new OutOfRangeError('wetBulb', hand.given('wetBulb'), 'wet-bulb temperatures that dry air or moister reaches')
  return w
}

/** Mixing ratio from the thermodynamic wet bulb. Formula and source: `wetBulb.ts`. */
export const mixingRatioFromWetBulbDefinition = moistQuantity({
  key: 'mixing-ratio-from-wet-bulb',
  name: 'mixing ratio from the wet-bulb temperature',
  symbol: 'w',
  unit: '1', shownUnit: 'g/kg', kind: 'ratio',
  inputs: [pressureInput, temperatureInput, wetBulbInput],
  variants: [
    { key: 'isobaric', label: 'with the heat capacity of the vapor', source: { text: 'ASHRAE Handbook – Fundamentals (2017), SI, ch. 1, Eq. 33; read in the documentation of PsychroLib', status: 'verified' }, validity: 'liquid water on the bulb', knownError: '0.5 %', value: hand => checked(hand, mixingRatioFromWetBulb(hand.given('temperature'), hand.given('wetBulb'), hand.given('pressure'), hand.air)) },
    { key: 'dry-heat', label: 'with the heat capacity of dry air', source: { text: 'AMS Glossary of Meteorology, "wet-bulb temperature" (isobaric)', status: 'common practice' }, validity: 'liquid water on the bulb', knownError: '0.5 %', value: hand => checked(hand, mixingRatioFromWetBulb(hand.given('temperature'), hand.given('wetBulb'), hand.given('pressure'), hand.air, false)) },
  ],
  constants: ['R', 'Rv', 'cp', 'cpv', 'latentHeat', 'cw', 'enhancementFactor'],
  inside: ['es', 'L'],
  notedAt: { es: given => [given('wetBulb')], L: given => [given('wetBulb')] },
  ask: 'The mixing ratio w of the air from its (thermodynamic, isobaric) wet-bulb temperature over liquid water.',
  working: (hand, value) => {
    const { given, air } = hand, L = air.L(given('wetBulb'))
    return [
      { ...mixingRatioStep('w_s', 'e_s', air.es(given('wetBulb')), given('pressure'), air), text: 'Saturation mixing ratio at the wet bulb' },
      { text: 'The air’s heat pays for the water that evaporates', formula: hand.variant === 'dry-heat' ? 'w = w_s - \\frac{c_p\\,(T - T_w)}{L}' : 'w = \\frac{L\\,w_s - c_p\\,(T - T_w)}{L + c_{pv}\\,(T - T_w)}', filled: hand.variant === 'dry-heat' ? `w = ${texNumber(ws(hand))} - \\frac{${texNumber(air.cp)} \\cdot ${texNumber(depression(hand))}}{${texNumber(L, 6)}} = ${inGrams(value)}` : `w = \\frac{${texNumber(L, 6)} \\cdot ${texNumber(ws(hand))} - ${texNumber(air.cp)} \\cdot ${texNumber(depression(hand))}}{${texNumber(L, 6)} + ${texNumber(air.cpv)} \\cdot ${texNumber(depression(hand))}} = ${inGrams(value)}` },
    ]
  },
  slips: [
    fineMoistSlip('saturation', 'saturation at the wet bulb', 'This is the saturation mixing ratio at the wet bulb: the air holds less, since its heat paid for what evaporated.', ws),
    moistSlip('sign', 'added in place of taken away', 'What evaporates comes on top of what the air held: it is taken away, not added.', hand => depression(hand) === 0 ? null : (hand.air.L(hand.given('wetBulb')) * ws(hand) + hand.air.cp * depression(hand)) / (hand.air.L(hand.given('wetBulb')) - hand.air.cpv * depression(hand))),
    moistSlip('swapped', 'dry and wet bulb swapped', 'This comes from the dry and the wet bulb in each other’s place.', ({ given, air }) => given('temperature') === given('wetBulb') ? null : mixingRatioFromWetBulb(given('wetBulb'), given('temperature'), given('pressure'), air)),
    kilogramSlip,
  ],
  example: { inputs: { pressure: 95_461, temperature: 303.15, wetBulb: 298.15 }, gives: 0.01921305, within: 1e-8 },
})
