import Papa from 'papaparse'
import { refuse } from '#shared/errors'
import { emailAddress, personName, sectionName, type RosterColumns } from '#shared/schemas/department'

export interface RosterLine { line: number, email: string, name: string, section: string | null }
export interface RefusedLine { line: number, text: string, reason: string }
export type Delimiter = ',' | ';' | '\t' | '|'

export interface ReadRoster {
  delimiter: Delimiter
  header: string[]
  /** What the columns are taken for: as the person said, or a guess from their names that the person confirms. */
  columns: RosterColumns
  isGuess: boolean
  /** The first lines as cells, so that the choice can be seen. */
  sample: string[][]
  rows: RosterLine[]
  refused: RefusedLine[]
  /** Lines with something on them, the header left out: rows and refused lines add up to it. */
  count: number
}

const delimiters: readonly Delimiter[] = [',', ';', '\t', '|']
const mostLines = 20_000

/** Names that a column's head may bear, without case, blanks and signs. */
const heads = {
  email: ['email', 'emailaddress', 'mail', 'universityemail', 'studentemail', 'primaryemail', 'loginid'],
  name: ['name', 'fullname', 'student', 'studentname', 'displayname', 'person'],
  given: ['firstname', 'givenname', 'first', 'given', 'forename', 'preferredname'],
  family: ['lastname', 'surname', 'familyname', 'last', 'family'],
  section: ['section', 'sectionname', 'sec', 'group', 'labsection', 'class'],
} as const

/**
 * Reads a roster: e-mail, name and, where there is such a column, section. Every line is taken or refused with its number and a reason.
 * Cells stay text: nothing is calculated, and an id keeps its zeros.
 * @throws {DomainError} `roster_unreadable` when no line can be a roster's
 */
export function readRoster(file: { text: string, delimiter: Delimiter | null, columns: RosterColumns | null }): ReadRoster {
  const text = file.text.replace(/^\uFEFF/, '')
  if (text.includes('\0')) refuse('roster_unreadable', { reason: 'The file is not text. Save the roster as CSV (UTF-8) and choose that file.' })
  if (text.trim() === '') refuse('roster_unreadable', { reason: 'The file is empty.' })
  const delimiter = file.delimiter ?? guessDelimiter(text)
  const [first, ...rest] = cellsOf(text, delimiter)
  const header = first?.cells.map(cell => cell.trim()) ?? []
  if (header.length < 2) refuse('roster_unreadable', { reason: 'The lines have one column only. Choose another delimiter.' })
  if (rest.length === 0) refuse('roster_unreadable', { reason: 'There is a line of column names and nobody below it.' })
  if (rest.length > mostLines) refuse('roster_unreadable', { reason: `The file has more than ${mostLines} lines.` })
  const columns = file.columns ?? guessColumns(header)
  if (!columns) refuse('roster_unreadable', { reason: `No column is named like an e-mail and a name. The columns are: ${header.join(', ')}.` })
  if ([columns.email, columns.section ?? 0, ...columns.name].some(at => at >= header.length)) refuse('invalid', {}, [{ path: 'columns', message: 'The file has fewer columns.' }])
  const read = { delimiter, header, columns, isGuess: file.columns === null, sample: rest.slice(0, 3).map(row => row.cells), rows: [] as RosterLine[], refused: [] as RefusedLine[], count: rest.length }
  const lineOf = new Map<string, number>()
  for (const row of rest) {
    const taken = readLine(row, columns, header.length)
    if ('reason' in taken) {
      read.refused.push(taken)
      continue
    }
    const before = lineOf.get(taken.email)
    if (before !== undefined) {
      read.refused.push({ line: taken.line, text: row.cells.join(delimiter), reason: `${taken.email} is on line ${before} already.` })
      continue
    }
    lineOf.set(taken.email, taken.line)
    read.rows.push(taken)
  }
  return read
}

interface Cells { line: number, cells: string[] }

function readLine({ line, cells }: Cells, columns: RosterColumns, width: number): RosterLine | RefusedLine {
  const refused = (reason: string): RefusedLine => ({ line, text: cells.join(' | ').slice(0, 300), reason })
  if (cells.length !== width) return refused(`${cells.length} cells where the head has ${width}.`)
  const email = emailAddress.safeParse(cells[columns.email] ?? '')
  if (!email.success) return refused((cells[columns.email] ?? '').trim() === '' ? 'No e-mail.' : 'The e-mail is not an address.')
  const name = personName.safeParse(columns.name.map(at => cells[at] ?? '').join(' ').replace(/\s+/g, ' '))
  if (!name.success) return refused('No name.')
  // A spreadsheet would run such a cell when the roster is opened there again; no name begins so.
  if (/^[=+@]/.test(name.data)) return refused(`The name begins with "${name.data[0]}", as a formula does.`)
  const sectionCell = columns.section === null ? '' : (cells[columns.section] ?? '').trim()
  if (columns.section === null || sectionCell === '') return { line, email: email.data, name: name.data, section: null }
  const section = sectionName.safeParse(sectionCell)
  if (!section.success || /^[=+@]/.test(sectionCell)) return refused('The section is not a name.')
  return { line, email: email.data, name: name.data, section: section.data }
}

/** Rows of cells with the number of the line on which each starts; blank lines are passed over. */
function cellsOf(text: string, delimiter: Delimiter): Cells[] {
  const rows: Cells[] = []
  let start = 0
  let line = 1
  Papa.parse<string[]>(text, {
    delimiter, skipEmptyLines: false,
    step: ({ data, meta }) => {
      if (data.some(cell => cell.trim() !== '')) rows.push({ line, cells: data })
      line += text.slice(start, meta.cursor).split(/\r\n|\n|\r/).length - 1
      start = meta.cursor
    },
  })
  return rows
}

/** The delimiter that makes a head in which e-mail and name are found, else the one with the most columns. */
function guessDelimiter(text: string): Delimiter {
  const head = text.slice(0, 4000)
  const tried = delimiters.map((delimiter) => {
    const cells = Papa.parse<string[]>(head, { delimiter, preview: 1 }).data[0] ?? []
    return { delimiter, width: cells.length, isFound: guessColumns(cells) !== null }
  })
  tried.sort((a, b) => Number(b.isFound) - Number(a.isFound) || b.width - a.width)
  return tried[0]?.delimiter ?? ','
}

function guessColumns(header: readonly string[]): RosterColumns | null {
  const plain = header.map(cell => cell.toLowerCase().normalize('NFKD').replace(/[^a-z]/g, ''))
  const find = (names: readonly string[]) => plain.findIndex(cell => names.includes(cell))
  const [email, name, given, family, section] = [find(heads.email), find(heads.name), find(heads.given), find(heads.family), find(heads.section)]
  const names = given >= 0 && family >= 0 ? [given, family] : name >= 0 ? [name] : family >= 0 ? [family] : []
  if (email < 0 || names.length === 0) return null
  return { email, name: names, section: section < 0 ? null : section }
}
