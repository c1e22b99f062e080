import { gzipSync } from 'node:zlib'
import type { RefusalCode } from '../../shared/errors'
import type { Recipe } from '../../shared/schemas/data'

/**
 * Broken and hostile files, each as a generator with its exact verdict. Large ones are made as they are read; nothing big lies here.
 *
 *   refused at upload   the code and facts; afterwards there is no file, no row, no chunk
 *   refused at import   as above, but the upload itself stays, so that another recipe can be tried
 *   taken               how many rows are taken and refused, and the reasons in order
 */
export type Verdict =
  | { at: 'upload', code: RefusalCode, facts?: Readonly<Record<string, unknown>> }
  | { at: 'import', code: RefusalCode, facts?: Readonly<Record<string, unknown>> }
  | { at: 'taken', taken: number, refused: number, reasons?: readonly string[], values?: readonly (readonly number[])[], times?: readonly string[], name?: string }

export interface BadFile {
  what: string
  name?: string
  bytes: () => AsyncIterable<Uint8Array> | Iterable<Uint8Array>
  /** What a person says instead of the guess. */
  said?: (recipe: Recipe) => Recipe
  verdict: Verdict
}

const head = 'time,temp,rh\n'
const row = (minute: number, temp: number | string = 10 + minute / 10, rh: number | string = 60) => `2026-03-01 00:${String(minute).padStart(2, '0')}:00,${temp},${rh}\n`
const good = (rows = 5) => head + Array.from({ length: rows }, (_, n) => row(n)).join('')
const text = (content: string | Buffer) => () => [Buffer.from(content)]
const utf16le = (content: string) => Buffer.concat([Buffer.from([0xFF, 0xFE]), Buffer.from(content, 'utf16le')])
const utf16be = (content: string) => Buffer.concat([Buffer.from([0xFE, 0xFF]), Buffer.from(content, 'utf16le').swap16()])
async function* repeated(part: Buffer, times: number): AsyncGenerator<Uint8Array> {
  for (let n = 0; n < times; n += 1) yield part
}
const five = { at: 'taken', taken: 5, refused: 0 } as const
const station = (recipe: Recipe): Recipe => ({ ...recipe, kind: 'station', stampMeans: 'instant', intervalS: null })
const withTime = (time: Recipe['time'], more: Partial<Recipe> = {}) => (recipe: Recipe): Recipe => ({ ...station(recipe), time, ...more })
const temperature: Recipe['columns'][number] = { name: 'temp', at: 1, role: 'value', title: 'temp', quantity: 'air-temperature', unit: 'Cel', decimals: null, missingCodes: ['NA'], heightM: null }
const firstColumn = (form: 'dmy' | 'mdy' | 'ymd') => withTime({ form: 'stamp', column: { name: 'time', at: 0 }, dateOrder: form })

const sizes: BadFile[] = [
  { what: 'an empty file', bytes: text(''), verdict: { at: 'upload', code: 'file_empty' } },
  { what: 'blank lines alone', bytes: text('\n\n   \n\r\n'), verdict: { at: 'upload', code: 'file_empty' } },
  { what: 'a head alone', bytes: text(head), verdict: { at: 'upload', code: 'file_header_only' } },
  { what: 'a head without line end', bytes: text('time,temp,rh'), verdict: { at: 'upload', code: 'file_header_only' } },
  { what: 'a head and a row of units, no readings', bytes: text('time,temp,rh\nUTC,deg C,%\n'), verdict: { at: 'upload', code: 'file_header_only' } },
  { what: 'one row', bytes: text(good(1)), verdict: { at: 'taken', taken: 1, refused: 0 } },
  { what: 'no line end after the last row', bytes: text(good().trimEnd()), verdict: five },
  { what: 'the last row cut in the middle', bytes: text(good() + '2026-03-01 00:05:00,10.'), verdict: { at: 'upload', code: 'file_cut', facts: { line: 7 } } },
  { what: 'one line of 100 MB', bytes: () => repeated(Buffer.alloc(65_536, '12.3'), 1600), verdict: { at: 'upload', code: 'file_line_too_long', facts: { line: 1 } } },
  { what: 'one line of 100 MB, full of commas', bytes: () => repeated(Buffer.alloc(65_536, '12.3,'), 1600), verdict: { at: 'upload', code: 'file_line_too_long', facts: { line: 1 } } },
  { what: 'a good start, then a line of 2 MB', bytes: text(good(3000) + '7'.repeat(2_000_000) + '\n'), verdict: { at: 'upload', code: 'file_line_too_long', facts: { line: 3002 } } },
  { what: '100,000 columns', bytes: text(Array.from({ length: 100_000 }, (_, n) => `c${n}`).join(',') + '\n'), verdict: { at: 'upload', code: 'file_too_many_columns', facts: { line: 1, limit: 5000 } } },
  { what: '1,000 columns', bytes: text(`time,${Array.from({ length: 999 }, (_, n) => `c${n}`).join(',')}\n2026-03-01 00:00:00,${Array.from({ length: 999 }, (_, n) => n).join(',')}\n`), said: recipe => ({ ...station(recipe), columns: [{ name: 'c998', at: 999, role: 'value', title: 'last', quantity: 'other', unit: '1', decimals: null, missingCodes: [], heightM: null }] }), verdict: { at: 'taken', taken: 1, refused: 0, values: [[998]] } },
]

