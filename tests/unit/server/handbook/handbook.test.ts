import { describe, expect, it } from 'vitest'
import { defaultConvention, conventions } from '#shared/thermo/conventions/index'
import { quantities } from '#shared/thermo/registry'
import { compareBeside } from '../../../../server/domain/handbook/comparePasted'
import { computeQuantity } from '../../../../server/domain/handbook/computeQuantity'
import { describeConvention } from '../../../../server/domain/handbook/describeConvention'
import { describeQuantity } from '../../../../server/domain/handbook/describeQuantity'
import { mostValues } from '../../../../server/domain/handbook/readTypedInputs'
import { handbookList } from '../../../../server/domain/handbook/handbookList'

const startOf = (key: string) => Object.fromEntries(describeQuantity(key).inputs.map(input => [input.name, input.start]))
const compute = (key: string, inputs: Record<string, string>, more: { variant?: string, along?: string, unit?: string, isStaff?: boolean, isHeld?: boolean } = {}) =>
  computeQuantity(key, { convention: 'closed-1004', variant: more.variant ?? '', unit: more.unit ?? describeQuantity(key).unit.ucum, inputs, along: more.along ?? '' }, { isStaff: more.isStaff ?? true, isHeld: more.isHeld ?? false })

/** The worked example with each series drawn out to so many values between its first and its last. */
function longest(key: string, values: number): Record<string, string> {
  const start = startOf(key)
  return Object.fromEntries(describeQuantity(key).inputs.map(({ name, shape }) => {
    const given = (start[name] ?? '').trim().split(/[\s;]+/).map(Number)
    const [first = 0, last = 0] = [given[0], given.at(-1)]
    return [name, shape === 'series' ? Array.from({ length: values }, (_, at) => (first + (last - first) * at / (values - 1)).toFixed(4)).join(' ') : start[name] ?? '']
  }))
}

describe('the handbook', () => {
  it('lists every quantity once', () => {
    expect(handbookList().groups.flatMap(group => group.quantities.map(one => one.key)).sort()).toEqual(quantities.map(one => one.key).sort())
  })
  it.each(quantities.map(one => [one.key]))('%s: its page starts the calculator with the worked example, which computes', (key) => {
    const page = describeQuantity(key)
    expect(page.variants.every(variant => variant.source.length > 10 && variant.formulas.length > 0)).toBe(true)
    for (const variant of page.variants) for (const html of variant.formulas) expect(html).not.toMatch(/katex-error|NaN|undefined/)
    const reply = compute(key, startOf(key))
    expect(reply.refused).toBeNull()
    expect(Object.values(reply.read).filter(one => !one.ok)).toEqual([])
    expect(reply.outcome?.words ?? '').not.toBe('')
    for (const line of reply.lines) expect(line.filledHtml).not.toMatch(/katex-error/)
  })
  it.each(conventions.map(one => [one.key]))('%s: says its constants, that it closes, and what it accepts', (key) => {
    const page = describeConvention(key)
    expect(page.constants.length).toBeGreaterThanOrEqual(7)
    expect(page.accepted.every(one => one.changes !== '')).toBe(true)
    // in the reader's words: no name of the program's own, no digits beyond what anybody writes
    expect(page.accepted.filter(one => /\b[a-z]+[A-Z]|\d\.\d{8}/.test(one.changes))).toEqual([])
  })
  it('refuses what there is not', () => {
    expect(() => describeQuantity('toString')).toThrow('not_found')
    expect(() => describeConvention('__proto__')).toThrow('not_found')
    expect(() => compute('density', {}, { unit: 'K' })).toThrow('not_found')
    expect(() => compute('density', {}, { variant: 'no-such' })).toThrow('not_found')
  })
})

