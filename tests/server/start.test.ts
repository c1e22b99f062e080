import { spawn, spawnSync } from 'node:child_process'
import { existsSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { createServer, type AddressInfo } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import SQLite from 'better-sqlite3'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { openDatabase } from '../../server/db/open'

const root = fileURLToPath(new URL('../..', import.meta.url))
let folder: string
beforeEach(() => { folder = mkdtempSync(join(tmpdir(), 'tetherhouse-start-')) })
afterEach(() => rmSync(folder, { recursive: true, force: true }))

const freePort = () => new Promise<number>((resolve) => {
  const probe = createServer().listen(0, '127.0.0.1', () => {
    const { port } = probe.address() as AddressInfo
    probe.close(() => resolve(port))
  })
})

/** Starts and waits for its end: for what is refused. */
async function refused(env: Record<string, string>) {
  const done = spawnSync(process.execPath, ['server/cli/start.mjs'], { cwd: root, env: { PATH: process.env.PATH, HOME: process.env.HOME, PORT: String(await freePort()), DEMO: '0', DATA_DIR: folder, ...env }, encoding: 'utf8', timeout: 60_000 })
  return { code: done.status, lines: done.stderr.trim().split('\n'), said: done.stderr, out: done.stdout }
}

describe('a start that cannot be', () => {
  it('says that the port is taken, and what to do', async () => {
    const taken = createServer().listen(0, '127.0.0.1')
    await new Promise(resolve => taken.once('listening', resolve))
    const { port } = taken.address() as AddressInfo
    const { code, lines } = await refused({ PORT: String(port) })
    taken.close()
    expect([code, lines.length]).toEqual([1, 1])
    expect(lines[0]).toMatch(/^Port \d+ on 127\.0\.0\.1 is taken\..*PORT/)
  })

  it('says that the data folder cannot be written, and makes nothing', async () => {
    const file = join(folder, 'a-file')
    writeFileSync(file, '')
    for (const dataDir of [join(file, 'below'), '/proc/nothing-can-be-here', file]) {
      const { code, lines } = await refused({ DATA_DIR: dataDir })
      expect([code, lines.length]).toEqual([1, 1])
      expect(lines[0]).toContain('cannot be written')
      expect(lines[0]).toContain('DATA_DIR')
    }
    expect(readdirSync(folder)).toEqual(['a-file'])
  })

  it('refuses a moved clock outside of tests, and anywhere but on a loopback host', async () => {
    const now = join(folder, 'now')
    writeFileSync(now, '2026-10-14T16:00:00Z')
    const settings: Record<string, string>[] = [{}, { NODE_ENV: 'production' }, { NODE_ENV: 'test', HOST: '0.0.0.0' }]
    for (const env of settings) {
      const { code, lines } = await refused({ NOW_FILE: now, ...env })
      expect([code, lines.length]).toEqual([1, 1])
      expect(lines[0]).toContain('NOW_FILE')
    }
  })

  it('refuses a port that is none', async () => {
    const { code, lines } = await refused({ PORT: 'three' })
    expect([code, lines.length]).toEqual([1, 1])
  })

  it('refuses a database of a newer version and leaves it as it was', async () => {
    const made = await openDatabase(folder)
    made.raw.prepare('insert into kysely_migration (name, timestamp) values (\'9999_later\', \'2030\')').run()
    await made.close()
    const before = readFileSync(join(folder, 'main.db'))
    const { code, lines } = await refused({})
    expect(code).toBe(1)
    expect(lines.at(-1)).toContain('newer version')
    expect(readFileSync(join(folder, 'main.db')).equals(before)).toBe(true)
  })

  it('says that a file is not a database of ours', async () => {
    writeFileSync(join(folder, 'main.db'), 'hello')
    const { code, lines } = await refused({})
    expect([code, lines.length]).toEqual([1, 1])
    expect(lines[0]).toContain('is not a database')
  })
})

describe('a second start', () => {
  it('installs and builds nothing, keeps secret and data, and ends cleanly', async () => {
    const port = await freePort()
    const run = async () => {
      const child = spawn(process.execPath, ['server/cli/start.mjs'], { cwd: root, env: { PATH: process.env.PATH, HOME: process.env.HOME, PORT: String(port), DEMO: '0', DATA_DIR: folder }, stdio: ['ignore', 'pipe', 'pipe'] })
      let said = ''
      child.stdout.on('data', (text: Buffer) => { said += text.toString() })
      child.stderr.on('data', (text: Buffer) => { said += text.toString() })
      const until = Date.now() + 60_000
      while (!/^ready /m.test(said) && Date.now() < until) await new Promise(resolve => setTimeout(resolve, 50))
      const ready = await fetch(`http://127.0.0.1:${port}/readyz`)
      child.kill('SIGTERM')
      const code = await new Promise(resolve => child.once('exit', resolve))
      return { said, ready: ready.status, code }
    }
    const first = await run()
    const secret = readFileSync(join(folder, 'secret'), 'utf8')
    const raw = new SQLite(join(folder, 'main.db'))
    raw.prepare('insert into installation (key, value_json) values (\'kept\', \'1\')').run()
    raw.close()
    const second = await run()
    expect([first.ready, second.ready, first.code, second.code]).toEqual([200, 200, 0, 0])
    expect(second.said).toContain(`ready http://127.0.0.1:${port}\n`)
    expect(second.said).not.toMatch(/installing|building/)
    expect(readFileSync(join(folder, 'secret'), 'utf8')).toBe(secret)
    const again = new SQLite(join(folder, 'main.db'), { readonly: true })
    expect(again.prepare('select count(*) from installation where key = \'kept\'').pluck().get()).toBe(1)
    again.close()
    expect(existsSync(join(folder, 'secret'))).toBe(true)
  })
})
