import { execFile } from 'node:child_process'
import { readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { promisify } from 'node:util'
import { describe, expect, it } from 'vitest'
import { referenceVersion } from '#shared/marking/version'
import { goldenLines, judgementsEach } from '../../../fixtures/marking/golden'

/** `digest quantity` a line, for the version that is being made. A released version's file stays as it is: its frozen build is held to it. */
const kept = readFileSync(new URL(`../../../../server/reference/golden/${referenceVersion}.sha256`, import.meta.url), 'utf8').trim().split('\n')
const program = fileURLToPath(new URL('../../../fixtures/marking/golden.ts', import.meta.url))
const root = fileURLToPath(new URL('../../../../', import.meta.url))

describe('seeded judgements', () => {
  it('have the digests that are kept for this version: when a released one changes, the version changes', () => {
    expect(goldenLines()).toEqual(kept)
  }, 120_000)
  // an engine that compiles nothing, or everything at once, is slow: every fifth quantity, and all functions that they stand on
  it.each([[['--jitless']], [['--always-turbofan', '--no-lazy']]])('have the same bits in an engine with %s', async (flags) => {
    const { stdout } = await promisify(execFile)(process.execPath, [...flags, '--import', 'tsx', program, '5'], { cwd: root, timeout: 280_000 })
    expect(stdout.trim().split('\n')).toEqual(kept.filter((_line, at) => at % 5 === 0 || at === kept.length - 1))
  }, 300_000)
  it('are 5,000 and more', () => expect((kept.length - 1) * judgementsEach).toBeGreaterThanOrEqual(5000))
})
