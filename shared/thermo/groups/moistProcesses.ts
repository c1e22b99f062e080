import type { QuantityGroup } from '../definition'
import { adiabaticLiquidWaterDefinition } from '../quantities/adiabaticLiquidWater'
import { convectiveCondensationLevelPressureDefinition } from '../quantities/convectiveCondensationLevelPressure'
import { convectiveTemperatureDefinition } from '../quantities/convectiveTemperature'
import { equivalentPotentialTemperatureDefinition } from '../quantities/equivalentPotentialTemperature'
import { equivalentPotentialTemperatureShortcutDefinition } from '../quantities/equivalentPotentialTemperatureShortcut'
import { isobaricMixingRelativeHumidityDefinition } from '../quantities/isobaricMixingRelativeHumidity'
import { isobaricMixingTemperatureDefinition } from '../quantities/isobaricMixingTemperature'
import { isobaricMixingVaporPressureDefinition } from '../quantities/isobaricMixingVaporPressure'
import { liftingCondensationLevelHeightDefinition } from '../quantities/liftingCondensationLevelHeight'
import { liftingCondensationLevelPressureDefinition } from '../quantities/liftingCondensationLevelPressure'
import { liftingCondensationLevelTemperatureDefinition } from '../quantities/liftingCondensationLevelTemperature'
import { moistStaticEnergyDefinition } from '../quantities/moistStaticEnergy'
import { pseudoadiabaticWetBulbTemperatureDefinition } from '../quantities/pseudoadiabaticWetBulbTemperature'
import { reversibleAscentTemperatureDefinition } from '../quantities/reversibleAscentTemperature'
import { reversibleSaturatedLapseRateDefinition } from '../quantities/reversibleSaturatedLapseRate'
import { saturatedAdiabaticLapseRateDefinition } from '../quantities/saturatedAdiabaticLapseRate'
import { saturatedAscentTemperatureDefinition } from '../quantities/saturatedAscentTemperature'
import { saturatedDescentTemperatureDefinition } from '../quantities/saturatedDescentTemperature'
import { saturationEquivalentPotentialTemperatureDefinition } from '../quantities/saturationEquivalentPotentialTemperature'
import { virtualPotentialTemperatureDefinition } from '../quantities/virtualPotentialTemperature'
import { wetBulbPotentialTemperatureDefinition } from '../quantities/wetBulbPotentialTemperature'

export const moistProcesses: QuantityGroup = {
  key: 'moist-processes',
  title: 'Moist processes',
  quantities: [
    liftingCondensationLevelTemperatureDefinition,
    liftingCondensationLevelPressureDefinition,
    liftingCondensationLevelHeightDefinition,
    saturatedAdiabaticLapseRateDefinition,
    reversibleSaturatedLapseRateDefinition,
    saturatedAscentTemperatureDefinition,
    saturatedDescentTemperatureDefinition,
    reversibleAscentTemperatureDefinition,
    equivalentPotentialTemperatureDefinition,
    equivalentPotentialTemperatureShortcutDefinition,
    saturationEquivalentPotentialTemperatureDefinition,
    wetBulbPotentialTemperatureDefinition,
    pseudoadiabaticWetBulbTemperatureDefinition,
    virtualPotentialTemperatureDefinition,
    moistStaticEnergyDefinition,
    adiabaticLiquidWaterDefinition,
    isobaricMixingTemperatureDefinition,
    isobaricMixingVaporPressureDefinition,
    isobaricMixingRelativeHumidityDefinition,
    convectiveCondensationLevelPressureDefinition,
    convectiveTemperatureDefinition,
  ],
}
