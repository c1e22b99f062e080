import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { labBody } from '#shared/schemas/lab'
import { anyLabBody } from '../../../../fixtures/anyLabBody'
import { longestLabFile, readLabFile } from '../../../../../server/domain/labs/labFile/readLabFile'
import { writeLabFile } from '../../../../../server/domain/labs/labFile/writeLabFile'

const body = labBody.parse({
  title: 'Rates', text: 'Fit a line.\n\n## How\n\nBy least squares.', kind: 'profile', minutes: 90, aims: ['Fit a line to a layer.'], guide: 'Look at the sign.', supply: [],
  steps: [
    { key: 'rate', kind: 'number', title: 'Lapse rate', text: 'All rows count.', pointsMilli: 2500, quantity: 'lapse-rate-least-squares', unit: 'K/km', granted: { absolute: 0.02 }, slipMilli: 500, inputs: { height: { from: 'share', column: 'height', read: 'layer' }, temperature: { from: 'share', column: 'air-temperature', read: 'layer' } } },
    { key: 'lifted', kind: 'number', title: 'Lifted by 100 m', pointsMilli: 1000, quantity: 'parcel-temperature-by-height', unit: 'Cel', inputs: { temperature: { from: 'share', column: 'air-temperature', read: 'lowest' }, heightDifference: { from: 'text', value: 100, unit: 'm' }, lapseRate: { from: 'step', key: 'rate' } } },
  ],
})
const text = writeLabFile(body)
const change = (from: string, to: string) => {
  if (!text.includes(from)) throw new Error(`The text has no “${from}”.`)
  return text.replace(from, to)
}
const lineOf = (file: string, words: string) => file.split('\n').findIndex(line => line.includes(words)) + 1
const head = (settings: string) => `---\n${settings}\n---\n\nText.\n`

describe('a lab as text', () => {
  it('is the same lab again when it is read back, whatever is in it', () => {
    fc.assert(fc.property(anyLabBody, (given) => {
      expect(readLabFile(writeLabFile(given))).toEqual({ body: given, faults: [] })
    }), { numRuns: 300 })
  })

  it('is tried on every kind of step', () => {
    const kinds = fc.sample(anyLabBody, { numRuns: 300, seed: 7 }).flatMap(given => given.steps.map(step => step.kind))
    expect(new Set(kinds)).toEqual(new Set(['number', 'diagram', 'reading', 'fit', 'table', 'choice']))
  })

  it('reads like a text: settings in words, what goes without saying left out', () => {
    for (const line of ['title: Rates', 'minutes: 90', '## Lapse rate', 'asks: lapse-rate-least-squares', 'in: K/km', 'marks: 2.5', 'slip-marks: 0.5', 'granted: 0.02', '  height: layer of height', '  heightDifference: 100 m', '  lapseRate: step rate', 'All rows count.', '# Marking guide']) expect(text.split('\n')).toContain(line)
    expect(text).not.toMatch(/null|Milli|digits-marks|field-plan/)
  })

  it('takes what a person changed by hand: Windows line ends, a mark at the front, empty lines', () => {
    const changed = `\uFEFF${change('marks: 2.5', 'marks: 3').replace('## Lapse rate', '\n\n## Lapse rate').replaceAll('\n', '\r\n')}`
    const read = readLabFile(changed)
    expect(read.body?.steps[0]).toMatchObject({ pointsMilli: 3000, title: 'Lapse rate', text: 'All rows count.' })
  })

  it.each([
    ['an unknown setting', change('digits: 3', 'digitz: 3'), 'digitz: 3', /no setting “digitz”/],
    ['a word for a number', change('marks: 2.5', 'marks: two'), 'marks: two', /marks: .*number/],
    ['more decimals than marks have', change('marks: 2.5', 'marks: 2.50005'), 'marks: 2.50005', /marks/],
    ['an input that is no phrase', change('height: layer of height', 'height: somewhere'), 'height: somewhere', /from/],
    ['an input from a later step', change('lapseRate: step rate', 'lapseRate: step lifted'), 'lapseRate: step lifted', /earlier step/],
    ['a key twice', change('key: lifted', 'key: rate'), 'key: rate', /key/],
    ['settings that are no YAML', change('in: K/km', 'in: [K/km'), 'in: [K/km', /settings/],
    ['a setting twice', change('in: K/km', 'in: K/km\nin: K/m'), 'in: K/m', /settings/],
    ['a missing title', change('title: Rates\n', ''), '---', /title/],
  ])('names %s with its line', (_what, file, at, words) => {
    const { body: none, faults } = readLabFile(file)
    expect(none).toBeNull()
    expect(faults[0]?.message).toMatch(words)
    const lines = file.split('\n').flatMap((line, no) => line.includes(at) ? [no + 1] : [])
    expect(lines.some(line => Math.abs(line - (faults[0]?.line ?? -9)) <= (at === 'in: [K/km' || at === '---' ? 2 : 0))).toBe(true)
  })

  it('names a block that does not end, a step without a title, and a text without settings', () => {
    const open = text.slice(0, text.lastIndexOf('```\n') === -1 ? undefined : text.lastIndexOf('```'))
    expect(readLabFile(open).faults).toMatchObject([{ line: open.split('\n').findLastIndex(line => line === '```step') + 1, message: expect.stringContaining('does not end') as string }])
    expect(readLabFile(change('## Lapse rate\n', '')).faults[0]?.message).toContain('under its title')
    expect(readLabFile('# Only a text').faults).toMatchObject([{ line: 1 }])
    expect(readLabFile('').faults).toMatchObject([{ line: 1 }])
    expect(readLabFile('---\ntitle: X').faults[0]?.message).toContain('do not end')
  })
})

