import { layerMeanDefinition } from '../layerMeans'

/** Mean mixing ratio of the lowest layer, weighted by pressure: see `layerMeanDefinition`. */
export const mixedLayerMeanMixingRatioDefinition = layerMeanDefinition('mixingRatio', 'pressure', { gives: 0.01590815, within: 2e-08 })
