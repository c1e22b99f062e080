/** What the indices of 850, 700 and 500 hPa have in common: a high site or a tethersonde has none, and nothing is extrapolated. */
import type { Constants, Formulae, Inputs, Outcome, QuantityDefinition, Slip, TraceStep } from './definition'
import { ascentConstants, ascentUses } from './parcelContext'
import { exampleSounding } from './parcelDefinition'
import { zeroCelsius } from './slips'
import { soundingInputs, surfacePressureInput } from './sounding'
import { threeLevels, type Levels } from './stabilityIndices'
import { texQuantity } from './tex'

interface Index extends Pick<QuantityDefinition, 'key' | 'name' | 'symbol' | 'kind' | 'shownUnit' | 'nearZero' | 'ask'> {
  source: string
  isAscent: boolean
  of: (levels: Levels, inputs: Inputs, constants: Constants, formulae: Formulae) => number
  steps: (levels: Levels, value: number, inputs: Inputs, constants: Constants, formulae: Formulae) => readonly TraceStep[]
  slips: readonly Slip[]
  gives: number
  within: number
}

/** A slip that is made of the three levels. */
export const ofLevels = (of: (levels: Levels, inputs: Inputs, constants: Constants, formulae: Formulae) => number): Slip['apply'] => (inputs, constants, _right, formulae) => {
  const levels = threeLevels(inputs, constants, formulae)
  return levels && of(levels, inputs, constants, formulae)
}

export function indexDefinition({ source, isAscent, of, steps, slips, gives, within, ask, ...named }: Index): QuantityDefinition {
  const outcome = (inputs: Inputs, constants: Constants, formulae: Formulae): Outcome => {
    const levels = threeLevels(inputs, constants, formulae)
    return levels ? { is: 'value', value: of(levels, inputs, constants, formulae) } : { is: 'not_defined', why: 'The ground lies above 850 hPa, or the data end below 500 hPa: nothing is extrapolated.' }
  }
  return {
    ...named,
    unit: 'K',
    inputs: [...soundingInputs, surfacePressureInput],
    variants: [{
      key: 'three-levels', label: 'linear in ln p between rows', source: { text: source, status: 'common practice' },
      validity: 'soundings from below 850 to above 500 hPa', knownError: isAscent ? 'latent heat by temperature or constant, up to 0.35 K' : 'rounding of the levels', evaluate: outcome,
    }],
    constants: isAscent ? ascentConstants : [],
    uses: isAscent ? ascentUses : [],
    ask: `${ask} Temperatures and dewpoints are linear in ln p between rows; "not defined" where the ground lies above 850 hPa or the data end below 500 hPa.`,
    trace(inputs, constants, _variant, formulae) {
      const levels = threeLevels(inputs, constants, formulae)
      if (!levels) return [{ text: 'A level is missing', formula: '850,\\,700,\\,500\\,\\mathrm{hPa}', filled: '850,\\,700,\\,500\\,\\mathrm{hPa}' }]
      const { t850, d850, t700, d700, t500 } = levels, c = (T: number) => texQuantity(T - zeroCelsius, 'Cel', 4)
      return [
        { text: 'The levels', formula: 'T_{850},\\,T_{d,850},\\,T_{700},\\,T_{d,700},\\,T_{500}', filled: `${c(t850)},\\ ${c(d850)},\\ ${c(t700)},\\ ${c(d700)},\\ ${c(t500)}` },
        ...steps(levels, of(levels, inputs, constants, formulae), inputs, constants, formulae),
      ]
    },
    slips,
    example: { inputs: exampleSounding, gives, within },
  }
}
