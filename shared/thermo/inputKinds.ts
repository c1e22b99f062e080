/** Inputs that many quantities have, with the units in which people meet them and their physical range. */
import type { InputDefinition } from './definition'

type Range = readonly [number, number]

export const temperatureInput = (name = 'temperature', label = 'air temperature', symbol = 'T', range: Range = [150, 400]): InputDefinition =>
  ({ name, label, symbol, unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range })

export const pressureInput = (name = 'pressure', label = 'pressure', symbol = 'p', range: Range = [1000, 120_000]): InputDefinition =>
  ({ name, label, symbol, unit: 'Pa', shownUnit: 'hPa', kind: 'ratio', shape: 'number', range })

export const lengthInput = (name: string, label: string, symbol: string, range: Range): InputDefinition =>
  ({ name, label, symbol, unit: 'm', shownUnit: 'm', kind: 'difference', shape: 'number', range })

export const specificVolumeInput = (name = 'specificVolume', label = 'specific volume', symbol = 'α'): InputDefinition =>
  ({ name, label, symbol, unit: 'm3/kg', shownUnit: 'm3/kg', kind: 'ratio', shape: 'number', range: [0.05, 1000] })

export const specificEnergyInput = (name: string, label: string, symbol: string): InputDefinition =>
  ({ name, label, symbol, unit: 'J/kg', shownUnit: 'kJ/kg', kind: 'difference', shape: 'number', range: [-1_000_000, 1_000_000] })

/** A difference of temperatures, the same number in K and in °C. */
export const temperatureChangeInput = (name = 'temperatureChange', label = 'change of temperature', symbol = 'ΔT'): InputDefinition =>
  ({ name, label, symbol, unit: 'K', shownUnit: 'K', kind: 'difference', shape: 'number', range: [-200, 200] })

export const timeInput = (name: string, label: string, symbol: string, range: Range): InputDefinition =>
  ({ name, label, symbol, unit: 's', shownUnit: 'h', kind: 'difference', shape: 'number', range })
