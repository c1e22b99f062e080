import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { generatedFiles, generatedFolder, stationDayFaults } from '../../fixtures/generate'

const files = generatedFiles()
const linesOf = (name: string) => files.get(name)!.split(/\r?\n/).filter(line => line !== '')

describe('generated files', () => {
  it('are the committed ones, byte for byte', () => {
    expect(readdirSync(generatedFolder).sort()).toEqual([...files.keys()].sort())
    for (const [name, content] of files) expect(readFileSync(join(generatedFolder, name), 'utf8') === content, name).toBe(true)
  })

  it('stay small', () => {
    let bytes = 0
    for (const content of files.values()) bytes += Buffer.byteLength(content)
    expect(bytes).toBeLessThan(300_000)
  })

  it('have the faults that are said of the station day: forty minutes gone, a stuck hour, missing codes, a spike', () => {
    const rows = linesOf('station-day.csv').slice(4).map(line => line.split(','))
    const gap = stationDayFaults.find(fault => fault.kind === 'gap')!
    expect(rows.length).toBe(1440 - (gap.toRow - gap.fromRow + 1))
    expect(rows.filter(row => row[3] === '-9999').length).toBe(12)
    let longest = 0
    let run = 1
    for (let at = 1; at < rows.length; at++) {
      run = rows[at]![2] === rows[at - 1]![2] && rows[at]![3] === rows[at - 1]![3] ? run + 1 : 1
      longest = Math.max(longest, run)
    }
    expect(longest).toBeGreaterThanOrEqual(72)
    const jumps = rows.filter((row, at) => at > 0 && Math.abs(Number(row[2]) - Number(rows[at - 1]![2])) > 2.5)
    expect(jumps.length).toBe(3) // up, down a little, down: the spike and nothing else
  })

  it('have the doubled hour of the clock change: 300 rows of five minutes, 01:00 to 01:55 twice (W10)', () => {
    const stamps = linesOf('station-clock-change.csv').slice(1).map(line => line.split(';')[0]!)
    expect(stamps.length).toBe(300)
    const twice = stamps.filter((stamp, at) => stamps.indexOf(stamp) !== at)
    expect(twice.length).toBe(12)
    expect(twice.every(stamp => stamp.slice(11, 13) === '01')).toBe(true)
    expect(stamps.at(-1)).toBe('02.11.2026 00:00')
  })
})
