/** A stored value with the digits that its column serves; empty where it is missing. Zero has no sign. */
export function shownNumber(value: number, decimals: number): string {
  if (Number.isNaN(value)) return ''
  const text = value.toFixed(decimals)
  return /^-0(?:\.0*)?$/.test(text) ? text.slice(1) : text
}
