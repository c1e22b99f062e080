/** What the latent heats of vaporization and of sublimation have in common. */
import type { InputDefinition, Inputs, QuantityDefinition, Slip } from './definition'
import { numberOf } from './inputs'
import type { LatentHeatForm } from './latentHeat'
import { joulesSlip, slip } from './slips'

interface LatentHeatQuantity extends Pick<QuantityDefinition, 'key' | 'name' | 'symbol' | 'ask' | 'example'> {
  range: readonly [number, number]
  forms: readonly LatentHeatForm[]
  slips: readonly Slip[]
}

const T = (inputs: Inputs) => numberOf(inputs, 'temperature')

export function latentHeatDefinition({ range, forms, slips, ...named }: LatentHeatQuantity): QuantityDefinition {
  const temperature: InputDefinition = { name: 'temperature', label: 'temperature', symbol: 'T', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range }
  return {
    ...named,
    unit: 'J/kg',
    shownUnit: 'kJ/kg',
    kind: 'ratio',
    inputs: [temperature],
    variants: forms.map(({ key, label, source, validity, knownError, holds, of }) => ({
      key, label, source, validity, knownError, ...holds ? { holds: { temperature: holds } } : {},
      evaluate: (inputs, constants) => ({ is: 'value', value: of(constants)(T(inputs)) }),
    })),
    constants: [...new Set(forms.flatMap(form => form.constants))],
    trace(inputs, constants, variant) {
      const form = forms.find(one => one.key === variant) ?? forms[0]
      if (!form) throw new Error(`${named.key} has no form`)
      const value = form.of(constants)(T(inputs))
      return [{ text: form.label, formula: form.formula, filled: form.filled(T(inputs), constants, value), value, unit: 'J/kg' }]
    },
    slips: [
      ...slips,
      slip('fusion', 'latent heat of fusion', 'This is the latent heat of fusion, 334 kJ kg⁻¹.', () => 3.34e5),
      joulesSlip,
      slip('megajoules-for-kilojoules', 'MJ given as kJ', 'Your number is in megajoules; the unit beside it says kilojoules.', (_i, _c, right) => right / 1000),
    ],
  }
}
