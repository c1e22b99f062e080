/** Heat capacities of moist air: at constant pressure and at constant volume. */
import { constant } from './constants'
import type { Constants, QuantityDefinition } from './definition'
import { mixingRatioInput } from './moistInputs'
import { moistQuantity, moistSlip, smallMoistSlip } from './moistQuantity'
import { glossary } from './sources'
import { texNumber, texQuantity } from './tex'

interface MoistHeat extends Pick<QuantityDefinition, 'key' | 'name' | 'symbol' | 'ask' | 'example' | 'constants'> {
  tex: string
  dryTex: string
  vaporTex: string
  dry: (constants: Constants) => number
  vapor: (constants: Constants) => number
}

/** c = (c_dry + w c_vapor)/(1 + w), per kilogram of moist air. Source: AMS Glossary of Meteorology, "specific heat". */
export function moistHeatDefinition({ tex, dryTex, vaporTex, dry, vapor, ...named }: MoistHeat): QuantityDefinition {
  const whole = (constants: Constants, w: number) => (dry(constants) + w * vapor(constants)) / (1 + w)
  return moistQuantity({
    ...named,
    unit: 'J/(kg.K)', shownUnit: 'J/(kg.K)', kind: 'ratio',
    inputs: [mixingRatioInput],
    variants: [{ key: 'by-mass', label: 'dry air and vapor by mass', source: glossary('specific heat', 'common practice'), validity: 'near the temperatures of the lower atmosphere', knownError: '0.2 %', value: ({ given, constants }) => whole(constants, given('mixingRatio')) }],
    working: ({ given, constants }, value) => {
      const w = given('mixingRatio')
      return [{ text: 'Dry air and vapor by their masses, with w in kg per kg', formula: `${tex} = \\frac{${dryTex} + w\\,${vaporTex}}{1 + w}`, filled: `${tex} = \\frac{${texNumber(dry(constants), 6)} + ${texNumber(w)} \\cdot ${texNumber(vapor(constants))}}{1 + ${texNumber(w)}} = ${texQuantity(value, 'J/(kg.K)', 6)}` }]
    },
    slips: [
      smallMoistSlip('dry', 'as if dry', 'This is that of dry air: the vapor, which takes twice as much, is not in it.', ({ constants }) => dry(constants)),
      smallMoistSlip('per-dry-air', 'per kilogram of dry air', 'This is per kilogram of dry air: divide by 1 + w.', ({ given, right }) => right * (1 + given('mixingRatio'))),
      smallMoistSlip('liquid', 'liquid water for vapor', 'This comes from the specific heat of liquid water: the air holds vapor.', ({ given, constants }) => (dry(constants) + given('mixingRatio') * constant(constants, 'cw')) / (1 + given('mixingRatio'))),
      moistSlip('grams', 'g kg⁻¹ put in for kg kg⁻¹', 'This is what comes out with w in g per kg: the formula takes kg per kg.', ({ given, again }) => again({ mixingRatio: 1000 * given('mixingRatio') })),
    ],
  })
}
