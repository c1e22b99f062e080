/** Means of θ and w over the lowest layer, by pressure or by height: two quantities each. */
import type { Constants, Formulae, InputDefinition, Inputs, Outcome, QuantityDefinition } from './definition'
import { pow } from '../numerics/elementary'
import { SeriesError } from './errors'
import { numberOf, seriesOf } from './inputs'
import { mixedLayerMean } from './parcel'
import { ascentConstants, mixedLayerDepthInput, parcelContext } from './parcelContext'
import { exampleSounding } from './parcelDefinition'
import { fineSlip } from './slips'
import { soundingInputs } from './sounding'
import { texQuantity } from './tex'

export type Mean = 'theta' | 'mixingRatio'

const heightInputs: readonly InputDefinition[] = [
  { name: 'height', label: 'heights of the rows, rising', symbol: 'z', unit: 'm', shownUnit: 'm', kind: 'difference', shape: 'series', range: [-500, 100_000], needs: { least: 2, order: 'ascending' } },
  ...soundingInputs,
  { name: 'depth', label: 'depth of the layer', symbol: 'Δz', unit: 'm', shownUnit: 'm', kind: 'difference', shape: 'number', range: [1, 5000] },
]

/** Weighted by height: trapezoids between rows, θ and w linear in height at the layer's top; null where the data end below it. */
function meanByHeight(inputs: Inputs, constants: Constants, formulae: Formulae): { theta: number, mixingRatio: number } | null {
  const { sounding, air } = parcelContext(inputs, constants, formulae)
  const z = seriesOf(inputs, 'height'), depth = numberOf(inputs, 'depth')
  if (z.length !== sounding.count) throw new SeriesError('height', 'a height is needed for each row')
  const top = (z[0] ?? 0) + depth
  const thetaAt = (row: number) => (sounding.temperature[row] ?? 0) * pow(100_000 / (sounding.pressure[row] ?? 1), air.kappa)
  let theta = 0, mixingRatio = 0
  for (let row = 1; row < z.length; row++) {
    const low = z[row - 1] ?? 0, high = z[row] ?? 0, end = Math.min(high, top), share = (end - low) / (high - low)
    const from = thetaAt(row - 1), to = from + share * (thetaAt(row) - from)
    const dry = sounding.mixingRatio[row - 1] ?? 0, wet = dry + share * ((sounding.mixingRatio[row] ?? 0) - dry)
    theta += 0.5 * (from + to) * (end - low)
    mixingRatio += 0.5 * (dry + wet) * (end - low)
    if (high >= top) return { theta: theta / depth, mixingRatio: mixingRatio / depth }
  }
  return null
}

function meanByPressure(inputs: Inputs, constants: Constants, formulae: Formulae): { theta: number, mixingRatio: number } | null {
  const { sounding, air } = parcelContext(inputs, constants, formulae)
  return mixedLayerMean(sounding, numberOf(inputs, 'mixedLayerDepth'), air)
}

export function layerMeanDefinition(mean: Mean, by: 'pressure' | 'height', example: { gives: number, within: number }): QuantityDefinition {
  const isTheta = mean === 'theta', isByPressure = by === 'pressure'
  const of = isByPressure ? meanByPressure : meanByHeight
  const symbol = isTheta ? '\\bar\\theta' : '\\bar w', name = isTheta ? 'potential temperature' : 'mixing ratio'
  const outcome = (inputs: Inputs, constants: Constants, formulae: Formulae): Outcome => {
    const found = of(inputs, constants, formulae)
    return found ? { is: 'value', value: found[mean] } : { is: 'not_reached', why: 'The data end below the layer’s top.' }
  }
  const surface = (inputs: Inputs, constants: Constants, formulae: Formulae): number => {
    const { sounding, air } = parcelContext(inputs, constants, formulae)
    return isTheta ? (sounding.temperature[0] ?? 0) * pow(100_000 / (sounding.pressure[0] ?? 1), air.kappa) : sounding.mixingRatio[0] ?? 0
  }
  return {
    key: `mixed-layer-mean-${isTheta ? 'potential-temperature' : 'mixing-ratio'}${isByPressure ? '' : '-by-height'}`,
    name: `mean ${name} of the lowest layer, weighted by ${by}`,
    symbol: isTheta ? 'θ̄' : 'w̄',
    unit: isTheta ? 'K' : 'kg/kg',
    shownUnit: isTheta ? 'K' : 'g/kg',
    kind: isTheta ? 'temperature' : 'ratio',
    nearZero: isTheta ? undefined : 0.0001,
    inputs: isByPressure ? [...soundingInputs, mixedLayerDepthInput] : heightInputs,
    variants: [{
      key: 'trapezoids', label: `trapezoids in ${by} between rows`, source: { text: 'common practice: layer means by the trapezoidal rule', status: 'common practice' },
      validity: 'rows without gaps', knownError: 'the spacing of the rows', evaluate: outcome,
    }],
    constants: ascentConstants,
    uses: ['saturation-vapor-pressure'],
    ask: `The mean ${name} of the lowest layer of the given depth, weighted by ${by}: trapezoids between rows, ${isTheta ? 'θ' : 'w'} linear in ${isByPressure ? 'ln p' : 'height'} at the layer’s top; "not reached" where the data end below it.`,
    trace(inputs, constants, _variant, formulae) {
      const found = of(inputs, constants, formulae)
      if (!found) return [{ text: 'The data end below the layer’s top', formula: symbol, filled: symbol }]
      const value = found[mean]
      return [{ text: 'Mean over the layer', formula: `${symbol} = \\frac{\\int ${isTheta ? '\\theta' : 'w'}\\,d${isByPressure ? 'p' : 'z'}}{\\int d${isByPressure ? 'p' : 'z'}}`, filled: `${symbol} = ${isTheta ? texQuantity(value, 'K', 6) : texQuantity(value * 1000, 'g/kg')}`, value, unit: isTheta ? 'K' : 'kg/kg' }]
    },
    slips: [fineSlip('surface-value', 'value at the ground for the mean', 'This is the value of the lowest row: the ask takes the mean of the layer.', (inputs, constants, _right, formulae) => surface(inputs, constants, formulae))],
    example: {
      inputs: isByPressure ? { ...exampleSounding, mixedLayerDepth: 10_000 } : { height: [100, 780, 1500, 3100, 5800, 7500, 9600, 10_800, 12_300, 14_100, 16_600], ...exampleSounding, depth: 500 },
      ...example,
    },
  }
}
