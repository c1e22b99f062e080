import { layerWaterDefinition } from '../precipitableWater'

/** Precipitable water of a layer by specific humidity: see `layerPrecipitableWater`. */
export const layerPrecipitableWaterDefinition = layerWaterDefinition('q', { gives: 0.0242706, within: 1e-6 })
