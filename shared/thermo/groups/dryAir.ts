import type { QuantityGroup } from '../definition'
import { adiabaticEnthalpyChangeDefinition } from '../quantities/adiabaticEnthalpyChange'
import { adiabaticEnthalpyChangeOfMassDefinition } from '../quantities/adiabaticEnthalpyChangeOfMass'
import { adiabaticHeatDefinition } from '../quantities/adiabaticHeat'
import { adiabaticHeatOfMassDefinition } from '../quantities/adiabaticHeatOfMass'
import { adiabaticInternalEnergyChangeDefinition } from '../quantities/adiabaticInternalEnergyChange'
import { adiabaticInternalEnergyChangeOfMassDefinition } from '../quantities/adiabaticInternalEnergyChangeOfMass'
import { adiabaticWorkDefinition } from '../quantities/adiabaticWork'
import { adiabaticWorkOfMassDefinition } from '../quantities/adiabaticWorkOfMass'
import { densityDefinition } from '../quantities/density'
import { dryAdiabaticLapseRateDefinition } from '../quantities/dryAdiabaticLapseRate'
import { isobaricEnthalpyChangeDefinition } from '../quantities/isobaricEnthalpyChange'
import { isobaricEnthalpyChangeOfMassDefinition } from '../quantities/isobaricEnthalpyChangeOfMass'
import { isobaricHeatDefinition } from '../quantities/isobaricHeat'
import { isobaricHeatOfMassDefinition } from '../quantities/isobaricHeatOfMass'
import { isobaricInternalEnergyChangeDefinition } from '../quantities/isobaricInternalEnergyChange'
import { isobaricInternalEnergyChangeOfMassDefinition } from '../quantities/isobaricInternalEnergyChangeOfMass'
import { isobaricWorkDefinition } from '../quantities/isobaricWork'
import { isobaricWorkOfMassDefinition } from '../quantities/isobaricWorkOfMass'
import { parcelTemperatureByHeightDefinition } from '../quantities/parcelTemperatureByHeight'
import { potentialTemperatureDefinition } from '../quantities/potentialTemperature'

export const dryAir: QuantityGroup = {
  key: 'dry-air',
  title: 'Dry air and the first law',
  quantities: [
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
  ],
}
