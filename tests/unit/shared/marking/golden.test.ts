import { execFile } from 'node:child_process'
import { readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { promisify } from 'node:util'
import { describe, expect, it } from 'vitest'
import { referenceVersion } from '#shared/marking/version'
import { goldenDigest } from '../../../fixtures/marking/golden'

/** `digest version` a line, the newest first. A line once released stays. */
const lines = readFileSync(new URL('../../../../server/reference/golden.sha256', import.meta.url), 'utf8').trim().split('\n').map(line => line.split(' '))
const program = fileURLToPath(new URL('../../../fixtures/marking/golden.ts', import.meta.url))
const root = fileURLToPath(new URL('../../../../', import.meta.url))

describe('5,000 seeded judgements', () => {
  it('have the digest that is kept for this version: when they change, the version changes', () => {
    const [digest, version] = lines[0] ?? []
    expect(version, 'the newest line of server/reference/golden.sha256 is that of shared/marking/version.ts').toBe(referenceVersion)
    expect(goldenDigest(), 'judgements changed: raise referenceVersion and add a line to server/reference/golden.sha256').toBe(digest)
  }, 60_000)
  it('keep one digest a version', () => {
    expect(new Set(lines.map(([, version]) => version)).size).toBe(lines.length)
    for (const [digest] of lines) expect(digest).toMatch(/^[0-9a-f]{64}$/)
  })
  it.each([[['--jitless']], [['--always-turbofan', '--no-lazy']]])('have the same bits in an engine with %s', async (flags) => {
    const { stdout } = await promisify(execFile)(process.execPath, [...flags, '--import', 'tsx', program], { cwd: root, timeout: 240_000 })
    expect(stdout).toBe(lines[0]?.[0])
  }, 240_000)
})
