import { spawnSync } from 'node:child_process'
import { cpSync, mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'

const root = fileURLToPath(new URL('../..', import.meta.url))

/** A demo department made once for this process; each run of a fault gets a copy of its own. */
let made: string | undefined

export function demoWorld(): string {
  if (made) return made
  const dir = mkdtempSync(join(tmpdir(), 'tetherhouse-demo-'))
  const seeded = spawnSync(process.execPath, ['--import', 'tsx', join(root, 'server/cli/seed.ts')], { cwd: root, env: { ...process.env, DATA_DIR: dir, DEMO: '1' }, encoding: 'utf8' })
  if (seeded.status !== 0) throw new Error(`The demo could not be made:\n${seeded.stdout}\n${seeded.stderr}`)
  process.on('exit', () => rmSync(dir, { recursive: true, force: true }))
  made = dir
  return dir
}

export function copyOf(world: string): string {
  const dir = mkdtempSync(join(tmpdir(), 'tetherhouse-fault-'))
  cpSync(world, dir, { recursive: true })
  return dir
}
