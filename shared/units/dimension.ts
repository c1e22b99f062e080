/** Exponents of length, mass, time, temperature and amount. Angles count as 1. */
export type Dimension = readonly [length: number, mass: number, time: number, temperature: number, amount: number]

export const none: Dimension = [0, 0, 0, 0, 0]

export function combine(a: Dimension, b: Dimension, times = 1): Dimension {
  return [a[0] + times * b[0], a[1] + times * b[1], a[2] + times * b[2], a[3] + times * b[3], a[4] + times * b[4]]
}

export const isSame = (a: Dimension, b: Dimension): boolean => a.every((exponent, at) => exponent === b[at])

const named: readonly [Dimension, string][] = [
  [[0, 0, 0, 0, 0], 'a plain number'],
  [[1, 0, 0, 0, 0], 'a length'],
  [[2, 0, 0, 0, 0], 'an area'],
  [[3, 0, 0, 0, 0], 'a volume'],
  [[0, 1, 0, 0, 0], 'a mass'],
  [[0, 0, 1, 0, 0], 'a time'],
  [[0, 0, 0, 1, 0], 'a temperature'],
  [[0, 0, 0, 0, 1], 'an amount of substance'],
  [[-1, 0, 0, 1, 0], 'a temperature per length'],
  [[1, 0, 0, -1, 0], 'a length per temperature'],
  [[0, 0, -1, 1, 0], 'a temperature per time'],
  [[1, 0, -1, 0, 0], 'a speed'],
  [[1, 0, -2, 0, 0], 'an acceleration'],
  [[2, 0, -2, 0, 0], 'an energy per mass'],
  [[2, 1, -2, 0, 0], 'an energy'],
  [[2, 1, -3, 0, 0], 'a power'],
  [[0, 1, -3, 0, 0], 'a power per area'],
  [[2, 0, -3, 0, 0], 'a power per mass'],
  [[-1, 1, -3, 0, 0], 'a pressure per time'],
  [[-1, 1, -2, 0, 0], 'a pressure'],
  [[1, 1, -2, 0, 0], 'a force'],
  [[-3, 1, 0, 0, 0], 'a density'],
  [[3, -1, 0, 0, 0], 'a volume per mass'],
  [[-2, 1, 0, 0, 0], 'a mass per area'],
  [[2, 0, -2, -1, 0], 'an energy per mass and temperature'],
  [[2, 1, -2, -1, 0], 'an energy per temperature'],
  [[0, 0, -1, 0, 0], 'a frequency'],
  [[0, 0, -2, 0, 0], 'a frequency squared'],
  [[-2, 1, -2, 0, 0], 'a pressure per length'],
]

/** The kind of a quantity in words: "a temperature per length". */
export function describeDimension(dimension: Dimension): string {
  const known = named.find(([one]) => isSame(one, dimension))
  if (known) return known[1]
  const symbols = ['m', 'kg', 's', 'K', 'mol']
  return `a quantity in ${dimension.map((exponent, at) => (exponent === 0 ? '' : exponent === 1 ? symbols[at] : `${symbols[at]}^${exponent}`)).filter(Boolean).join(' ')}`
}
