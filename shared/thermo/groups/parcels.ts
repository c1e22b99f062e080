import type { QuantityGroup } from '../definition'
import { kIndexDefinition } from '../quantities/kIndex'
import { mixedLayerMeanMixingRatioDefinition } from '../quantities/mixedLayerMeanMixingRatio'
import { mixedLayerMeanMixingRatioByHeightDefinition } from '../quantities/mixedLayerMeanMixingRatioByHeight'
import { mixedLayerMeanPotentialTemperatureDefinition } from '../quantities/mixedLayerMeanPotentialTemperature'
import { mixedLayerMeanPotentialTemperatureByHeightDefinition } from '../quantities/mixedLayerMeanPotentialTemperatureByHeight'
import { mixedLayerParcelCapeDefinition } from '../quantities/mixedLayerParcelCape'
import { mixedLayerParcelCapeVirtualDefinition } from '../quantities/mixedLayerParcelCapeVirtual'
import { mixedLayerParcelCinDefinition } from '../quantities/mixedLayerParcelCin'
import { mixedLayerParcelCinVirtualDefinition } from '../quantities/mixedLayerParcelCinVirtual'
import { mixedLayerParcelElDefinition } from '../quantities/mixedLayerParcelEl'
import { mixedLayerParcelElVirtualDefinition } from '../quantities/mixedLayerParcelElVirtual'
import { mixedLayerParcelLclPressureDefinition } from '../quantities/mixedLayerParcelLclPressure'
import { mixedLayerParcelLclTemperatureDefinition } from '../quantities/mixedLayerParcelLclTemperature'
import { mixedLayerParcelLfcDefinition } from '../quantities/mixedLayerParcelLfc'
import { mixedLayerParcelLfcVirtualDefinition } from '../quantities/mixedLayerParcelLfcVirtual'
import { mixedLayerParcelLiftedIndexDefinition } from '../quantities/mixedLayerParcelLiftedIndex'
import { mixedLayerParcelLiftedIndexVirtualDefinition } from '../quantities/mixedLayerParcelLiftedIndexVirtual'
import { mostUnstableParcelCapeDefinition } from '../quantities/mostUnstableParcelCape'
import { mostUnstableParcelCapeVirtualDefinition } from '../quantities/mostUnstableParcelCapeVirtual'
import { mostUnstableParcelCinDefinition } from '../quantities/mostUnstableParcelCin'
import { mostUnstableParcelCinVirtualDefinition } from '../quantities/mostUnstableParcelCinVirtual'
import { mostUnstableParcelElDefinition } from '../quantities/mostUnstableParcelEl'
import { mostUnstableParcelElVirtualDefinition } from '../quantities/mostUnstableParcelElVirtual'
import { mostUnstableParcelLclPressureDefinition } from '../quantities/mostUnstableParcelLclPressure'
import { mostUnstableParcelLclTemperatureDefinition } from '../quantities/mostUnstableParcelLclTemperature'
import { mostUnstableParcelLfcDefinition } from '../quantities/mostUnstableParcelLfc'
import { mostUnstableParcelLfcVirtualDefinition } from '../quantities/mostUnstableParcelLfcVirtual'
import { mostUnstableParcelLiftedIndexDefinition } from '../quantities/mostUnstableParcelLiftedIndex'
import { mostUnstableParcelLiftedIndexVirtualDefinition } from '../quantities/mostUnstableParcelLiftedIndexVirtual'
import { showalterIndexDefinition } from '../quantities/showalterIndex'
import { statedParcelCapeDefinition } from '../quantities/statedParcelCape'
import { statedParcelCapeVirtualDefinition } from '../quantities/statedParcelCapeVirtual'
import { statedParcelCinDefinition } from '../quantities/statedParcelCin'
import { statedParcelCinVirtualDefinition } from '../quantities/statedParcelCinVirtual'
import { statedParcelElDefinition } from '../quantities/statedParcelEl'
import { statedParcelElVirtualDefinition } from '../quantities/statedParcelElVirtual'
import { statedParcelLclPressureDefinition } from '../quantities/statedParcelLclPressure'
import { statedParcelLclTemperatureDefinition } from '../quantities/statedParcelLclTemperature'
import { statedParcelLfcDefinition } from '../quantities/statedParcelLfc'
import { statedParcelLfcVirtualDefinition } from '../quantities/statedParcelLfcVirtual'
import { statedParcelLiftedIndexDefinition } from '../quantities/statedParcelLiftedIndex'
import { statedParcelLiftedIndexVirtualDefinition } from '../quantities/statedParcelLiftedIndexVirtual'
import { surfaceParcelCapeDefinition } from '../quantities/surfaceParcelCape'
import { surfaceParcelCapeVirtualDefinition } from '../quantities/surfaceParcelCapeVirtual'
import { surfaceParcelCinDefinition } from '../quantities/surfaceParcelCin'
import { surfaceParcelCinVirtualDefinition } from '../quantities/surfaceParcelCinVirtual'
import { surfaceParcelElDefinition } from '../quantities/surfaceParcelEl'
import { surfaceParcelElVirtualDefinition } from '../quantities/surfaceParcelElVirtual'
import { surfaceParcelLclPressureDefinition } from '../quantities/surfaceParcelLclPressure'
import { surfaceParcelLclTemperatureDefinition } from '../quantities/surfaceParcelLclTemperature'
import { surfaceParcelLfcDefinition } from '../quantities/surfaceParcelLfc'
import { surfaceParcelLfcVirtualDefinition } from '../quantities/surfaceParcelLfcVirtual'
import { surfaceParcelLiftedIndexDefinition } from '../quantities/surfaceParcelLiftedIndex'
import { surfaceParcelLiftedIndexVirtualDefinition } from '../quantities/surfaceParcelLiftedIndexVirtual'
import { totalTotalsIndexDefinition } from '../quantities/totalTotalsIndex'
import { precipitableWaterDefinition } from '../quantities/precipitableWater'
import { precipitableWaterByMixingRatioDefinition } from '../quantities/precipitableWaterByMixingRatio'
import { layerPrecipitableWaterDefinition } from '../quantities/layerPrecipitableWater'
import { layerPrecipitableWaterByMixingRatioDefinition } from '../quantities/layerPrecipitableWaterByMixingRatio'

