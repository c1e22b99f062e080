import type { Inputs } from '../definition'
import { lengthInput, temperatureInput } from '../inputKinds'
import { dryClassLimits } from '../layer'
import { numberOf } from '../inputs'
import { OutOfRangeError } from '../errors'
import { oneFormula } from '../oneFormula'
import { per100MetersSlip, perMeterSlip, signSlip, slip } from '../slips'
import { texNumber, texQuantity } from '../tex'

/**
 * Lapse rate between two levels that are read off one by one.
 *
 *   Γ = −(T₂ − T₁)/(z₂ − z₁)
 *
 * Source: AMS Glossary of Meteorology, "lapse rate", as a difference quotient (common practice). Read off a plot, each reading is good to half a
 * division: the accepted range grows by (δT₁ + δT₂)/Δz + |Γ|(δz₁ + δz₂)/Δz.
 *
 * @example 18.0 °C at 20 m, 16.2 °C at 220 m: +9.0 K km⁻¹
 */
export const lapseRateOfTwoReadingsDefinition = oneFormula({
  key: 'lapse-rate-of-two-readings',
  name: 'lapse rate between two readings',
  symbol: 'Γ',
  unit: 'K/m',
  shownUnit: 'K/km',
  kind: 'difference',
  nearZero: 0.001,
  inputs: [
    lengthInput('lowerHeight', 'height of the lower reading', 'z₁', [-500, 100_000]), temperatureInput('lowerTemperature', 'temperature of the lower reading', 'T₁'),
    lengthInput('upperHeight', 'height of the upper reading', 'z₂', [-500, 100_000]), temperatureInput('upperTemperature', 'temperature of the upper reading', 'T₂'),
  ],
  constants: [],
  classLimits: dryClassLimits,
  formula: {
    key: 'difference', label: 'difference quotient of two readings',
    source: { text: 'AMS Glossary of Meteorology, "lapse rate", as a difference quotient', status: 'common practice' },
    validity: 'two heights that differ', knownError: 'what the two readings are good to',
  },
  value: rate,
  ask: 'The lapse rate Γ = −(T₂ − T₁)/(z₂ − z₁) between the two readings, positive where temperature falls with height.',
  working(inputs, _constants, value) {
    const [z1, T1, z2, T2] = given(inputs)
    return [
      { text: 'Differences', formula: 'T_2 - T_1,\\quad z_2 - z_1', filled: `T_2 - T_1 = ${texQuantity(T2 - T1, 'K')},\\quad z_2 - z_1 = ${texQuantity(z2 - z1, 'm', 6)}` },
      { text: 'Lapse rate', formula: '\\Gamma = -\\frac{T_2 - T_1}{z_2 - z_1}', filled: `\\Gamma = -\\frac{${texNumber(T2 - T1)}}{${texNumber(z2 - z1)}}\\,\\mathrm{K\\,m^{-1}} = ${texQuantity(value * 1000, 'K/km')}`, value, unit: 'K/m' },
    ]
  },
  slips: [
    signSlip('A lapse rate is positive where temperature falls with height: it is the difference quotient with its sign turned.'),
    perMeterSlip, per100MetersSlip,
    slip('upper-height', 'height in place of the difference of heights', 'This divides by the upper height: the difference of the two heights is needed.', (inputs) => {
      const [, T1, z2, T2] = given(inputs)
      return z2 === 0 ? null : -(T2 - T1) / z2
    }),
  ],
  example: { inputs: { lowerHeight: 20, lowerTemperature: 291.15, upperHeight: 220, upperTemperature: 289.35 }, gives: 0.009, within: 1e-12 },
})

const given = (inputs: Inputs) => [numberOf(inputs, 'lowerHeight'), numberOf(inputs, 'lowerTemperature'), numberOf(inputs, 'upperHeight'), numberOf(inputs, 'upperTemperature')] as const

function rate(inputs: Inputs): number {
  const [z1, T1, z2, T2] = given(inputs)
  if (z1 === z2) throw new OutOfRangeError('upperHeight', z2, 'a height other than the lower one')
  return -(T2 - T1) / (z2 - z1)
}