describe('the calculator', () => {
  it('reads values as people type them, and says what is wrong with one', () => {
    const reply = compute('density', { pressure: '1013,25 mb', temperature: '25 °C' })
    expect(reply.outcome?.words).toMatch(/^1\.1841\d kg m/)
    const wrong = compute('density', { pressure: '20 °C', temperature: '25' })
    expect(wrong.outcome).toBeNull()
    expect(wrong.read.pressure?.ok).toBe(false)
    expect(wrong.read.temperature?.message).toContain('°C or in K')
  })
  it('says what cannot be computed, and why', () => {
    expect(compute('density', { pressure: '900 hPa', temperature: '20 K' }).refused).toContain('temperature = 20 lies outside')
  })
  it('draws a curve along an input: density falls as 1/T', () => {
    const { curve } = compute('density', { pressure: '900 hPa', temperature: '300 K' }, { along: 'temperature' })
    const first = curve?.points[0], last = curve?.points.at(-1)
    expect(first?.x).toBeCloseTo(270 - 273.15, 6)
    expect((first?.y ?? 0) / (last?.y ?? 1)).toBeCloseTo(330 / 270, 6)
  })
  it('takes no longer a series than it can answer for, and says so', () => {
    const reply = compute('lapse-rate-theil-sen', longest('lapse-rate-theil-sen', mostValues + 1))
    expect(reply.outcome).toBeNull()
    expect(Object.values(reply.read).some(one => one.message.includes(`takes at most ${mostValues}`))).toBe(true)
    expect(compute('lapse-rate-theil-sen', longest('lapse-rate-theil-sen', mostValues)).outcome).not.toBeNull()
  })
  it('answers no question at more than fifty times the cost of the usual one (S9)', () => {
    const cost = (key: string, inputs: Record<string, string>) => {
      const start = process.cpuUsage()
      compute(key, inputs, { along: describeQuantity(key).inputs.find(input => input.shape === 'number')?.name ?? '' })
      const { user, system } = process.cpuUsage(start)
      return user + system
    }
    const usual = quantities.map(one => cost(one.key, startOf(one.key))).sort((a, b) => a - b)[Math.floor(quantities.length / 2)] ?? 0
    // one slow turn is the machine's: three slow ones are the product's
    const isDear = (key: string) => [1, 2, 3].every(() => cost(key, longest(key, mostValues)) > 50 * usual)
    const dear = quantities.map(one => one.key).filter(key => describeQuantity(key).inputs.some(input => input.shape === 'series') && isDear(key))
    expect(usual).toBeGreaterThan(0)
    expect(dear).toEqual([])
  }, 120_000)
  it('keeps to the worked example while a lab asks a student for the quantity', () => {
    expect(compute('density', startOf('density'), { isHeld: true, isStaff: false }).outcome?.words).toMatch(/^1\.184/)
    const own = compute('density', { ...startOf('density'), temperature: '24.9 °C' }, { isHeld: true, isStaff: false })
    expect(own).toMatchObject({ outcome: null, lines: [], curve: null })
    expect(own.refused).toContain('a lab of yours asks for this')
  })
  it('keeps bands and slips for staff', () => {
    expect(compute('density', startOf('density'), { isStaff: false })).toMatchObject({ band: null, slips: [] })
    expect(compute('density', startOf('density')).slips.length).toBeGreaterThan(2)
  })
})

describe('a pasted key', () => {
  const columns = [{ holds: 'temperature', unit: 'Cel' }, { holds: 'pressure', unit: 'hPa' }, { holds: 'key', unit: 'K' }]
  const compare = (pasted: string) => compareBeside(defaultConvention, { quantity: 'potential-temperature', variant: '', unit: 'K', pasted, columns })
  // 20 °C, 850 hPa: 307.09 K by κ 287/1004; 307.0831 by 2/7 (trap T3); 308.24 from 1013.25 hPa (trap T1)
  it('names the cause of each departure', async () => {
    const reply = await compare('t\tp\ttheta\n20\t850\t307.09\n20\t850\t307.0831\n20\t850\t308.24\n20\t850\t311.5\nx\t850\t300\n')
    expect(reply.rows.map(row => [row.line, row.cause])).toEqual([[2, 'same'], [3, 'constant'], [4, 'slip'], [5, 'none'], [6, 'not_read']])
    expect(reply.rows[1]?.words).toContain('2/7')
    expect(reply.rows[2]?.words).toContain('1013.25')
    expect(reply.causes.map(one => one.rows)).toEqual([1, 1, 1, 1, 1])
  })
  it('takes a series down the rows, with one key', async () => {
    const reply = await compareBeside(defaultConvention, {
      quantity: 'lapse-rate-least-squares', variant: '', unit: 'K/km', columns: [{ holds: 'height', unit: 'm' }, { holds: 'temperature', unit: 'Cel' }, { holds: 'key', unit: 'K/km' }],
      pasted: 'z;T;rate\n100;15,0;10,4\n150;14,6;\n200;14,1;\n250;13,7;\n300;12,9;\n',
    })
    expect(reply.rows).toMatchObject([{ cause: 'slip', words: 'z fitted on T and inverted' }])
  })
  it('lets others in between two rows', async () => {
    let turns = 0
    const reply = await compareBeside(defaultConvention, { quantity: 'potential-temperature', variant: '', unit: 'K', pasted: '20\t850\t307\n20\t850\t308\n', columns }, async () => { turns++ })
    expect([reply.rows.length, turns]).toEqual([2, 2])
  })
  it('asks for what is missing and for units that fit', async () => {
    await expect(compareBeside(defaultConvention, { quantity: 'density', variant: '', unit: 'kg/m3', pasted: '1\t2', columns: [{ holds: 'key', unit: '1' }, { holds: '', unit: '' }] })).rejects.toThrow('invalid')
    await expect(compareBeside(defaultConvention, { quantity: 'density', variant: '', unit: 'K', pasted: '1', columns })).rejects.toThrow('invalid')
  })
})
