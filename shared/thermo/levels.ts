import type { InputDefinition } from './definition'

/** Levels of a layer from the bottom upwards: an integration needs their order. */
export const levelInputs: readonly InputDefinition[] = [
  { name: 'pressure', label: 'pressures of the levels, from the bottom upwards', symbol: 'p', unit: 'Pa', shownUnit: 'hPa', kind: 'ratio', shape: 'series', range: [100, 120_000], needs: { least: 2, order: 'descending' } },
  { name: 'temperature', label: 'temperatures of the levels', symbol: 'T', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'series', range: [150, 350], needs: { least: 2 } },
]
