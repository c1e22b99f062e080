/** What the two saturation vapor pressures have in common: over water and over ice differ by their forms. */
import type { InputDefinition, Inputs, QuantityDefinition, Slip } from './definition'
import { enhancementOf } from './constants'
import { numberOf } from './inputs'
import type { SaturationForm } from './saturation'
import { slip, zeroCelsius } from './slips'
import { texNumber, texQuantity } from './tex'

export const saturationInput = (range: readonly [number, number]): InputDefinition => (
  { name: 'temperature', label: 'temperature', symbol: 'T', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range })

interface SaturationQuantity extends Pick<QuantityDefinition, 'key' | 'name' | 'symbol' | 'ask' | 'example'> {
  input: InputDefinition
  forms: readonly SaturationForm[]
  slips: readonly Slip[]
}

const T = (inputs: Inputs) => numberOf(inputs, 'temperature')

export function saturationDefinition({ input, forms, slips, ...named }: SaturationQuantity): QuantityDefinition {
  return {
    ...named,
    unit: 'Pa',
    shownUnit: 'hPa',
    kind: 'ratio',
    inputs: [input],
    variants: forms.map(({ key, label, source, validity, knownError, holds, pressure }) => ({
      key, label, source, validity, knownError, holds: { temperature: holds },
      evaluate: (inputs, constants) => ({ is: 'value', value: enhancementOf(constants) * pressure(T(inputs)) }),
    })),
    constants: ['enhancementFactor'],
    trace(inputs, constants, variant) {
      const form = forms.find(one => one.key === variant) ?? forms[0]
      if (!form) throw new Error(`${named.key} has no form`)
      const pure = form.pressure(T(inputs)), factor = enhancementOf(constants)
      const steps = [{ text: `${form.label}, with ${form.temperature ? 't in °C' : 'T in kelvin'}`, formula: form.formula, filled: form.filled(T(inputs)), value: pure, unit: 'Pa' }]
      if (factor !== 1) steps.push({ text: 'Enhancement factor of moist air', formula: `f\\,${named.symbol}`, filled: `${texNumber(factor)} \\cdot ${texNumber(pure / 100, 6)} = ${texQuantity(factor * pure / 100, 'hPa', 6)}`, value: factor * pure, unit: 'Pa' })
      return steps
    },
    slips: [
      ...slips,
      slip('pascal-for-hectopascal', 'Pa given as hPa', 'Your number is in pascal; the unit beside it says hectopascal.', (_i, _c, right) => right * 100),
      slip('kilopascal-for-hectopascal', 'kPa given as hPa', 'Your number is in kilopascal; the unit beside it says hectopascal.', (_i, _c, right) => right / 10),
      slip('fahrenheit', '°F put in for °C', 'This comes from a temperature in °F put into a formula that takes °C.', (inputs) => {
        const fahrenheit = (T(inputs) - zeroCelsius) * 1.8 + 32
        return fahrenheit > -80 ? forms[0]?.pressure(zeroCelsius + fahrenheit) ?? null : null
      }),
    ],
  }
}
