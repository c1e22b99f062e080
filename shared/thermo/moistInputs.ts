/** The inputs of moist air, so that they are named, ranged and labeled alike everywhere. */
import type { InputDefinition } from './definition'

export const pressureInput: InputDefinition = { name: 'pressure', label: 'pressure', symbol: 'p', unit: 'Pa', shownUnit: 'hPa', kind: 'ratio', shape: 'number', range: [500, 120_000] }
export const temperatureInput: InputDefinition = { name: 'temperature', label: 'air temperature', symbol: 'T', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range: [180, 340] }
export const dewpointInput: InputDefinition = { name: 'dewpoint', label: 'dewpoint', symbol: 'T_d', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range: [160, 340] }
/** Up to where a sensor in fog goes; none of zero, which has no dewpoint. */
export const relativeHumidityInput: InputDefinition = { name: 'relativeHumidity', label: 'relative humidity over liquid water, e/es', symbol: 'RH', unit: '1', shownUnit: '%', kind: 'fraction', shape: 'number', range: [0.001, 1.5] }
export const mixingRatioInput: InputDefinition = { name: 'mixingRatio', label: 'mixing ratio', symbol: 'w', unit: '1', shownUnit: 'g/kg', kind: 'ratio', shape: 'number', range: [0.000001, 0.2] }
export const vaporPressureInput: InputDefinition = { name: 'vaporPressure', label: 'vapor pressure', symbol: 'e', unit: 'Pa', shownUnit: 'hPa', kind: 'ratio', shape: 'number', range: [0.01, 30_000] }
export const wetBulbInput: InputDefinition = { name: 'wetBulb', label: 'wet-bulb temperature', symbol: 'T_w', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range: [220, 330] }
/** The air temperature beside a dewpoint: enters no value, but the slip of reading at T what belongs to T_d. */
export const temperatureForSlips: InputDefinition = { ...temperatureInput, label: 'air temperature, to know the slip of taking it for the dewpoint', isOptional: true, isForSlips: true }
