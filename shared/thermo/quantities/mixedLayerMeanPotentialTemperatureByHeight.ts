import { layerMeanDefinition } from '../layerMeans'

/** Mean potential temperature of the lowest layer, weighted by height: see `layerMeanDefinition`. */
export const mixedLayerMeanPotentialTemperatureByHeightDefinition = layerMeanDefinition('theta', 'height', { gives: 301.5775, within: 0.0003 })
