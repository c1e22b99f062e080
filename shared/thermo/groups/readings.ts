import type { QuantityGroup } from '../definition'
import { observedAirTemperatureDefinition } from '../quantities/observedAirTemperature'
import { observedPressureDefinition } from '../quantities/observedPressure'
import { observedRelativeHumidityDefinition } from '../quantities/observedRelativeHumidity'
import { observedWetBulbTemperatureDefinition } from '../quantities/observedWetBulbTemperature'
import { observedWindSpeedDefinition } from '../quantities/observedWindSpeed'
import { lapseRateOfTwoReadingsDefinition } from '../quantities/lapseRateOfTwoReadings'
import { profileTemperatureAtHeightDefinition } from '../quantities/profileTemperatureAtHeight'

export const readings: QuantityGroup = {
  key: 'readings',
  title: 'Readings, off a plot and one’s own',
  quantities: [
    profileTemperatureAtHeightDefinition, lapseRateOfTwoReadingsDefinition,
    observedAirTemperatureDefinition, observedWetBulbTemperatureDefinition, observedPressureDefinition, observedRelativeHumidityDefinition, observedWindSpeedDefinition,
  ],
}
