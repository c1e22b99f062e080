import { layerMeanDefinition } from '../layerMeans'

/** Mean potential temperature of the lowest layer, weighted by pressure: see `layerMeanDefinition`. */
export const mixedLayerMeanPotentialTemperatureDefinition = layerMeanDefinition('theta', 'pressure', { gives: 301.9642, within: 0.0003 })
