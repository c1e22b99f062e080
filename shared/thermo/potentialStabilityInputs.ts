import type { InputDefinition } from './definition'

const temperature = (name: string, label: string, symbol: string): InputDefinition => ({ name, label, symbol, unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range: [200, 330] })
const pressure = (name: string, label: string, symbol: string): InputDefinition => ({ name, label, symbol, unit: 'Pa', shownUnit: 'hPa', kind: 'ratio', shape: 'number', range: [10_000, 110_000] })

/** Both ends of a layer, with its depth. */
export const potentialStabilityInputs: readonly InputDefinition[] = [
  pressure('pressureBottom', 'pressure at the bottom', 'p_1'), temperature('temperatureBottom', 'temperature at the bottom', 'T_1'), temperature('dewpointBottom', 'dewpoint at the bottom', 'T_d1'),
  pressure('pressureTop', 'pressure at the top', 'p_2'), temperature('temperatureTop', 'temperature at the top', 'T_2'), temperature('dewpointTop', 'dewpoint at the top', 'T_d2'),
  { name: 'depth', label: 'depth of the layer', symbol: 'Δz', unit: 'm', shownUnit: 'm', kind: 'difference', shape: 'number', range: [1, 20_000], trivialWithin: 0 },
]
