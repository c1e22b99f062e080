import { soundingWaterDefinition } from '../precipitableWater'

/** Precipitable water of a sounding by mixing ratio: see `precipitableWater`. */
export const precipitableWaterByMixingRatioDefinition = soundingWaterDefinition('w', { gives: 0.03951854, within: 4e-08 })
