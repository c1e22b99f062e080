// `npm start`: install and build when needed, migrate, make the demo on an empty database, serve, say where.
import { randomBytes } from 'node:crypto'
import { accessSync, constants, existsSync, mkdirSync, readFileSync, statSync, writeFileSync } from 'node:fs'
import { createServer } from 'node:net'
import { spawn, spawnSync } from 'node:child_process'
import { dirname, join, resolve } from 'node:path'
import { assertNode, stop } from './check.mjs'
import { buildWhenNeeded, installWhenNeeded, root } from './prepare.mjs'

const isDev = process.argv.includes('--dev')
const host = process.env.HOST || '127.0.0.1'
const port = Number(process.env.PORT || 3000)
const dataDir = resolve(process.env.DATA_DIR || join(root, '.data'))
const isHere = name => name === 'localhost' || name === '::1' || name === '[::1]' || /^127\.\d+\.\d+\.\d+$/.test(name)
const isLoopback = isHere(host)
// Behind a proxy the demo's sign-ins and its mail would be everybody's: there it must be asked for.
const reachedAt = URL.canParse(process.env.PUBLIC_ORIGIN ?? '') ? new URL(process.env.PUBLIC_ORIGIN).hostname : host
const isDemo = process.env.DEMO === undefined || process.env.DEMO === '' ? isLoopback && isHere(reachedAt) : process.env.DEMO === '1'

assertNode()
if (!Number.isInteger(port) || port < 1 || port > 65_535) stop(`PORT is ${process.env.PORT}: give a number from 1 to 65535.`)
if (process.env.NOW_FILE && !(process.env.NODE_ENV === 'test' && isLoopback)) stop('NOW_FILE moves the clock and is obeyed only with NODE_ENV=test on a loopback host. Unset it and start again.')
assertWritable(dataDir)
await assertPortFree()
installWhenNeeded()
if (!isDev) buildWhenNeeded()

const secret = keptSecret()
const origin = `http://${host.includes(':') ? `[${host}]` : host}:${port}`
const publicOrigin = (process.env.PUBLIC_ORIGIN || origin).replace(/\/$/, '')
const environment = {
  ...process.env,
  HOST: host, PORT: String(port), NITRO_HOST: host, NITRO_PORT: String(port), DATA_DIR: dataDir, DEMO: isDemo ? '1' : '0',
  AUTH_SECRET: secret, AUTH_ORIGIN: `${publicOrigin}/api/auth`, NEXTAUTH_URL: `${publicOrigin}/api/auth`,
  NODE_ENV: process.env.NODE_ENV || (isDev ? 'development' : 'production'),
  NUXT_TELEMETRY_DISABLED: '1',
}

script('migrate')
if (isDemo) script('seed', ['--when-empty'])
serve()

/** Runs one of our TypeScript commands; it says in one line what is wrong, if anything is. */
function script(name, args = []) {
  const done = spawnSync(process.execPath, ['--import', 'tsx', join(root, `server/cli/${name}.ts`), ...args], { cwd: root, env: environment, stdio: ['ignore', 'ignore', 'inherit'] })
  if (done.status !== 0) process.exit(done.status ?? 1)
}

function assertWritable(dir) {
  try {
    // One folder at a time: a recursive mkdir never returns on some file systems that make no folders.
    for (const folder of missingFolders(dir)) mkdirSync(folder)
    if (!statSync(dir).isDirectory()) throw new Error('not a folder')
    accessSync(dir, constants.W_OK | constants.R_OK | constants.X_OK)
    // Root may pass the check above on a disk that is mounted read-only: only a write tells.
    const probe = join(dir, `.writable-${process.pid}`)
    writeFileSync(probe, '')
    spawnSync('rm', ['-f', probe])
  }
  catch (error) {
    stop(`The data folder ${dir} cannot be written (${error.code ?? error.message}). Make it writable, or name another with DATA_DIR.`)
  }
}

function missingFolders(dir) {
  return existsSync(dir) ? [] : [...missingFolders(dirname(dir)), dir]
}

function assertPortFree() {
  return new Promise((settled) => {
    const probe = createServer()
    probe.once('error', error => stop(error.code === 'EADDRINUSE'
      ? `Port ${port} on ${host} is taken. Stop what uses it, or name another with PORT.`
      : `Port ${port} on ${host} cannot be opened (${error.code}). Name another with PORT, or another HOST.`))
    probe.once('listening', () => probe.close(() => settled()))
    probe.listen(port, host)
  })
}

/** Made at the first start and kept with the data, readable by its owner only. */
function keptSecret() {
  if (process.env.AUTH_SECRET) return process.env.AUTH_SECRET
  const file = join(dataDir, 'secret')
  if (!existsSync(file)) writeFileSync(file, randomBytes(48).toString('base64url'), { mode: 0o600, flag: 'wx' })
  return readFileSync(file, 'utf8').trim()
}

function serve() {
  const command = isDev ? [join(root, 'node_modules/nuxt/bin/nuxt.mjs'), 'dev', '--port', String(port), '--host', host] : [join(root, '.output/server/index.mjs')]
  const server = spawn(process.execPath, command, { cwd: root, env: environment, stdio: ['ignore', isDev ? 'inherit' : 'pipe', 'inherit'] })
  server.stdout?.on('data', text => forward(String(text)))
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => server.kill(signal))
  server.on('exit', (code, signal) => process.exit(code ?? (signal ? 1 : 0)))
  void sayReady()
}

/** Request lines go on; the server's own greeting is said by us, once, when it is true. */
function forward(text) {
  if (!text.startsWith('Listening on')) process.stdout.write(text)
}

async function sayReady() {
  for (let waited = 0; waited < 120_000; waited += 100) {
    const answer = await fetch(`${origin}/readyz`).catch(() => null)
    if (answer?.ok) break
    await new Promise(later => setTimeout(later, 100))
  }
  process.stdout.write(`ready ${origin}\n`)
  if (!isDemo) return
  const demo = await fetch(`${origin}/api/demo`).then(answer => answer.ok ? answer.json() : null).catch(() => null)
  for (const person of demo?.people ?? []) process.stdout.write(`${person.email}  ${person.password}  ${person.name}: ${person.roles.join(', ')}\n`)
}
