import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { RowSplitter } from '../../../server/importing/bytes'
import { NumberReader } from '../../../server/importing/fields'

function split(text: string | Buffer, delimiter: ',' | ';' | ' ' = ',', chunk = 1 << 20): { line: number, cells: string[] }[] {
  const rows: { line: number, cells: string[] }[] = []
  const splitter = new RowSplitter({ encoding: 'utf-8', delimiter, onRow: fields => rows.push({ line: fields.line, cells: Array.from({ length: fields.count }, (_, at) => fields.text(at)) }) })
  const bytes = Buffer.from(text)
  for (let at = 0; at < bytes.length; at += chunk) splitter.push(bytes.subarray(at, at + chunk))
  splitter.end()
  return rows
}

describe('rows and fields', () => {
  it('gives the same rows however the bytes arrive', () => {
    const cell = fc.oneof(fc.string({ maxLength: 8 }).filter(text => !/[\p{Cc}]/u.test(text)), fc.constantFrom('1.5', '', ' x ', 'a"b', 'ü°C', '""'))
    const quoted = (text: string) => `"${text.replaceAll('"', '""')}"`
    fc.assert(fc.property(fc.array(fc.array(cell, { minLength: 2, maxLength: 5 }), { minLength: 1, maxLength: 6 }), fc.constantFrom('\n', '\r\n', '\r\r\n', '\r'), fc.integer({ min: 1, max: 7 }), (rows, end, chunk) => {
      const text = rows.map(cells => cells.map(quoted).join(',')).join(end) + end
      const whole = split(text)
      expect(split(text, ',', chunk)).toEqual(whole)
      expect(whole.map(row => row.cells)).toEqual(rows.map(cells => cells.map(one => one.trim())))
    }), { numRuns: 300 })
  })
  it('numbers lines as they stand in the file, blank ones and those inside quotes included', () => {
    expect(split('a,b\n\n1,"x\ny"\n2,z\n').map(row => row.line)).toEqual([1, 3, 5])
  })
  it('takes runs of blanks for one delimiter, those at the start for none', () => {
    expect(split('  a   b \n 1  2\n', ' ').map(row => row.cells)).toEqual([['a', 'b'], ['1', '2']])
  })
})

describe('numbers', () => {
  const read = (text: string, decimal: '.' | ',' = '.') => new NumberReader(decimal).read(Buffer.from(text), 0, text.length)
  it('reads what a double prints, bit for bit', () => {
    fc.assert(fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
      expect(Object.is(read(String(value)), value === 0 ? 0 : value)).toBe(true)
    }), { numRuns: 2000 })
  })
  it('reads decimals of up to 15 digits as the engine does', () => {
    fc.assert(fc.property(fc.integer({ min: -999_999_999_999_999, max: 999_999_999_999_999 }), fc.integer({ min: 0, max: 12 }), (digits, decimals) => {
      const text = (BigInt(digits) < 0n ? '-' : '') + String(Math.abs(digits)).padStart(decimals + 1, '0').replace(new RegExp(`(\\d{${decimals}})$`), decimals > 0 ? '.$1' : '$1')
      const value = Number(text)
      expect(Object.is(read(text), value === 0 ? 0 : value)).toBe(true)
      expect(Object.is(read(text.replace('.', ','), ','), value === 0 ? 0 : value)).toBe(true)
    }), { numRuns: 2000 })
  })
  it.each(['', '.', '-', '+', 'e5', '1e', '1,5', '1 2', '0x1F', 'Infinity', '1e999', '1_000', '--1', '１'])('%s is no number', text => expect(read(text)).toBeNaN())
  it.each([['1.', 1], ['.5', 0.5], ['+7', 7], ['-0.0', 0], ['1e3', 1000], ['007', 7], [' 4 ', 4]] as const)('%s is %d', (text, value) => expect(Object.is(read(text), value)).toBe(true))
  it('tells the decimals as written', () => {
    const reader = new NumberReader('.')
    reader.read(Buffer.from('12.340'), 0, 6)
    expect(reader.decimals).toBe(3)
  })
})
