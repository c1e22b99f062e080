/** What a pasted sheet looks like before it is sent: its first rows, and a guess at what each column holds. */
export interface PastedColumn { holds: string, unit: string }
export interface AskedInput { name: string, label: string, symbol: string, shownUnit: string }

/** Cells of the first lines; a tab parts them where there is one, else a semicolon, else a comma that is followed by a space or a letter. */
export function firstCells(pasted: string, lines = 5): string[][] {
  const rows = pasted.split(/\r\n?|\n/).filter(line => line.trim() !== '').slice(0, lines)
  const parting = rows.some(row => row.includes('\t')) ? '\t' : rows.some(row => row.includes(';')) ? ';' : ','
  return rows.map(row => row.split(parting).map(cell => cell.trim().replace(/^"(.*)"$/, '$1')))
}

/** By the head's words where there is a head, else from the left: the inputs in their order, then the key. */
export function guessColumns(cells: readonly (readonly string[])[], inputs: readonly AskedInput[], unit: string): PastedColumn[] {
  const width = Math.max(0, ...cells.map(row => row.length))
  const head = cells[0] ?? []
  const hasHead = head.length > 0 && head.every(cell => !/^[-−+]?[\d.,]+(?:e[-+]?\d+)?$/i.test(cell))
  const free = new Set(inputs.map(input => input.name))
  const columns = Array.from({ length: width }, (_, at): PastedColumn => {
    const word = (head[at] ?? '').toLowerCase()
    const named = !hasHead ? undefined : inputs.find(input => free.has(input.name) && (word.includes(input.name.toLowerCase()) || input.label.toLowerCase().split(' ').some(part => part.length > 3 && word.includes(part)) || word.split(/[^\p{L}]/u)[0] === input.symbol.toLowerCase()))
    if (!named) return { holds: '', unit: '' }
    free.delete(named.name)
    return { holds: named.name, unit: named.shownUnit }
  })
  if (!hasHead) {
    for (const [at, input] of inputs.entries()) if (at < width - 1) columns[at] = { holds: input.name, unit: input.shownUnit }
  }
  const last = columns.findLastIndex(column => column.holds === '')
  if (last !== -1) columns[last] = { holds: 'key', unit }
  return columns
}