const binary: BadFile[] = [
  { what: 'NUL bytes in a cell', bytes: text('time,temp,rh\n2026-03-01 00:00:00,1\0,60\n'), verdict: { at: 'upload', code: 'file_binary', facts: { line: 2 } } },
  { what: 'a block of NUL bytes far down, as a logger leaves at a power cut', bytes: text(Buffer.concat([Buffer.from(good(20_000)), Buffer.alloc(4096), Buffer.from(row(1))])), verdict: { at: 'upload', code: 'file_binary', facts: { line: 20_002 } } },
  { what: 'a picture', name: 'mast.csv', bytes: text(Buffer.from([0x89, 0x50, 0x4E, 0x47, 0x0D, 0x0A, 0x1A, 0x0A, 0, 0, 0, 13])), verdict: { at: 'upload', code: 'file_binary' } },
  { what: 'a workbook under the name of a table', name: 'record.csv', bytes: text(Buffer.concat([Buffer.from('PK\x03\x04'), Buffer.alloc(200, 7)])), verdict: { at: 'upload', code: 'file_binary', facts: { line: 1 } } },
  { what: 'control codes of a terminal in a cell', bytes: text('time,temp,rh\n2026-03-01 00:00:00,\x1B[31m9.9\x1B[0m,60\n'), verdict: { at: 'upload', code: 'file_binary', facts: { line: 2 } } },
  { what: 'UTF-16 with a byte order mark', bytes: text(utf16le(good())), verdict: five },
  { what: 'UTF-16, big end first', bytes: text(utf16be(good())), verdict: five },
  { what: 'UTF-16 without a byte order mark', bytes: text(Buffer.from(good(), 'utf16le')), verdict: { at: 'upload', code: 'file_binary', facts: { line: 1 } } },
  { what: 'a byte order mark', bytes: text(`\uFEFF${good()}`), verdict: five },
  { what: 'Latin-1 in the head', bytes: text(Buffer.from('time;T [°C];RH [%]\n2026-03-01 00:00:00;1,5;60\n', 'latin1')), said: station, verdict: { at: 'taken', taken: 1, refused: 0, values: [[1.5, 60]], name: 'T [°C]' } },
  { what: 'bytes that no encoding has, in a cell that is not taken', bytes: text(Buffer.concat([Buffer.from('time,temp,note\n2026-03-01 00:00:00,1.5,'), Buffer.from([0xC3, 0x28, 0xFF]), Buffer.from('\n')])), verdict: { at: 'taken', taken: 1, refused: 0 } },
]

const packed: BadFile[] = [
  { what: 'a packed file', name: 'record.csv.gz', bytes: text(gzipSync(good())), verdict: five },
  { what: 'a packed file without the ending', name: 'record.csv', bytes: text(gzipSync(good())), verdict: five },
  { what: 'text under a packed name', name: 'record.csv.gz', bytes: text(good()), verdict: five },
  { what: 'binary under a packed name', name: 'record.csv.gz', bytes: text(Buffer.alloc(500, 1)), verdict: { at: 'upload', code: 'file_binary' } },
  { what: 'a packed file, cut', name: 'record.csv.gz', bytes: () => [gzipSync(good(5000)).subarray(0, 9000)], verdict: { at: 'upload', code: 'file_cut' } },
  { what: 'a packed file, damaged', name: 'record.csv.gz', bytes: () => {
    const bytes = gzipSync(good(5000))
    bytes.fill(0x55, 600, 700)
    return [bytes]
  }, verdict: { at: 'upload', code: 'file_not_gzip' } },
  { what: 'a small file that unpacks to more than the cap', name: 'bomb.csv.gz', bytes: () => [gzipSync(Buffer.concat([Buffer.from(head), Buffer.from(row(1).repeat(40)).subarray(0, 0), Buffer.alloc(24_000_000, row(1))]), { level: 9 })], verdict: { at: 'upload', code: 'file_too_large_unpacked' } },
]

