import { minus, over, toDouble } from '../numerics/rational'
import { getUnit } from '../units/ucum'

/**
 * What a column can be: the quantities that a station or a flight measures, each with the units that files use.
 * Values stay in the file's own unit; `factor` and `offset` lead to the canonical one (canonical = value × factor + offset),
 * which `shared/units/ucum.ts` knows.
 */
export interface MeasuredUnit { ucum: string, label: string, factor: number, offset: number }
export interface MeasuredQuantity {
  key: string
  label: string
  /** UCUM code of the unit in which limits are written. */
  canonical: string
  units: readonly MeasuredUnit[]
}

interface Spelled { ucum: string, label: string, /** Where UCUM's table here has no such unit: its size in the canonical one. */ factor?: number }
const unit = (ucum: string, label: string, factor?: number): Spelled => ({ ucum, label, ...(factor === undefined ? {} : { factor }) })

const temperatures: readonly [Spelled, ...Spelled[]] = [unit('Cel', '°C'), unit('K', 'K'), unit('[degF]', '°F')]
const pressures: readonly [Spelled, ...Spelled[]] = [unit('hPa', 'hPa'), unit('mbar', 'mbar'), unit('kPa', 'kPa'), unit('Pa', 'Pa'), unit('[in_i\'Hg]', 'inHg'), unit('mm[Hg]', 'mmHg')]
const lengths: readonly [Spelled, ...Spelled[]] = [unit('m', 'm'), unit('km', 'km'), unit('[ft_i]', 'ft')]
const speeds: readonly [Spelled, ...Spelled[]] = [unit('m/s', 'm/s'), unit('km/h', 'km/h'), unit('[kn_i]', 'kn'), unit('[mi_i]/h', 'mph')]
const depths: readonly [Spelled, ...Spelled[]] = [unit('mm', 'mm'), unit('cm', 'cm'), unit('[in_i]', 'in')]
const directions: readonly [Spelled, ...Spelled[]] = [unit('deg', '°'), unit('10.deg', 'tens of °'), unit('45.deg/2', 'sixteenths of the rose')]
const fluxes: readonly [Spelled, ...Spelled[]] = [unit('W/m2', 'W/m²'), unit('kW/m2', 'kW/m²')]
const shares: readonly [Spelled, ...Spelled[]] = [unit('%', '%'), unit('1', '1')]

function measuredUnit(spelled: Spelled, canonical: string): MeasuredUnit {
  if (spelled.factor !== undefined) return { ucum: spelled.ucum, label: spelled.label, factor: spelled.factor, offset: 0 }
  const [from, to] = [getUnit(spelled.ucum), getUnit(canonical)]
  return { ucum: spelled.ucum, label: spelled.label, factor: toDouble(over(from.factor, to.factor)), offset: toDouble(over(minus(from.offset, to.offset), to.factor)) }
}

const quantity = (key: string, label: string, units: readonly [Spelled, ...Spelled[]]): MeasuredQuantity => ({ key, label, canonical: units[0].ucum, units: units.map(one => measuredUnit(one, units[0].ucum)) })

export const measuredQuantities: readonly MeasuredQuantity[] = [
  quantity('air-temperature', 'air temperature', temperatures),
  quantity('dewpoint', 'dewpoint', temperatures),
  quantity('wet-bulb-temperature', 'wet-bulb temperature', temperatures),
  quantity('surface-temperature', 'surface temperature', temperatures),
  quantity('soil-temperature', 'soil temperature', temperatures),
  quantity('relative-humidity', 'relative humidity', shares),
  quantity('mixing-ratio', 'mixing ratio', [unit('g/kg', 'g/kg'), unit('kg/kg', 'kg/kg')]),
  quantity('pressure', 'pressure', pressures),
  quantity('height', 'height', lengths),
  quantity('wind-speed', 'wind speed', speeds),
  quantity('wind-gust', 'gust', speeds),
  quantity('wind-direction', 'wind direction', directions),
  quantity('precipitation', 'precipitation', depths),
  quantity('global-radiation', 'global radiation', fluxes),
  quantity('net-radiation', 'net radiation', fluxes),
  quantity('longwave-radiation', 'longwave radiation', fluxes),
  quantity('radiant-exposure', 'radiant exposure', [unit('MJ/m2', 'MJ/m²'), unit('kW.h/m2', 'kWh/m²'), unit('W.h/m2', 'Wh/m²')]),
  quantity('visibility', 'visibility', [unit('m', 'm'), unit('km', 'km'), unit('[mi_i]', 'miles')]),
  quantity('latitude', 'latitude', [unit('deg', '°')]),
  quantity('longitude', 'longitude', [unit('deg', '°')]),
  quantity('elapsed-time', 'elapsed time', [unit('s', 's'), unit('min', 'min'), unit('h', 'h')]),
  quantity('voltage', 'voltage', [unit('V', 'V', 1), unit('mV', 'mV', 0.001)]),
  quantity('other', 'another reading', [unit('1', '1')]),
]

const byKey = new Map(measuredQuantities.map(entry => [entry.key, entry]))
export const findMeasuredQuantity = (key: string): MeasuredQuantity | undefined => byKey.get(key)
export const findMeasuredUnit = (key: string, ucum: string): MeasuredUnit | undefined => byKey.get(key)?.units.find(entry => entry.ucum === ucum)

/** The unit as people write it; a free unit of "another reading" stays as it was given. */
export const unitLabel = (quantityKey: string, ucum: string): string => findMeasuredUnit(quantityKey, ucum)?.label ?? ucum