it('a revision from before labs had such parts is read as one without them', () => {
  expect(labBody.parse({ title: 'Old', text: 'Text.', supply: [], steps: [] })).toEqual({ title: 'Old', text: 'Text.', supply: [], steps: [], kind: null, minutes: null, aims: [], outcomes: [], fieldPlan: null, guide: '', conditions: null, practice: null })
})

describe('a hostile text', () => {
  const quickly = (file: string) => {
    const started = performance.now()
    const read = readLabFile(file)
    expect(performance.now() - started).toBeLessThan(15_000)
    return read
  }

  it('of ten megabytes is refused unread', () => {
    expect(quickly(`---\ntitle: ${'x'.repeat(10_000_000)}\n---\n`).faults).toHaveLength(1)
    expect(quickly('---\n'.repeat(longestLabFile / 4)).body).toBeNull()
    expect(quickly(`---\ntitle: X\n---\n${'```step\n'.repeat(100_000)}`).body).toBeNull()
  })

  it('that expands a billion times is refused at its first anchor', () => {
    const bomb = ['a: &a [x, x, x, x, x, x, x, x, x]', ...'bcdefghi'.split('').map((name, at) => `${name}: &${name} [${Array(9).fill(`*${'abcdefgh'[at]}`).join(', ')}]`)].join('\n')
    const { faults } = quickly(head(`title: X\n${bomb}`))
    expect(faults).toMatchObject([{ line: 3, message: expect.stringContaining('anchors') as string }])
    expect(quickly(head('title: *nobody')).body).toBeNull()
  })

  it('with the names of every object’s own parts changes no object', () => {
    for (const name of ['__proto__', 'constructor', 'prototype', '"__proto__"']) {
      expect(quickly(head(`title: X\n${name}: { polluted: yes }`)).faults[0]?.message).toContain('No setting is called')
      expect(quickly(head(`title: X\nfield-plan: { ${name}: { polluted: yes } }`)).body).toBeNull()
    }
    expect(({} as Record<string, unknown>).polluted).toBeUndefined()
  })

  it('with tags, directives, several documents, deep nesting or a key that is no name is refused', () => {
    for (const settings of ['title: !!binary aGk=', 'title: !run "x"', '%YAML 1.1', 'title: X\n? [a]\n: b', `title: ${'['.repeat(50_000)}`, `a:${' {a:'.repeat(20_000)}`, 'title: X\n...\ntitle: Y']) expect(quickly(head(settings)).body).toBeNull()
  })

  it('with HTML stays a text: it is rendered like any other text of a lab', () => {
    expect(quickly(head('title: <script>x</script>')).body).toMatchObject({ title: '<script>x</script>', text: 'Text.' })
  })

  it('of nonsense gives a lab or faults with lines, and never throws', () => {
    fc.assert(fc.property(fc.array(fc.oneof(fc.constantFrom(...text.split('\n')), fc.string({ maxLength: 20 })), { maxLength: 60 }), (lines) => {
      const read = readLabFile(['---', ...lines].join('\n'))
      if (read.body === null) expect(read.faults.length).toBeGreaterThan(0)
      for (const fault of read.faults) expect(fault.line).toBeGreaterThan(0)
    }), { numRuns: 500 })
  })
})

it('says on which line', () => {
  const file = change('in: K/km', 'in: 5')
  expect(readLabFile(file).faults).toMatchObject([{ line: lineOf(file, 'in: 5') }])
})