const lines: BadFile[] = [
  { what: 'CRLF', bytes: text(good().replaceAll('\n', '\r\n')), verdict: five },
  { what: 'CR alone', bytes: text(good().replaceAll('\n', '\r')), verdict: five },
  { what: 'CR CR LF', bytes: text(good().replaceAll('\n', '\r\r\n')), verdict: five },
  { what: 'line ends of all kinds', bytes: text(`${head}${row(0).trimEnd()}\r\n${row(1).trimEnd()}\r${row(2).trimEnd()}\r\r\n${row(3)}${row(4)}`), verdict: five },
  { what: 'blank lines between', bytes: text(good().replaceAll('\n', '\n\n')), verdict: five },
  { what: 'comments before, between and after', bytes: text(`# roof\n${head}${row(0)}# calibrated\n${row(1)}# end\n`), verdict: { at: 'taken', taken: 2, refused: 0 } },
  { what: 'a quote that never closes', bytes: text(`${head}2026-03-01 00:00:00,"1.0,60\n${row(1)}`), verdict: { at: 'upload', code: 'file_quote_open', facts: { line: 2 } } },
  { what: 'a quote inside a text', bytes: text('time,temp,note\n2026-03-01 00:00:00,1.0,5" gust\n2026-03-01 00:01:00,1.1,"said ""calm"""\n'), verdict: { at: 'taken', taken: 2, refused: 0 } },
  { what: 'a line end inside quotes', bytes: text('time,temp,note\n2026-03-01 00:00:00,1.0,"two\nlines"\n2026-03-01 00:01:00,1.1,one\n'), verdict: { at: 'taken', taken: 2, refused: 0 } },
  { what: 'quoted numbers', bytes: text('"time","temp","rh"\n"2026-03-01 00:00:00","1.0","60"\n'), verdict: { at: 'taken', taken: 1, refused: 0, values: [[1, 60]] } },
  { what: 'ragged rows: shorter, longer, one with a delimiter at its end', bytes: text(`${good()}2026-03-01 00:06:00,1.0\n2026-03-01 00:07:00,1.0,60,7\n2026-03-01 00:08:00,1.0,60,\n`), verdict: { at: 'taken', taken: 6, refused: 2, reasons: ['2 fields where the head has 3', '4 fields where the head has 3'] } },
]

const delimited: BadFile[] = [
  { what: 'no delimiter at all', bytes: text('12.3\n12.4\n12.5\n'), verdict: { at: 'upload', code: 'file_wrong_delimiter' } },
  { what: 'the wrong delimiter chosen', bytes: text(good()), said: recipe => ({ ...recipe, delimiter: ';' }), verdict: { at: 'import', code: 'file_wrong_delimiter', facts: { delimiter: ';' } } },
  { what: 'decimal commas between commas', bytes: text('time,temp,rh\n2026-03-01 00:00:00,1,5,60\n2026-03-01 00:01:00,1,6,61\n'), said: recipe => ({ ...firstColumn('ymd')(recipe), skipLines: 0, headerRows: 1, columns: [temperature] }), verdict: { at: 'import', code: 'nothing_taken', facts: { reason: '4 fields where the head has 3' } } },
  { what: 'quoted decimal commas between commas', bytes: text('time,temp,rh\n2026-03-01 00:00:00,"1,5",60\n2026-03-01 00:01:00,"-0,6",61\n'), verdict: { at: 'taken', taken: 2, refused: 0, values: [[1.5, 60], [-0.6, 61]] } },
  { what: 'decimal commas read with a point', bytes: text('time;temp;rh\n2026-03-01 00:00:00;1,5;60\n2026-03-01 00:01:00;2;61\n'), said: recipe => ({ ...recipe, decimal: '.' }), verdict: { at: 'taken', taken: 1, refused: 1, reasons: ['not a number with "." as the decimal mark'] } },
  { what: 'the delimiter changes in mid-file', bytes: text(`${head}${row(0)}2026-03-01 00:01:00;1.0;60\n${row(2)}`), verdict: { at: 'taken', taken: 2, refused: 1, reasons: ['1 field where the head has 3'] } },
  { what: 'tabs', bytes: text(good().replaceAll(',', '\t')), verdict: five },
  { what: 'bars', bytes: text(good().replaceAll(',', '|')), verdict: five },
  { what: 'columns lined up with blanks', bytes: text('YYYY MM DD hh mm   WSPD  ATMP\n2026 03 01 00 00    3.2  10.1\n2026 03 01 00 10   13.4  -0.5\n'), said: station, verdict: { at: 'taken', taken: 2, refused: 0, values: [[3.2, 10.1], [13.4, -0.5]] } },
  { what: 'a column that the recipe names and the file has not', bytes: text(good()), said: recipe => ({ ...recipe, columns: recipe.columns.map(column => ({ ...column, name: 'dew' })) }), verdict: { at: 'import', code: 'column_missing', facts: { column: 'dew' } } },
  { what: 'columns in another order than the recipe says: the name decides', bytes: text(good()), said: recipe => ({ ...recipe, columns: recipe.columns.map(column => ({ ...column, at: column.name === 'temp' ? 2 : 1 })) }), verdict: { at: 'taken', taken: 5, refused: 0, values: [[10, 60]] } },
  { what: 'the same name twice: the place decides', bytes: text('time,temp,temp\n2026-03-01 00:00:00,1,2\n'), said: station, verdict: { at: 'taken', taken: 1, refused: 0, values: [[1, 2]] } },
  { what: '__proto__ as a column', bytes: text('time,__proto__,temp\n2026-03-01 00:00:00,1,2\n'), verdict: { at: 'taken', taken: 1, refused: 0, values: [[2]] } },
]

