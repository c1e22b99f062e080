import type { Inputs, Outcome, QuantityDefinition } from '../definition'
import { lengthInput } from '../inputKinds'
import { numberOf } from '../inputs'
import { heightsOf, layerInputs, temperaturesOf } from '../layer'
import { fineSlip, zeroCelsius } from '../slips'
import { texQuantity } from '../tex'

interface Bracket { lowHeight: number, lowTemperature: number, highHeight: number, highTemperature: number }

/**
 * Temperature of a profile at a height, linear in height between the nearest row below and the nearest row above.
 *
 *   T(z) = T₁ + (T₂ − T₁)(z − z₁)/(z₂ − z₁)
 *
 * Source: common practice (linear interpolation between levels). Rows need no order. "Not reached" where the height lies outside the data.
 *
 * @example z 100, 150, 200 m; T 15.0, 14.6, 14.1 °C; at 175 m: 14.35 °C
 */
export const profileTemperatureAtHeightDefinition: QuantityDefinition = {
  key: 'profile-temperature-at-height',
  name: 'temperature of a profile at a height',
  symbol: 'T(z)',
  unit: 'K',
  shownUnit: 'Cel',
  kind: 'temperature',
  inputs: [...layerInputs(2), lengthInput('level', 'height that is asked for', 'z', [-500, 100_000])],
  variants: [{
    key: 'linear', label: 'linear in height between the nearest rows',
    source: { text: 'linear interpolation between levels', status: 'common practice' },
    validity: 'between the lowest and the highest row', knownError: 'the spacing of the rows',
    evaluate: outcome,
  }],
  constants: [],
  ask: 'The temperature at the given height, linear in height between the nearest row below and the nearest row above; "not reached" where the data do not reach it.',
  trace(inputs) {
    const found = bracketOf(inputs), level = numberOf(inputs, 'level')
    if (!found) return [{ text: 'The data do not reach the height', formula: 'z_{\\min} \\le z \\le z_{\\max}', filled: `z = ${texQuantity(level, 'm', 6)}` }]
    const value = between(found, level)
    return [
      { text: 'Nearest rows', formula: 'z_1,\\,T_1;\\quad z_2,\\,T_2', filled: `z_1 = ${texQuantity(found.lowHeight, 'm', 6)},\\ T_1 = ${texQuantity(found.lowTemperature - zeroCelsius, 'Cel')};\\quad z_2 = ${texQuantity(found.highHeight, 'm', 6)},\\ T_2 = ${texQuantity(found.highTemperature - zeroCelsius, 'Cel')}` },
      { text: 'Linear between them', formula: 'T = T_1 + (T_2 - T_1)\\frac{z - z_1}{z_2 - z_1}', filled: `T = ${texQuantity(value - zeroCelsius, 'Cel', 5)}`, value, unit: 'K' },
    ]
  },
  slips: [
    fineSlip('row-below', 'row below in place of interpolation', 'This is the row below: the ask goes on linearly to the height.', inputs => bracketOf(inputs)?.lowTemperature ?? null),
    fineSlip('row-above', 'row above in place of interpolation', 'This is the row above: the ask stays linear up to the height.', inputs => bracketOf(inputs)?.highTemperature ?? null),
    fineSlip('parts-exchanged', 'parts of the way exchanged', 'This goes from the upper row down as far as it should have gone up from the lower one.', (inputs) => {
      const found = bracketOf(inputs)
      return found && found.lowTemperature + found.highTemperature - between(found, numberOf(inputs, 'level'))
    }),
  ],
  example: { inputs: { height: [100, 150, 200], temperature: [288.15, 287.75, 287.25], level: 175 }, gives: 287.5, within: 1e-9 },
}

/** The nearest row at or below the height and the nearest at or above it; null where the data do not reach it. */
function bracketOf(inputs: Inputs): Bracket | null {
  const heights = heightsOf(inputs), temperatures = temperaturesOf(inputs), level = numberOf(inputs, 'level')
  let low = -1, high = -1
  heights.forEach((height, at) => {
    if (height <= level && (low < 0 || height > (heights[low] ?? height))) low = at
    if (height >= level && (high < 0 || height < (heights[high] ?? height))) high = at
  })
  if (low < 0 || high < 0) return null
  return { lowHeight: heights[low] ?? level, lowTemperature: temperatures[low] ?? 0, highHeight: heights[high] ?? level, highTemperature: temperatures[high] ?? 0 }
}

const between = (rows: Bracket, level: number): number => rows.highHeight === rows.lowHeight
  ? rows.lowTemperature
  : rows.lowTemperature + (rows.highTemperature - rows.lowTemperature) * ((level - rows.lowHeight) / (rows.highHeight - rows.lowHeight))

function outcome(inputs: Inputs): Outcome {
  const found = bracketOf(inputs)
  return found ? { is: 'value', value: between(found, numberOf(inputs, 'level')) } : { is: 'not_reached', why: 'The data do not reach this height.' }
}
