/** What a spreadsheet or a notebook leaves in a cell in place of a value, named as what it is. */
const sheetErrors: Readonly<Record<string, string>> = {
  'DIV/0!': 'a division by zero', 'N/A': 'a value that was not found', 'NAME?': 'a name that it does not know', 'NULL!': 'ranges that do not meet', 'NUM!': 'a number that cannot be computed',
  'REF!': 'a cell that is gone', 'VALUE!': 'a text where a number is needed', 'SPILL!': 'a result that has no room', 'CALC!': 'a formula that cannot be computed', 'WERT!': 'a text where a number is needed',
}
const months = '(?:jan|feb|mar|apr|may|mai|jun|jul|aug|sep|sept|oct|okt|nov|dec|dez)[a-z]*\\.?'
const dates = [
  new RegExp(`^\\d{1,4}[-/. ]${months}(?:[-/. ]\\d{1,4})?$`, 'i'),
  new RegExp(`^${months}[-/. ]\\d{1,4}(?:,? \\d{4})?$`, 'i'),
  /^\d{4}-\d{1,2}-\d{1,2}(?:[T ].*)?$/,
  /^\d{1,2}[/.]\d{1,2}[/.]\d{2,4}$/,
  /^\d{1,2}:\d{2}(?::\d{2})?$/,
]

/** A sentence that names it; null for anything else. */
export function nameNotAValue(text: string): string | null {
  const error = /^#([A-Z0-9/]+[!?]?)$/i.exec(text)
  if (error) {
    const why = sheetErrors[(error[1] ?? '').toUpperCase()]
    return `${text} is a spreadsheet’s error${why ? ` (${why})` : ''}, not a value.`
  }
  if (/^#+$/.test(text)) return `${text.slice(0, 8)} is a column too narrow to show its value.`
  if (dates.some(pattern => pattern.test(text))) return `${text} is a date or a time: a spreadsheet has turned your value into it.`
  if (/^[+-]?(?:nan|nat|na|null|undefined\(\)|missing)$/i.test(text)) return `${text} is the mark of a missing number, not a value.`
  if (/^[+-]?(?:inf|infinity|∞)$/i.test(text)) return `${text} is not a number: look for a division by zero.`
  if (/^[+-]?0x/i.test(text)) return `${text} is a number to base 16: type it as a decimal.`
  if (/^(?:true|false)$/i.test(text)) return `${text} is an answer to a question, not a value.`
  if (/^=/.test(text) && /[A-Z]{1,3}\$?\d|\(/.test(text)) return 'This is a formula, not its result: type the result.'
  return null
}
