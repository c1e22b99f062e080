/** A value as it can be read off an axis: to half a division. */
export const toHalfDivision = (value: number, division: number): number => Math.round(value / (division / 2)) * (division / 2)
