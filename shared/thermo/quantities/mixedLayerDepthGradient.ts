import type { QuantityDefinition } from '../definition'
import { numberOf } from '../inputs'
import { mixedLayerInputs, parcelMixedLayerDepth, steepestStep } from '../mixedLayer'
import { fineSlip } from '../slips'
import { texQuantity } from '../tex'

/** Mixed-layer depth by the greatest gradient of θ: see `steepestStep`. "Not reached" where no gradient is as great as the least that counts. */
export const mixedLayerDepthGradientDefinition: QuantityDefinition = {
  key: 'mixed-layer-depth-gradient',
  name: 'mixed-layer depth by the greatest gradient of potential temperature',
  symbol: 'h',
  unit: 'm',
  shownUnit: 'm',
  kind: 'difference',
  nearZero: 10,
  inputs: [...mixedLayerInputs, { name: 'leastGradient', label: 'least gradient of θ that counts', symbol: 'γ_min', unit: 'K/m', shownUnit: 'K/km', kind: 'difference', shape: 'number', range: [0, 1] }],
  variants: [{
    key: 'greatest-gradient', label: 'mean height of the two neighboring rows with the greatest gradient',
    source: { text: 'Seidel et al. (2010), J. Geophys. Res. 115, D16113, section 2', status: 'from memory' },
    validity: 'a mixed layer under an inversion, heights above ground', knownError: 'half the spacing of the rows; a surface inversion is found in place of a mixed layer',
    evaluate(inputs) {
      const { height, gradient } = steepestStep(inputs)
      return gradient >= numberOf(inputs, 'leastGradient') && gradient > 0 ? { is: 'value', value: height, more: { gradient } } : { is: 'not_reached', why: 'No gradient of θ in the data is as great as the least that counts.' }
    },
  }],
  constants: [],
  ask: 'The mixed-layer depth above ground by the gradient method: the mean height of the two neighboring rows between which θ rises fastest with height, the lower ones where two are alike; "not reached" where no gradient is as great as the least that counts.',
  trace(inputs) {
    const { height, gradient } = steepestStep(inputs)
    return [
      { text: 'Greatest gradient between neighboring rows', formula: '\\max \\frac{\\Delta\\theta}{\\Delta z}', filled: `\\max \\frac{\\Delta\\theta}{\\Delta z} = ${texQuantity(gradient * 1000, 'K/km')}`, value: gradient, unit: 'K/m' },
      { text: 'Their mean height', formula: 'h = \\frac{z_i + z_{i+1}}{2}', filled: `h = ${texQuantity(height, 'm')}`, value: height, unit: 'm' },
    ]
  },
  slips: [
    fineSlip('parcel-method', 'parcel method in place of it', 'This is the depth by the parcel method without excess.', inputs => parcelMixedLayerDepth(inputs, 0)),
    fineSlip('highest-theta', 'height of the highest θ', 'This is where θ is highest: the ask looks for where it rises fastest.', (inputs) => {
      const theta = inputs.potentialTemperature, z = inputs.height
      if (!Array.isArray(theta) || !Array.isArray(z)) return null
      return z[theta.indexOf(Math.max(...theta))] ?? null
    }),
  ],
  example: { inputs: { height: [2, 100, 500, 800, 1000], potentialTemperature: [300, 299.8, 299.8, 300.2, 303], leastGradient: 0.005 }, gives: 900, within: 1e-9 },
}