/** Twelve rows, the second with this cell. */
const cell = (content: string, decimal: '.' | ',' = '.') => {
  const [between, mark] = decimal === '.' ? [',', '.'] : [';', ',']
  const cells = Array.from({ length: 12 }, (_, n) => n === 1 ? content : `1${mark}${n}`)
  return text(`time${between}temp\n${cells.map((value, n) => `2026-03-01 00:${String(n).padStart(2, '0')}:00${between}${value}\n`).join('')}`)
}
const refusedCell = (reason: string) => ({ at: 'taken', taken: 11, refused: 1, reasons: [reason] }) as const
const twelve = { at: 'taken', taken: 12, refused: 0 } as const
const noNumber = 'not a number, and not one of the missing codes of this column'
const numbers: BadFile[] = [
  { what: 'NaN and NA are missing', bytes: cell('NaN'), verdict: twelve },
  { what: 'a blank is missing', bytes: cell(''), verdict: twelve },
  { what: 'infinity', bytes: cell('inf'), verdict: refusedCell(noNumber) },
  { what: '1e400', bytes: cell('1e400'), verdict: refusedCell('too large a number') },
  { what: 'hexadecimal', bytes: cell('0x1F'), verdict: refusedCell(noNumber) },
  { what: 'a unit in the cell', bytes: cell('1.1 C'), verdict: refusedCell(noNumber) },
  { what: 'digits of another width', bytes: cell('１２'), verdict: refusedCell(noNumber) },
  { what: 'a minus sign that is none in text tables', bytes: cell('\u22121.1'), verdict: refusedCell(noNumber) },
  { what: 'a trace', bytes: cell('T'), verdict: refusedCell(noNumber) },
  { what: 'two marks', bytes: cell('1.2.3'), verdict: refusedCell(noNumber) },
  { what: 'a thousands mark', bytes: cell('"1,013.2"'), verdict: refusedCell(noNumber) },
  { what: 'thousands with points, decimals with a comma', bytes: cell('1.013,2', ','), verdict: refusedCell(noNumber) },
  { what: 'a leading plus', bytes: cell('+1.1'), verdict: { ...twelve, values: [[1], [1.1]] } },
  { what: 'minus zero', bytes: cell('-0.0'), verdict: { ...twelve, values: [[1], [0]] } },
  { what: 'thirty digits', bytes: cell('1.100000000000000088817841970012'), verdict: { ...twelve, values: [[1], [1.1]] } },
  { what: 'a number with an exponent', bytes: cell('1.1E+01'), verdict: { ...twelve, values: [[1], [11]] } },
  { what: 'a formula', bytes: cell('=1+1'), verdict: refusedCell(noNumber) },
  { what: 'a command for a spreadsheet', bytes: cell('=cmd|\' /C calc\'!A0'), verdict: refusedCell(noNumber) },
  { what: 'markup', bytes: cell('<script>alert(1)</script>'), verdict: refusedCell(noNumber) },
  { what: 'a statement for a database', bytes: cell('1\'; drop table chunk; --'), verdict: refusedCell(noNumber) },
]

