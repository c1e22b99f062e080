/** A piece of a line: raised where it is an exponent, lowered where it is an index. No text face here carries U+207B, so both are set, never typed. */
export interface TextPart { text: string, set: 'line' | 'raised' | 'lowered' }

const raisedDigits: Record<string, string> = { '⁻': '−', '⁺': '+', '⁰': '0', '¹': '1', '²': '2', '³': '3', '⁴': '4', '⁵': '5', '⁶': '6', '⁷': '7', '⁸': '8', '⁹': '9' }
/** Exponents however they were written; and the index of a symbol of one or two letters (T_d, Ri_B, u_*), but no underscore of a name (flight_a). */
const setApart = /[⁻⁺⁰¹²³⁴-⁹]+|\^[-−+]?\d+|(?<=(?<![\p{L}\p{N}_])\p{L}{1,2})_(?:[\p{L}\p{N}]{1,4}|\*)(?![\p{L}\p{N}_])/gu

/** Cuts a line into its pieces: "K km⁻¹" and "K km^-1" give "K km" and, raised, "−1"; "T_d" gives "T" and, lowered, "d". */
export function textParts(line: string): TextPart[] {
  const parts: TextPart[] = []
  let from = 0
  for (const found of line.matchAll(setApart)) {
    if (found.index > from) parts.push({ text: line.slice(from, found.index), set: 'line' })
    parts.push(pieceOf(found[0]))
    from = found.index + found[0].length
  }
  if (from < line.length) parts.push({ text: line.slice(from), set: 'line' })
  return parts
}

function pieceOf(found: string): TextPart {
  if (found.startsWith('_')) return { text: found.slice(1), set: 'lowered' }
  return { text: found.startsWith('^') ? found.slice(1).replace('-', '−') : [...found].map(sign => raisedDigits[sign] ?? sign).join(''), set: 'raised' }
}

const ucumNames: Record<string, string> = { 'Cel': '°C', '[degF]': '°F', 'deg': '°', '[kn_i]': 'kn', '[ft_i]': 'ft', '[in_i]': 'in', '[in_i\'Hg]': 'inHg', '1': '', 'm[H2O]': 'mH2O', 'um': 'µm', 'us': 'µs' }

/**
 * A unit as it is written in the field, from UCUM: "K/km" → "K km^-1", "Cel" → "°C", "m2.s-2" → "m^2 s^-2".
 * What is already written that way ("K km^-1", "°C") stays. Pieces are joined by U+202F.
 */
export function unitText(unit: string): string {
  const named = ucumNames[unit]
  if (named !== undefined) return named
  if (/[\^⁻ \u202f°]/.test(unit)) return unit.replaceAll(' ', '\u202f')
  const pieces: string[] = []
  const outer = [1] // what a bracket stands under
  let sign = 1
  for (const token of unit.match(/\[[^\]]*\]|[./()]|[^./()[\]]+(?:\[[^\]]*\])?/g) ?? []) {
    if (token === '(') outer.push(outer[outer.length - 1]! * sign)
    else if (token === ')') outer.pop()
    if (token === '/' || token === '.' || token === '(' || token === ')') {
      sign = token === '/' ? -1 : 1
      continue
    }
    const read = /^(.*?)([-+]?\d+)?$/.exec(token)
    const symbol = read?.[1] || token
    const power = Number(read?.[1] ? read[2] ?? 1 : 1) * sign * outer[outer.length - 1]!
    const name = ucumNames[symbol] ?? symbol
    if (name !== '') pieces.push(power === 1 ? name : `${name}^${power}`)
  }
  return pieces.join('\u202f')
}

/** A number with the true minus and, from five digits on, groups of three: −9.6, 12 480. */
export function numberText(value: number, digits: number): string {
  const [whole = '', decimals] = Math.abs(value).toFixed(digits).split('.')
  const grouped = whole.length >= 5 ? whole.replace(/\B(?=(\d{3})+$)/g, '\u202f') : whole
  const text = decimals === undefined ? grouped : `${grouped}.${decimals}`
  return value < 0 && /[1-9]/.test(text) ? `−${text}` : text
}

/** Marks of one column with as many decimals as the finest of them needs, so that they stand under each other. */
export function alignedMarks(all: readonly (number | null)[]): (pointsMilli: number) => string {
  const decimals = Math.max(0, ...all.map(points => points === null ? 0 : marksText(points).split('.')[1]?.length ?? 0))
  return points => (points / 1000).toFixed(decimals).replace('-', '−')
}

/** Marks are integer thousandths: 2500 → "2.5", 3000 → "3". */
export function marksText(pointsMilli: number): string {
  return (pointsMilli / 1000).toFixed(3).replace(/\.?0+$/, '').replace('-', '−')
}
