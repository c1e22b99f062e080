/**
 * Quantities that give one another away: worked on the rows of a layer, each prints or nearly is the others. Where a lab asks a student for one,
 * the calculator holds them all back.
 */
const families: readonly ((key: string) => boolean)[] = [
  key => key.includes('lapse-rate-') && !key.startsWith('dry-adiabatic') || key === 'fitted-temperature-at-zero-height',
  key => key.startsWith('hypsometric-'),
  key => key.startsWith('mixed-layer-depth-'),
  key => key.startsWith('inversion-'),
]

export const givesAway = (key: string, held: string): boolean => key === held || families.some(isOf => isOf(key) && isOf(held))
