// Installing and building, each only when something changed since the last time.
import { createHash } from 'node:crypto'
import { existsSync, mkdirSync, readFileSync, readdirSync, rmSync, statSync, writeFileSync } from 'node:fs'
import { spawnSync } from 'node:child_process'
import { join, relative } from 'node:path'
import { assertBuildTools, installEnvironment, stop } from './check.mjs'

export const root = new URL('../../', import.meta.url).pathname.replace(/\/$/, '')
const stamp = name => join(root, 'node_modules/.tetherhouse', name)

function keep(name, value) {
  mkdirSync(join(root, 'node_modules/.tetherhouse'), { recursive: true })
  writeFileSync(stamp(name), value)
}
const kept = name => existsSync(stamp(name)) ? readFileSync(stamp(name), 'utf8') : null

const fileDigest = file => createHash('sha256').update(readFileSync(file)).digest('hex')

/** From the lockfile, when it or the Node.js version is another than last time. */
export function installWhenNeeded() {
  const wanted = `${fileDigest(join(root, 'package-lock.json'))} ${fileDigest(join(root, 'package.json'))} ${process.version}`
  if (kept('installed') === wanted) return false
  assertBuildTools()
  process.stdout.write('installing packages from the lockfile (a few minutes the first time)\n')
  const done = spawnSync('npm', ['ci', '--no-progress', '--loglevel=error'], { cwd: root, env: installEnvironment(), stdio: ['ignore', 'ignore', 'inherit'] })
  if (done.status !== 0) stop('npm ci did not finish; what it said stands above. Nothing else was changed.')
  keep('installed', wanted)
  return true
}

const sources = ['app.vue', 'error.vue', 'nuxt.config.ts', 'tailwind.config.ts', 'formkit.config.ts', 'package-lock.json', 'assets', 'components', 'composables', 'content', 'layouts', 'middleware', 'modules', 'pages', 'plugins', 'public', 'server', 'shared', 'stores']

function* filesBelow(path) {
  if (!existsSync(path)) return
  if (!statSync(path).isDirectory()) return yield path
  for (const entry of readdirSync(path).sort()) yield* filesBelow(join(path, entry))
}

/** A digest of everything that goes into the build. */
export function sourcesDigest() {
  const digest = createHash('sha256').update(process.version)
  for (const source of sources) for (const file of filesBelow(join(root, source))) digest.update(`${relative(root, file)}\0${fileDigest(file)}\n`)
  return digest.digest('hex')
}

export function buildWhenNeeded() {
  const wanted = sourcesDigest()
  if (kept('built') === wanted && existsSync(join(root, '.output/server/index.mjs'))) return false
  process.stdout.write('building (under a minute)\n')
  rmSync(join(root, '.output'), { recursive: true, force: true })
  const done = spawnSync(process.execPath, [join(root, 'node_modules/nuxt/bin/nuxt.mjs'), 'build'], { cwd: root, env: { ...installEnvironment(), NODE_ENV: 'production' }, encoding: 'utf8', maxBuffer: 1 << 28 })
  if (done.status !== 0) {
    process.stderr.write(`${done.stdout}\n${done.stderr}\n`)
    stop('The build did not finish; what it said stands above.')
  }
  keep('built', wanted)
  return true
}
