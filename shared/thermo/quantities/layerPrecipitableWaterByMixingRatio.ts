import { layerWaterDefinition } from '../precipitableWater'

/** Precipitable water of a layer by mixing ratio: see `layerPrecipitableWater`. */
export const layerPrecipitableWaterByMixingRatioDefinition = layerWaterDefinition('w', { gives: 0.0244648, within: 1e-6 })
