/** Begins a formula in some spreadsheet; a negative or signed number does not. */
const formula = /^(?:[=@\t\r\n\0]|[+-](?![\d.]))/

/**
 * One line of CSV (RFC 4180). A text that a spreadsheet would take for a formula gets an apostrophe in front;
 * numbers stay numbers, negative ones too.
 */
export function csvLine(cells: readonly (string | number)[]): string {
  return `${cells.map(csvCell).join(',')}\r\n`
}

function csvCell(cell: string | number): string {
  if (typeof cell === 'number') return String(cell)
  // What looks like a signed number but goes on as something else (`-1+cmd|…`) is a formula as well.
  const isFormula = formula.test(cell) || (/^[+-]/.test(cell) && !/^[+-]?[\d.,]+(?:[eE][+-]?\d+)?$/.test(cell))
  const safe = isFormula ? `'${cell}` : cell
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe
}
