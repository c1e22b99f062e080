/** What the base, the top and the strength of an inversion have in common. */
import type { Inputs, QuantityDefinition, Slip } from './definition'
import { inversionInputs, inversionRule, lowestInversion, type Inversion } from './inversion'
import { zeroCelsius } from './slips'
import { texQuantity } from './tex'

interface Part {
  key: string
  name: string
  symbol: string
  unit: 'm' | 'K'
  nearZero?: number
  /** What is asked of the inversion, before its rule. */
  asked: string
  formula: string
  of: (inversion: Inversion) => number
  slips: readonly Slip[]
  gives: number
}

/** The lowest inversion of a definition's inputs, where there is one: for a slip. */
export const ofInversion = (of: (inversion: Inversion) => number) => (inputs: Inputs): number | null => {
  const inversion = lowestInversion(inputs)
  return inversion && of(inversion)
}

export function inversionDefinition({ key, name, symbol, unit, nearZero, asked, formula, of, slips, gives }: Part): QuantityDefinition {
  return {
    key, name, symbol, unit, shownUnit: unit, kind: 'difference', nearZero, inputs: inversionInputs,
    variants: [{
      key: 'row-to-row', label: 'rise of temperature from row to row',
      source: { text: 'AMS Glossary of Meteorology, "inversion"; rules of depth and isothermal steps stated in the ask', status: 'common practice' },
      validity: 'rows in rising order, noise less than the rise', knownError: 'the spacing of the rows',
      evaluate(inputs) {
        const inversion = lowestInversion(inputs)
        return inversion ? { is: 'value', value: of(inversion), more: { base: inversion.base, top: inversion.top } } : { is: 'none', why: 'No layer of the given depth has temperature rising with height.' }
      },
    }],
    constants: [],
    ask: `${asked}: ${inversionRule}.`,
    trace(inputs) {
      const inversion = lowestInversion(inputs)
      if (!inversion) return [{ text: 'No layer of this depth has temperature rising with height', formula: '\\Delta T \\le 0', filled: '\\Delta T \\le 0' }]
      const value = of(inversion)
      return [
        { text: 'Base and top', formula: 'z_1,\\,T_1;\\quad z_2,\\,T_2', filled: `z_1 = ${texQuantity(inversion.base, 'm', 6)},\\ T_1 = ${texQuantity(inversion.baseTemperature - zeroCelsius, 'Cel')};\\quad z_2 = ${texQuantity(inversion.top, 'm', 6)},\\ T_2 = ${texQuantity(inversion.topTemperature - zeroCelsius, 'Cel')}` },
        { text: asked, formula, filled: `${formula} = ${texQuantity(value, unit, 6)}`, value, unit },
      ]
    },
    slips,
    example: { inputs: { height: [0, 100, 200, 300, 400], temperature: [283.15, 282.15, 284.15, 285.15, 284.15], minimumDepth: 50 }, gives, within: 1e-9 },
  }
}
