import { constant } from '../constants'
import type { Constants, Inputs, Outcome, QuantityDefinition } from '../definition'
import { seriesOf } from '../inputs'
import { profileInputs } from '../inversion'
import { fineSlip } from '../slips'
import { texQuantity } from '../tex'

interface Crossing { below: number, height: number }

/**
 * Height of the freezing level: the lowest height at which temperature falls through 0 °C, linear in height between rows.
 *
 * Source: AMS Glossary of Meteorology, "freezing level". "None" where every row is below 0 °C, "not reached" where the data end above it in temperature.
 *
 * @example z 100, 600, 1100 m; T 5.0, 2.0, −1.0 °C: 933.3 m
 */
export const freezingLevelDefinition: QuantityDefinition = {
  key: 'freezing-level',
  name: 'height of the freezing level',
  symbol: 'z₀',
  unit: 'm',
  shownUnit: 'm',
  kind: 'difference',
  nearZero: 10,
  inputs: profileInputs(2),
  variants: [{
    key: 'lowest', label: 'lowest fall through 0 °C, linear between rows',
    source: { text: 'AMS Glossary of Meteorology, "freezing level"', status: 'common practice' },
    validity: 'rows in rising order', knownError: 'the spacing of the rows',
    evaluate: outcome,
  }],
  constants: ['zeroCelsius'],
  ask: 'The height of the freezing level: the lowest height at which temperature falls through 0 °C, linear in height between rows; "none" where every row is at or below 0 °C, "not reached" where the data end before it.',
  trace(inputs, constants) {
    const found = crossing(inputs, constants)
    if (!found) return [{ text: 'Temperature does not fall through 0 °C in the data', formula: 'T(z) = 0\\,{}^{\\circ}C', filled: 'T(z) \\ne 0\\,{}^{\\circ}C' }]
    const z = seriesOf(inputs, 'height'), T = seriesOf(inputs, 'temperature'), zero = constant(constants, 'zeroCelsius')
    const low = z[found.below] ?? 0, high = z[found.below + 1] ?? 0
    return [
      { text: 'Rows on both sides', formula: 'z_1,\\,T_1;\\quad z_2,\\,T_2', filled: `z_1 = ${texQuantity(low, 'm', 6)},\\ T_1 = ${texQuantity((T[found.below] ?? 0) - zero, 'Cel')};\\quad z_2 = ${texQuantity(high, 'm', 6)},\\ T_2 = ${texQuantity((T[found.below + 1] ?? 0) - zero, 'Cel')}` },
      { text: 'Linear between them', formula: 'z_0 = z_1 + (z_2 - z_1) \\frac{T_1}{T_1 - T_2}', filled: `z_0 = ${texQuantity(found.height, 'm', 6)}`, value: found.height, unit: 'm' },
    ]
  },
  slips: [
    fineSlip('row-below', 'last row above 0 °C in place of interpolation', 'This is the last row that is warmer than 0 °C: the ask interpolates between rows.', (inputs, constants) => rowAt(inputs, constants, 0)),
    fineSlip('row-above', 'first row below 0 °C in place of interpolation', 'This is the first row that is colder than 0 °C: the ask interpolates between rows.', (inputs, constants) => rowAt(inputs, constants, 1)),
  ],
  example: { inputs: { height: [100, 600, 1100], temperature: [278.15, 275.15, 272.15] }, gives: 933.333, within: 0.001 },
}

function crossing(inputs: Inputs, constants: Constants): Crossing | null {
  const z = seriesOf(inputs, 'height'), T = seriesOf(inputs, 'temperature'), zero = constant(constants, 'zeroCelsius')
  for (let at = 0; at + 1 < z.length; at++) {
    const warm = (T[at] ?? 0) - zero, cold = (T[at + 1] ?? 0) - zero
    if (warm > 0 && cold <= 0) return { below: at, height: (z[at] ?? 0) + warm / (warm - cold) * ((z[at + 1] ?? 0) - (z[at] ?? 0)) }
  }
  return null
}

function outcome(inputs: Inputs, constants: Constants): Outcome {
  const found = crossing(inputs, constants)
  if (found) return { is: 'value', value: found.height }
  const zero = constant(constants, 'zeroCelsius')
  return seriesOf(inputs, 'temperature').every(T => T <= zero) ? { is: 'none', why: 'Every row is at or below 0 °C.' } : { is: 'not_reached', why: 'The data end before temperature falls through 0 °C.' }
}

function rowAt(inputs: Inputs, constants: Constants, above: 0 | 1): number | null {
  const found = crossing(inputs, constants)
  return found && (seriesOf(inputs, 'height')[found.below + above] ?? null)
}
