/** What keyboards, spreadsheets, notebooks and copied papers put in place of plain characters, made plain. */
const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹'

export function plainText(typed: string): string {
  return typed
    .replace(/[\u200B-\u200F\u2060\uFEFF]/g, '')
    .replace(/[\u00A0\u1680\u2000-\u200A\u202F\u205F\u3000\t\r\n]/g, ' ')
    .replace(/[\uFF01-\uFF5E]/g, wide => String.fromCharCode(wide.charCodeAt(0) - 0xFEE0))
    .replace(/[⁺⁻]?[⁰¹²³⁴⁵⁶⁷⁸⁹]+/g, raised => `^${[...raised].map(one => (one === '⁻' ? '-' : one === '⁺' ? '+' : String(superscripts.indexOf(one)))).join('')}`)
    .replace(/[\u2212\u2010-\u2015\uFE63\u2796]/g, '-')
    .replace(/[×✕✖⨯]/g, '×')
    .replace(/[⋅∙•‧・]/g, '·')
    .replace(/[÷⁄∕]/g, '/')
    .replace(/[º˚]/g, '°')
    .replace(/℃/g, '°C').replace(/℉/g, '°F').replace(/\u212A/g, 'K')
    .replace(/[μ]/g, 'u').replace(/µ/g, 'u')
    .replace(/[’‘ʼ′]/g, '\'')
    .trim()
}
