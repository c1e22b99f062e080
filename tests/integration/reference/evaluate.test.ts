import { spawn } from 'node:child_process'
import { fileURLToPath } from 'node:url'
import { describe, expect, it } from 'vitest'
import { quantities } from '#shared/thermo/registry'

const root = fileURLToPath(new URL('../../../', import.meta.url))

/** Runs the evaluator with some lines on stdin. */
function evaluate(flags: string[], input: string): Promise<{ out: string, err: string, code: number | null }> {
  return new Promise((resolve, reject) => {
    const child = spawn(process.execPath, ['--import', 'tsx', 'server/cli/evaluate.ts', ...flags], { cwd: root })
    let out = '', err = ''
    child.stdout.on('data', (chunk: Buffer) => { out += chunk.toString() })
    child.stderr.on('data', (chunk: Buffer) => { err += chunk.toString() })
    child.on('error', reject)
    child.on('close', code => resolve({ out, err, code }))
    child.stdin.end(input)
  })
}
const answers = (out: string): Record<string, unknown>[] => out.trim().split('\n').filter(line => line !== '').map((line): Record<string, unknown> => JSON.parse(line))

const theta = { quantity: 'potential-temperature', inputs: { pressure: { value: 850, unit: 'hPa' }, temperature: { value: 20, unit: 'Cel' } } }

