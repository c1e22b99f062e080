import { soundingWaterDefinition } from '../precipitableWater'

/** Precipitable water of a sounding by specific humidity: see `precipitableWater`. */
export const precipitableWaterDefinition = soundingWaterDefinition('q', { gives: 0.03906055, within: 4e-08 })
