// What a machine needs before anything is installed: said in one line each, by name.
import { existsSync } from 'node:fs'
import { spawnSync } from 'node:child_process'
import { dirname, join } from 'node:path'

export const supportedNode = '20.19.0 or a later 20'

/** One line that says what and what to do, then the end. */
export function stop(line) {
  process.stderr.write(`${line}\n`)
  process.exit(1)
}

export function assertNode() {
  const [major, minor] = process.versions.node.split('.').map(Number)
  if (major !== 20 || minor < 19) stop(`Tetherhouse runs on Node.js ${supportedNode}; this is ${process.versions.node}. Install it and start again.`)
}

const answers = (command, args = ['--version']) => spawnSync(command, args, { stdio: 'ignore' }).status === 0

/** Where node-gyp finds Node's own headers; without them it would fetch them from elsewhere. */
export function headersPrefix() {
  const given = process.env.npm_config_nodedir
  return [given, dirname(dirname(process.execPath)), '/usr', '/usr/local'].find(prefix => prefix && existsSync(join(prefix, 'include/node/node.h')))
}

/** The tools that compile the database's native part. Named together, so that one visit to the package manager is enough. */
export function assertBuildTools() {
  const missing = [
    ...(answers('npm') ? [] : ['npm']),
    ...(answers('python3') ? [] : ['python3']),
    ...(answers('make') ? [] : ['make']),
    ...(answers('g++') ? [] : ['g++']),
    ...(headersPrefix() ? [] : ['Node.js headers (include/node/node.h)']),
  ]
  if (missing.length > 0) stop(`Missing: ${missing.join(', ')}. Install ${missing.length === 1 ? 'it' : 'them'} and start again; nothing was changed.`)
}

/** For `npm ci`: compile the database from its source with the headers that are here, contact nothing but the registry. */
export function installEnvironment() {
  return {
    ...process.env,
    npm_config_build_from_source: 'true',
    npm_config_nodedir: headersPrefix() ?? '',
    npm_config_update_notifier: 'false',
    npm_config_audit: 'false',
    npm_config_fund: 'false',
    NUXT_TELEMETRY_DISABLED: '1',
    DO_NOT_TRACK: '1',
  }
}
