/**
 * What a column can be: the quantities that a station or a flight measures, each with the units that files use.
 * Values stay in the file's own unit; `factor` and `offset` lead to the canonical one (canonical = value × factor + offset),
 * exact by definition of the units unless said otherwise.
 */
export interface MeasuredUnit { ucum: string, label: string, factor: number, offset: number }
export interface MeasuredQuantity {
  key: string
  label: string
  /** UCUM code of the unit in which limits are written. */
  canonical: string
  units: readonly MeasuredUnit[]
}

const unit = (ucum: string, label: string, factor = 1, offset = 0): MeasuredUnit => ({ ucum, label, factor, offset })

const temperatures = [unit('Cel', '°C'), unit('K', 'K', 1, -273.15), unit('[degF]', '°F', 5 / 9, -160 / 9)]
const pressures = [unit('hPa', 'hPa'), unit('mbar', 'mbar'), unit('kPa', 'kPa', 10), unit('Pa', 'Pa', 0.01), unit('[in_i\'Hg]', 'inHg', 33.863886666667), unit('mm[Hg]', 'mmHg', 1.33322387415)]
const lengths = [unit('m', 'm'), unit('km', 'km', 1000), unit('[ft_i]', 'ft', 0.3048)]
const speeds = [unit('m/s', 'm/s'), unit('km/h', 'km/h', 1 / 3.6), unit('[kn_i]', 'kn', 1852 / 3600), unit('[mi_i]/h', 'mph', 0.44704)]
const depths = [unit('mm', 'mm'), unit('cm', 'cm', 10), unit('[in_i]', 'in', 25.4)]
const directions = [unit('deg', '°'), unit('10.deg', 'tens of °', 10), unit('45.deg/2', 'sixteenths of the rose', 22.5)]
const fluxes = [unit('W/m2', 'W/m²'), unit('kW/m2', 'kW/m²', 1000)]
const shares = [unit('%', '%'), unit('1', '1', 100)]

const quantity = (key: string, label: string, units: readonly MeasuredUnit[]): MeasuredQuantity => ({ key, label, canonical: units[0]!.ucum, units })

export const measuredQuantities: readonly MeasuredQuantity[] = [
  quantity('air-temperature', 'air temperature', temperatures),
  quantity('dewpoint', 'dewpoint', temperatures),
  quantity('wet-bulb-temperature', 'wet-bulb temperature', temperatures),
  quantity('surface-temperature', 'surface temperature', temperatures),
  quantity('soil-temperature', 'soil temperature', temperatures),
  quantity('relative-humidity', 'relative humidity', shares),
  quantity('mixing-ratio', 'mixing ratio', [unit('g/kg', 'g/kg'), unit('kg/kg', 'kg/kg', 1000)]),
  quantity('pressure', 'pressure', pressures),
  quantity('height', 'height', lengths),
  quantity('wind-speed', 'wind speed', speeds),
  quantity('wind-gust', 'gust', speeds),
  quantity('wind-direction', 'wind direction', directions),
  quantity('precipitation', 'precipitation', depths),
  quantity('global-radiation', 'global radiation', fluxes),
  quantity('net-radiation', 'net radiation', fluxes),
  quantity('longwave-radiation', 'longwave radiation', fluxes),
  quantity('radiant-exposure', 'radiant exposure', [unit('MJ/m2', 'MJ/m²'), unit('kW.h/m2', 'kWh/m²', 3.6), unit('W.h/m2', 'Wh/m²', 0.0036)]),
  quantity('visibility', 'visibility', [unit('m', 'm'), unit('km', 'km', 1000), unit('[mi_i]', 'miles', 1609.344)]),
  quantity('latitude', 'latitude', [unit('deg', '°')]),
  quantity('longitude', 'longitude', [unit('deg', '°')]),
  quantity('elapsed-time', 'elapsed time', [unit('s', 's'), unit('min', 'min', 60), unit('h', 'h', 3600)]),
  quantity('voltage', 'voltage', [unit('V', 'V'), unit('mV', 'mV', 0.001)]),
  quantity('other', 'another reading', [unit('1', '1')]),
]

const byKey = new Map(measuredQuantities.map(entry => [entry.key, entry]))
export const findMeasuredQuantity = (key: string): MeasuredQuantity | undefined => byKey.get(key)
export const findMeasuredUnit = (key: string, ucum: string): MeasuredUnit | undefined => byKey.get(key)?.units.find(entry => entry.ucum === ucum)

/** The unit as people write it; a free unit of "another reading" stays as it was given. */
export const unitLabel = (quantityKey: string, ucum: string): string => findMeasuredUnit(quantityKey, ucum)?.label ?? ucum