export const parcels: QuantityGroup = {
  key: 'parcels',
  title: 'Parcels in a sounding',
  quantities: [
    surfaceParcelLclPressureDefinition,
    surfaceParcelLclTemperatureDefinition,
    surfaceParcelLfcDefinition,
    surfaceParcelLfcVirtualDefinition,
    surfaceParcelElDefinition,
    surfaceParcelElVirtualDefinition,
    surfaceParcelCapeDefinition,
    surfaceParcelCapeVirtualDefinition,
    surfaceParcelCinDefinition,
    surfaceParcelCinVirtualDefinition,
    surfaceParcelLiftedIndexDefinition,
    surfaceParcelLiftedIndexVirtualDefinition,
    mixedLayerParcelLclPressureDefinition,
    mixedLayerParcelLclTemperatureDefinition,
    mixedLayerParcelLfcDefinition,
    mixedLayerParcelLfcVirtualDefinition,
    mixedLayerParcelElDefinition,
    mixedLayerParcelElVirtualDefinition,
    mixedLayerParcelCapeDefinition,
    mixedLayerParcelCapeVirtualDefinition,
    mixedLayerParcelCinDefinition,
    mixedLayerParcelCinVirtualDefinition,
    mixedLayerParcelLiftedIndexDefinition,
    mixedLayerParcelLiftedIndexVirtualDefinition,
    mostUnstableParcelLclPressureDefinition,
    mostUnstableParcelLclTemperatureDefinition,
    mostUnstableParcelLfcDefinition,
    mostUnstableParcelLfcVirtualDefinition,
    mostUnstableParcelElDefinition,
    mostUnstableParcelElVirtualDefinition,
    mostUnstableParcelCapeDefinition,
    mostUnstableParcelCapeVirtualDefinition,
    mostUnstableParcelCinDefinition,
    mostUnstableParcelCinVirtualDefinition,
    mostUnstableParcelLiftedIndexDefinition,
    mostUnstableParcelLiftedIndexVirtualDefinition,
    statedParcelLclPressureDefinition,
    statedParcelLclTemperatureDefinition,
    statedParcelLfcDefinition,
    statedParcelLfcVirtualDefinition,
    statedParcelElDefinition,
    statedParcelElVirtualDefinition,
    statedParcelCapeDefinition,
    statedParcelCapeVirtualDefinition,
    statedParcelCinDefinition,
    statedParcelCinVirtualDefinition,
    statedParcelLiftedIndexDefinition,
    statedParcelLiftedIndexVirtualDefinition,
    mixedLayerMeanPotentialTemperatureDefinition,
    mixedLayerMeanMixingRatioDefinition,
    mixedLayerMeanPotentialTemperatureByHeightDefinition,
    mixedLayerMeanMixingRatioByHeightDefinition,
    showalterIndexDefinition,
    kIndexDefinition,
    totalTotalsIndexDefinition,
    precipitableWaterDefinition,
    precipitableWaterByMixingRatioDefinition,
    layerPrecipitableWaterDefinition,
    layerPrecipitableWaterByMixingRatioDefinition,
  ],
}
