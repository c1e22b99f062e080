/** What the lapse rates of virtual temperature have in common: the plain methods, on rows whose temperature is made virtual first. */
import type { Inputs, Outcome, QuantityDefinition, Slip, TraceStep, Variant } from './definition'
import { dryClassLimits } from './layer'
import { fineSlip, per100MetersSlip, perMeterSlip, signSlip } from './slips'
import { texQuantity } from './tex'
import { moistLayerInputs, plainRows, rowsVirtualInCelsius, virtualRows, virtualTemperatureKey } from './virtualLayer'

interface VirtualLapseRate extends Pick<QuantityDefinition, 'key' | 'name' | 'ask' | 'example'> {
  least: number
  formula: Omit<Variant, 'evaluate'>
  /** Γ of rows, whatever their temperature is. */
  rate: (rows: Inputs) => number
  /** What a plain outcome says beside its value. */
  beside?: (rows: Inputs) => Omit<Extract<Outcome, { is: 'value' }>, 'is' | 'value'>
  /** The working from the virtual temperatures on; ends in the value. */
  steps: (rows: Inputs, value: number) => readonly TraceStep[]
  /** The other methods, on the same rows. */
  otherMethods: readonly { key: string, label: string, sentence: string, rate: (rows: Inputs) => number }[]
}

export function virtualLapseRateDefinition({ least, formula, rate, beside, steps, otherMethods, ...named }: VirtualLapseRate): QuantityDefinition {
  return {
    ...named,
    symbol: 'Γ_v',
    unit: 'K/m',
    shownUnit: 'K/km',
    kind: 'difference',
    nearZero: 0.001,
    inputs: moistLayerInputs(least),
    variants: [{
      ...formula,
      evaluate: (inputs, constants, formulae) => {
        const rows = virtualRows(inputs, constants, formulae)
        return { is: 'value', value: rate(rows), ...beside?.(rows) }
      },
    }],
    constants: ['R', 'Rv'],
    uses: [virtualTemperatureKey],
    classLimits: dryClassLimits,
    trace(inputs, constants, _variant, formulae) {
      const rows = virtualRows(inputs, constants, formulae)
      return [virtualStep(rows, formulae.variants[virtualTemperatureKey] === 'linear'), ...steps(rows, rate(rows))]
    },
    slips: [
      signSlip('A lapse rate is positive where the virtual temperature falls with height; the layer may also have been taken upside down.'),
      perMeterSlip,
      per100MetersSlip,
      fineSlip('plain-temperature', 'T in place of Tv', 'This is the lapse rate of the temperature itself: the ask takes the virtual temperature, with the vapor of each row.', inputs => rate(plainRows(inputs))),
      fineSlip('celsius-for-kelvin', 'Tv made of °C', 'This comes from virtual temperatures that were made with T in °C: the factor belongs to kelvin.', (inputs, constants, _right, formulae) => rate(rowsVirtualInCelsius(inputs, constants, formulae))),
      ...otherMethods.map(({ key, label, sentence, rate: other }): Slip => fineSlip(key, label, sentence, (inputs, constants, _right, formulae) => other(virtualRows(inputs, constants, formulae)))),
    ],
  }
}

function virtualStep(rows: Inputs, isLinear: boolean): TraceStep {
  const T = Array.isArray(rows.temperature) ? rows.temperature : []
  const [first = 0, last = 0] = [T[0], T[T.length - 1]]
  return {
    text: `Virtual temperatures of the ${T.length} rows, with T in kelvin and w in kg per kg`,
    formula: isLinear ? 'T_v = T\\,(1 + 0.61\\,w)' : 'T_v = T\\,\\frac{1 + w/\\varepsilon}{1 + w}',
    filled: `T_{v,1} = ${texQuantity(first, 'K', 6)},\\quad T_{v,${T.length}} = ${texQuantity(last, 'K', 6)}`,
  }
}