describe('the evaluator', () => {
  it('lists every quantity as JSON, with names and units that its questions take', async () => {
    const { out, code } = await evaluate(['--list'], '')
    expect(code).toBe(0)
    const list: { quantity: string, unit: string, inputs: { name: string, unit: string }[] }[] = JSON.parse(out)
    expect(list.map(one => one.quantity)).toEqual(quantities.map(one => one.key))
  })
  it('answers one line a question, in order, goes on after bad lines, and says nothing else on stdout', async () => {
    const lines = [
      JSON.stringify({ id: 'a', ...theta }),
      '{"id":"b"', 'null', '[]', '7', '"text"', '{}',
      JSON.stringify({ id: 'c', quantity: 'no-such' }),
      JSON.stringify({ id: 'd', ...theta, inputs: { ...theta.inputs, temperature: { value: -300, unit: 'Cel' } } }),
      JSON.stringify({ id: 'e', ...theta, inputs: { pressure: theta.inputs.pressure } }),
      JSON.stringify({ id: 'f', ...theta, inputs: { ...theta.inputs, pressure: { value: 850, unit: 'K' } } }),
      JSON.stringify({ id: 'g', ...theta, inputs: { ...theta.inputs, pressure: { value: '850', unit: 'hPa' } } }),
      JSON.stringify({ id: 'h', ...theta, inputs: { ...theta.inputs, pressure: { value: 850 } } }),
      JSON.stringify({ id: 'i', ...theta, inputs: { ...theta.inputs, wind: { value: 1, unit: 'm/s' } } }),
      JSON.stringify({ id: 'j', ...theta, convention: 'no-such' }),
      JSON.stringify({ id: 'k', ...theta, variant: 'no-such' }),
      JSON.stringify({ id: 'l', ...theta, unit: 'furlong' }),
      '{"id":"m","quantity":"density","inputs":{"pressure":{"value":1e999,"unit":"hPa"},"temperature":{"value":25,"unit":"Cel"}}}',
      JSON.stringify({ id: { deep: [1] }, ...theta, unit: 'Cel' }),
      JSON.stringify({ id: 'n', quantity: 'static-stability', inputs: { lapseRate: { value: 6.5, unit: 'K/km' } } }),
      JSON.stringify({ id: 'o', quantity: 'lapse-rate-least-squares', inputs: { height: { value: [1, 1, 1], unit: 'm' }, temperature: { value: [1, 2, 3], unit: 'Cel' } } }),
      JSON.stringify({ id: 'p', quantity: '__proto__' }),
    ]
    const { out, err, code } = await evaluate([], `${lines.join('\n')}\r\n`)
    const got = answers(out)
    expect(code).toBe(0)
    expect(got).toHaveLength(lines.length)
    expect(Math.abs(Number(got[0]?.value) - 307.08)).toBeLessThan(0.06)
    expect(got[0]).toMatchObject({ id: 'a', unit: 'K' })
    expect(got.map(line => (typeof line.error === 'object' && line.error !== null && 'code' in line.error ? line.error.code : null))).toEqual([
      null, 'bad_json', 'bad_question', 'bad_question', 'bad_question', 'bad_question', 'bad_question', 'unknown_quantity', 'out_of_range', 'missing_input', 'wrong_dimension', 'bad_input', 'bad_unit', 'unknown_input', 'unknown_convention', 'unknown_variant', 'unknown_unit', 'bad_input', null, null, 'series_unusable', 'unknown_quantity',
    ])
    expect(got[8]).toMatchObject({ id: 'd', error: { input: 'temperature' } })
    expect(got[18]).toMatchObject({ id: { deep: [1] }, unit: 'Cel' })
    expect(got[19]).toMatchObject({ id: 'n', value: 'stable' })
    expect(err.trim().split('\n').pop()).toBe('lines=22 errors=19')
  })
  it('judges with the code that marks', async () => {
    const lines = [['308.24 K', 'standard-pressure'], ['307.1 K', null], ['33.9 °C', null], ['#DIV/0!', null]].map(([answer], id) => JSON.stringify({ id, ...theta, answer }))
    const { out } = await evaluate(['--judge'], lines.join('\n'))
    const got = answers(out)
    expect(got[0]).toMatchObject({ accepted: false, slip: 'standard-pressure', unit: 'K' })
    expect(got[1]).toMatchObject({ accepted: true, slip: null, band: [expect.any(Number), expect.any(Number)] })
    expect(got[2]).toMatchObject({ accepted: true })
    expect(got[3]).toMatchObject({ accepted: false, reading: 'unreadable' })
  })
  it('puts the working beside each value with --trace', async () => {
    const { out } = await evaluate(['--trace'], JSON.stringify({ id: 1, ...theta }))
    expect(answers(out)[0]).toMatchObject({ trace: [{ formula: expect.any(String) }, { filled: expect.stringContaining('307.09') }] })
  })
  it('gives the uncertainty beside the value where those of the inputs are given', async () => {
    const heating = { quantity: 'isobaric-heat', inputs: { temperatureStart: { value: 10, unit: 'Cel' }, temperatureEnd: { value: 35, unit: 'Cel' } }, u: { temperatureStart: { value: 0.2, unit: 'Cel' }, temperatureEnd: { value: 0.2, unit: 'K' } } }
    const lines = [heating, { ...heating, correlation: [['temperatureStart', 'temperatureEnd', 1]] }, { ...heating, monteCarlo: { trials: 2000, seed: 4 } }, { ...heating, monteCarlo: { trials: 2000, seed: 4 } },
      { ...heating, u: { pressure: { value: 1, unit: 'hPa' } } }, { ...heating, u: { temperatureEnd: { value: -1, unit: 'K' } } }, { ...heating, u: { temperatureEnd: { value: 1, unit: 'hPa' } } }, { ...heating, u: 0.2 },
      { ...heating, correlation: [['temperatureStart', 'temperatureEnd', 3]] }, { ...heating, correlation: 'all' }, { ...heating, coverage: 2 }, { ...heating, u: undefined }]
    const { out, code } = await evaluate([], lines.map(line => JSON.stringify(line)).join('\n'))
    expect(code).toBe(0)
    const [plain, shared, simulated, again, ...rest] = answers(out)
    // cp · 0.2 K · √2, and the same in both
    expect(plain).toMatchObject({ value: 25.1, unit: 'kJ/kg', uncertainty: { method: 'propagation', unit: 'kJ/kg', coverage: 0.95, parts: [{ share: expect.closeTo(0.5, 9) }, { share: expect.closeTo(0.5, 9) }], standard: expect.closeTo(1.004 * 0.2 * Math.SQRT2, 9) } })
    expect(shared).toMatchObject({ uncertainty: { standard: 0 } })
    expect(simulated).toMatchObject({ uncertainty: { method: 'monte-carlo', trials: 2000, without: 0, seed: 4, standard: expect.closeTo(1.004 * 0.2 * Math.SQRT2, 1) } })
    expect(again).toEqual(simulated)
    const bad = rest.slice(0, -1).map(line => line.error)
    expect(bad).toEqual([
      expect.objectContaining({ code: 'unknown_input', input: 'pressure' }), expect.objectContaining({ code: 'out_of_range', input: 'temperatureEnd' }), expect.objectContaining({ code: 'wrong_dimension', input: 'temperatureEnd' }), expect.objectContaining({ code: 'bad_question' }),
      expect.objectContaining({ code: 'out_of_range' }), expect.objectContaining({ code: 'bad_question' }), expect.objectContaining({ code: 'out_of_range', input: 'coverage' }),
    ])
    expect(rest.at(-1)).not.toHaveProperty('uncertainty')
  })
  it('refuses a flag that it does not know, and is quiet about no questions', async () => {
    expect(await evaluate(['--nope'], '')).toMatchObject({ out: '', code: 2 })
    expect(await evaluate(['--judge'], '\n\n')).toMatchObject({ out: '', code: 0 })
  })
})
