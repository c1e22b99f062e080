import { execFile } from 'node:child_process'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { promisify } from 'node:util'
import { afterAll, expect, it } from 'vitest'

const run = promisify(execFile)
const scratch = mkdtempSync(join(tmpdir(), 'tetherhouse-memory-'))
afterAll(() => rmSync(scratch, { recursive: true, force: true }))

/** Peak resident memory of a process of its own that imports so many rows, in MiB. */
async function peakMiB(rows: number, keepsAll = false): Promise<number> {
  const { stdout } = await run(process.execPath, ['--import', 'tsx', fileURLToPath(new URL('./importMany.ts', import.meta.url)), String(rows), join(scratch, `${rows} ${keepsAll}`), ...(keepsAll ? ['keep'] : [])])
  return Number(/peak=(\d+)/.exec(stdout)![1]) / 1024
}

it('memory stays flat: ten times the rows take at most 32 MiB more (P3)', async () => {
  const [small, large] = [await peakMiB(60_000), await peakMiB(600_000)]
  expect(large - small).toBeLessThanOrEqual(32)
}, 120_000)

it('and an import that kept its rows would be seen', async () => {
  const [small, large] = [await peakMiB(60_000, true), await peakMiB(600_000, true)]
  expect(large - small).toBeGreaterThan(32)
}, 120_000)
