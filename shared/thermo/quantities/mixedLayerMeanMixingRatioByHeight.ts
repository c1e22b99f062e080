import { layerMeanDefinition } from '../layerMeans'

/** Mean mixing ratio of the lowest layer, weighted by height: see `layerMeanDefinition`. */
export const mixedLayerMeanMixingRatioByHeightDefinition = layerMeanDefinition('mixingRatio', 'height', { gives: 0.01641539, within: 2e-08 })