const stamp = (content: string) => text(`time,temp\n${content},1.0\n`)
const times: BadFile[] = [
  { what: '24:00', bytes: stamp('2026-12-31 24:00'), said: firstColumn('ymd'), verdict: { at: 'taken', taken: 1, refused: 0, times: ['2027-01-01T00:00:00.000Z'] } },
  { what: '24:01', bytes: text(`${'time,temp\n'}2026-12-31 24:01,1.0\n2026-12-31 12:00,1.0\n`), said: firstColumn('ymd'), verdict: { at: 'taken', taken: 1, refused: 1, reasons: ['there is no time 24:01'] } },
  { what: '29 February of a year that has none', bytes: text('time,temp\n2025-02-29 00:00,1\n2024-02-29 00:00,1\n'), said: firstColumn('ymd'), verdict: { at: 'taken', taken: 1, refused: 1, reasons: ['month 2 of 2025 has no day 29'] } },
  { what: 'day and month the other way round', bytes: text('time,temp\n03/25/2026 00:00,1\n03/05/2026 00:00,1\n'), said: firstColumn('dmy'), verdict: { at: 'taken', taken: 1, refused: 1, reasons: ['there is no month 25; check the order of day and month'], times: ['2026-05-03T00:00:00.000Z'] } },
  { what: 'a year of two digits', bytes: text('time,temp\n03/05/26 00:00,1\n03/05/2026 00:00,1\n'), said: firstColumn('mdy'), verdict: { at: 'taken', taken: 1, refused: 1, reasons: ['the year does not have four digits; check the order of day, month and year'] } },
  { what: 'a second of 60', bytes: text('time,temp\n2026-03-01 00:00:60,1\n2026-03-01 00:01:00,1\n'), said: firstColumn('ymd'), verdict: { at: 'taken', taken: 1, refused: 1, reasons: ['a second above 59'] } },
  { what: 'a 12-hour clock', bytes: text('time,temp\n03/05/2026 12:05 AM,1\n03/05/2026 1:05 p. m.,2\n'), said: firstColumn('mdy'), verdict: { at: 'taken', taken: 2, refused: 0, times: ['2026-03-05T00:05:00.000Z', '2026-03-05T13:05:00.000Z'] } },
  { what: 'a zone that does not exist', bytes: text(good()), said: recipe => ({ ...recipe, zone: 'Mars/Olympus' }), verdict: { at: 'import', code: 'zone_unknown', facts: { zone: 'Mars/Olympus' } } },
  { what: 'a station record without a clock', bytes: text(good()), said: withTime({ form: 'none' }), verdict: { at: 'import', code: 'no_time_column' } },
  { what: 'a flight without height and pressure', bytes: text(good()), said: recipe => ({ ...recipe, kind: 'flight' }), verdict: { at: 'import', code: 'no_height_column' } },
  { what: 'milliseconds taken for seconds', bytes: text('time,temp\n1772323200000,1\n'), said: withTime({ form: 'epoch', column: { name: 'time', at: 0 }, unit: 's' }), verdict: { at: 'import', code: 'nothing_taken' } },
  { what: 'no time in one row', bytes: text(`${head}${row(0)},1.0,60\n`), verdict: { at: 'taken', taken: 1, refused: 1, reasons: ['no time'] } },
]

const stations: BadFile[] = [
  { what: 'a column with a different value in every row taken for the station', bytes: text('time,id,temp\n' + Array.from({ length: 300 }, (_, n) => `2026-03-01 0${n % 10}:00:00,s${n},1\n`).join('')), said: recipe => ({ ...recipe, stationColumn: { name: 'id', at: 1 } }), verdict: { at: 'import', code: 'too_many_stations', facts: { column: 'id', limit: 200 } } },
]

const names: BadFile[] = [
  ['a name with path tricks', '../../../../etc/passwd', 'passwd'], ['a name with other slashes', '..\\..\\windows\\win.ini', 'win.ini'], ['a name with a NUL', 'a\0b.csv', 'ab.csv'],
  ['a name of dots', '..', 'record'], ['a name that turns its direction', 'record\u202Evsc.exe', 'recordvsc.exe'], ['a name with line ends', 'a\r\nX-Evil: 1.csv', 'aX-Evil: 1.csv'], ['a name of 4,000 letters', 'n'.repeat(4000), 'n'.repeat(160)],
].map(([what, name, shown]) => ({ what: what!, name: name!, bytes: text(good()), verdict: { ...five, name: `file ${shown}` } }))

export const badFiles: readonly BadFile[] = [...sizes, ...binary, ...packed, ...lines, ...delimited, ...numbers, ...times, ...stations, ...names]

/** The cap under which the cases run: above every honest one, below what the bomb unpacks to. */
export const capBytes = 16_000_000
