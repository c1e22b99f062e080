import type { QuantityDefinition } from './definition'
import { adiabaticEnthalpyChangeDefinition } from './quantities/adiabaticEnthalpyChange'
import { adiabaticEnthalpyChangeOfMassDefinition } from './quantities/adiabaticEnthalpyChangeOfMass'
import { adiabaticHeatDefinition } from './quantities/adiabaticHeat'
import { adiabaticHeatOfMassDefinition } from './quantities/adiabaticHeatOfMass'
import { adiabaticInternalEnergyChangeDefinition } from './quantities/adiabaticInternalEnergyChange'
import { adiabaticInternalEnergyChangeOfMassDefinition } from './quantities/adiabaticInternalEnergyChangeOfMass'
import { adiabaticWorkDefinition } from './quantities/adiabaticWork'
import { adiabaticWorkOfMassDefinition } from './quantities/adiabaticWorkOfMass'
import { densityDefinition } from './quantities/density'
import { dryAdiabaticLapseRateDefinition } from './quantities/dryAdiabaticLapseRate'
import { hypsometricThicknessDefinition } from './quantities/hypsometricThickness'
import { isobaricEnthalpyChangeDefinition } from './quantities/isobaricEnthalpyChange'
import { isobaricEnthalpyChangeOfMassDefinition } from './quantities/isobaricEnthalpyChangeOfMass'
import { isobaricHeatDefinition } from './quantities/isobaricHeat'
import { isobaricHeatOfMassDefinition } from './quantities/isobaricHeatOfMass'
import { isobaricInternalEnergyChangeDefinition } from './quantities/isobaricInternalEnergyChange'
import { isobaricInternalEnergyChangeOfMassDefinition } from './quantities/isobaricInternalEnergyChangeOfMass'
import { isobaricWorkDefinition } from './quantities/isobaricWork'
import { isobaricWorkOfMassDefinition } from './quantities/isobaricWorkOfMass'
import { lapseRateEndPointsDefinition } from './quantities/lapseRateEndPoints'
import { lapseRateLeastSquaresDefinition } from './quantities/lapseRateLeastSquares'
import { lapseRateStandardErrorDefinition } from './quantities/lapseRateStandardError'
import { parcelTemperatureByHeightDefinition } from './quantities/parcelTemperatureByHeight'
import { potentialTemperatureDefinition } from './quantities/potentialTemperature'
import { staticStabilityDefinition } from './quantities/staticStability'

/** Every quantity, in the order in which a course meets them. A test sees to it that each file of `quantities/` is here. */
export const quantities: readonly QuantityDefinition[] = [
  densityDefinition,
  potentialTemperatureDefinition,
  isobaricHeatDefinition,
  isobaricHeatOfMassDefinition,
  isobaricWorkDefinition,
  isobaricWorkOfMassDefinition,
  isobaricInternalEnergyChangeDefinition,
  isobaricInternalEnergyChangeOfMassDefinition,
  isobaricEnthalpyChangeDefinition,
  isobaricEnthalpyChangeOfMassDefinition,
  adiabaticWorkDefinition,
  adiabaticWorkOfMassDefinition,
  adiabaticInternalEnergyChangeDefinition,
  adiabaticInternalEnergyChangeOfMassDefinition,
  adiabaticEnthalpyChangeDefinition,
  adiabaticEnthalpyChangeOfMassDefinition,
  adiabaticHeatDefinition,
  adiabaticHeatOfMassDefinition,
  dryAdiabaticLapseRateDefinition,
  parcelTemperatureByHeightDefinition,
  lapseRateEndPointsDefinition,
  lapseRateLeastSquaresDefinition,
  lapseRateStandardErrorDefinition,
  hypsometricThicknessDefinition,
  staticStabilityDefinition,
]

const byKey = new Map(quantities.map(definition => [definition.key, definition]))

/** The definition of a key; null where there is none. */
export const findQuantity = (key: string): QuantityDefinition | null => byKey.get(key) ?? null
