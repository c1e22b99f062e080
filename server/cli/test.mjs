// `npm test`: installs what the tests need, runs everything, and closes with one plain line.
//   npm test                    all of it
//   npm test -- --only unit     one part: lint rooms types unit integration server browser pages (the last belongs to browser)
import { existsSync, mkdirSync, mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { spawnSync } from 'node:child_process'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { assertNode, installEnvironment, stop } from './check.mjs'
import { buildWhenNeeded, installWhenNeeded, root } from './prepare.mjs'

const isCi = process.env.CI === 'true'
const onlyAt = process.argv.indexOf('--only')
const only = onlyAt === -1 ? null : process.argv[onlyAt + 1]
const wants = part => only === null || only === part

let passed = 0
let failed = 0
let skipped = 0
/** What failed, told again at the end: the beginning of a long run is far away by then. */
const fallen = []

const bin = name => join(root, 'node_modules/.bin', name)
const say = line => process.stdout.write(`${line}\n`)

assertNode()
if (isCi && !existsSync(join(root, '../shared'))) stop('../shared is absent: under CI=true its checks must run.')
installWhenNeeded()

if (wants('lint')) check('lint', [bin('eslint'), '.'])
if (wants('rooms')) check('rooms', [bin('depcruise'), 'shared', 'server', 'pages', 'components', 'composables', 'stores', 'layouts', 'modules', 'app.vue'])
if (wants('types')) check('types', [bin('nuxt'), 'typecheck'])
if (wants('unit')) suite('unit')
if (wants('integration')) suite('integration')
if (wants('server') || wants('browser') || only === 'pages') {
  const tools = findTools()
  buildWhenNeeded()
  tools.DEMO_WORLD = demoWorld()
  if (wants('server')) suite('server', tools)
  if (wants('browser')) suite('browser', tools)
  if (wants('browser') || only === 'pages') suite('pages', tools)
  rmSync(tools.DEMO_WORLD, { recursive: true, force: true })
}

say('')
for (const name of fallen) say(`failed: ${name}`)
say(`${passed} passed, ${failed} failed${skipped > 0 ? `, ${skipped} skipped` : ''}`)
process.exit(failed === 0 && passed > 0 ? 0 : 1)

/** A check that passes or fails as a whole. */
function check(name, command) {
  say(`\n── ${name}`)
  const started = Date.now()
  const done = spawnSync(process.execPath, command, { cwd: root, env: installEnvironment(), encoding: 'utf8', maxBuffer: 1 << 27 })
  if (done.status === 0) passed++
  else {
    failed++
    fallen.push(name)
    say(`${done.stdout}\n${done.stderr}`)
  }
  say(`${name} ${done.status === 0 ? 'is clean' : 'fails'} (${seconds(started)})`)
}

/** One of vitest's projects; its tests are counted one by one. */
function suite(name, extra = {}) {
  say(`\n── ${name}`)
  const started = Date.now()
  const folder = join(root, 'node_modules/.tetherhouse')
  const file = join(folder, `${name}.json`)
  mkdirSync(folder, { recursive: true })
  rmSync(file, { force: true })
  const done = spawnSync(process.execPath, [bin('vitest'), 'run', '--project', name, '--reporter=default', '--reporter=json', `--outputFile.json=${file}`, '--passWithNoTests'], {
    cwd: root, env: { ...installEnvironment(), ...extra, NODE_ENV: 'test' }, stdio: ['ignore', 'inherit', 'inherit'],
  })
  const report = existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : null
  if (report) {
    passed += report.numPassedTests
    failed += report.numFailedTests
    skipped += report.numPendingTests + report.numTodoTests
    // A file that could not even be loaded has no failed test of its own.
    const broken = report.testResults.filter(result => result.status === 'failed' && result.assertionResults.every(test => test.status !== 'failed')).length
    failed += broken
    for (const result of report.testResults) {
      const tests = result.assertionResults.filter(test => test.status === 'failed')
      for (const test of tests) fallen.push(`${result.name.replace(`${root}/`, '')}: ${test.fullName}\n    ${String(test.failureMessages?.[0] ?? '').split('\n').slice(0, 4).join('\n    ')}`)
      if (tests.length === 0 && result.status === 'failed') fallen.push(`${result.name.replace(`${root}/`, '')}: ${String(result.message).slice(0, 400)}`)
    }
    if (done.status !== 0 && report.numFailedTests + broken === 0) failed++
  }
  else failed++
  say(`${name} took ${seconds(started)}`)
}

/** The demo, made once: tests that walk through a lived-in department take copies of it. */
function demoWorld() {
  const dir = mkdtempSync(join(tmpdir(), 'tetherhouse-demo-'))
  const made = spawnSync(process.execPath, ['--import', 'tsx', join(root, 'server/cli/seed.ts')], { cwd: root, env: { ...process.env, DATA_DIR: dir, DEMO: '1' }, encoding: 'utf8' })
  if (made.status !== 0) stop(`The demo could not be made:\n${made.stdout}\n${made.stderr}`)
  return dir
}

function seconds(started) {
  return `${((Date.now() - started) / 1000).toFixed(0)} s`
}

/** Chromium and strace: those that are here, else Debian's where apt-get may be used without asking. */
function findTools() {
  const here = command => spawnSync('sh', ['-c', `command -v ${command}`], { encoding: 'utf8' }).stdout.trim()
  const missing = [...(process.env.CHROMIUM || here('chromium') ? [] : ['chromium']), ...(here('strace') ? [] : ['strace'])]
  if (missing.length > 0 && here('apt-get') && process.getuid?.() === 0) {
    say(`\ninstalling ${missing.join(' and ')} from Debian's packages, since the browser and fault tests need them`)
    const apt = args => spawnSync('apt-get', args, { env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' }, encoding: 'utf8' })
    apt(['update', '-qq'])
    const done = apt(['install', '-y', '-qq', '--no-install-recommends', ...missing])
    if (done.status !== 0) say(`apt-get did not finish: ${String(done.stderr).trim().split('\n').at(-1)}`)
  }
  const chromium = process.env.CHROMIUM || here('chromium')
  if (!chromium) {
    if (isCi) {
      say('No Chromium: under CI=true that is a failure.')
      failed++
    }
    else say('No Chromium: browser tests are skipped, and counted.')
  }
  return { ...(chromium ? { CHROMIUM: chromium } : {}), ...(here('strace') ? { STRACE: here('strace') } : {}) }
}
