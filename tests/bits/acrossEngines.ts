// node --import tsx tests/bits/acrossEngines.ts [22 24]: the seeded judgements on other majors of Node.js, bit for bit.
// The engines come as npm packages into a temporary folder: some 100 MB, so this is a run of its own.
import { spawnSync } from 'node:child_process'
import { mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs'
import { arch, platform, tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { referenceVersion } from '../../shared/marking/version'

const root = fileURLToPath(new URL('../../', import.meta.url))
const kept = readFileSync(join(root, `server/reference/golden/${referenceVersion}.sha256`), 'utf8')
const majors = process.argv.length > 2 ? process.argv.slice(2) : ['22', '24']

let differing = 0, missing = 0
for (const major of majors) {
  const folder = mkdtempSync(join(tmpdir(), 'tetherhouse-engine-'))
  try {
    const name = `node-${platform() === 'win32' ? 'win' : platform()}-${arch()}@${major}`
    const packed = spawnSync('npm', ['pack', '--silent', name], { cwd: folder, encoding: 'utf8' })
    const file = readdirSync(folder).find(one => one.endsWith('.tgz'))
    if (packed.status !== 0 || file === undefined || spawnSync('tar', ['xzf', file], { cwd: folder }).status !== 0) {
      missing++
      console.log(`Node.js ${major}: ${name} could not be had`)
      continue
    }
    const engine = join(folder, 'package/bin/node')
    const version = spawnSync(engine, ['--version'], { encoding: 'utf8' }).stdout.trim()
    const run = spawnSync(engine, ['--import', 'tsx', join(root, 'tests/fixtures/marking/golden.ts')], { cwd: root, encoding: 'utf8', maxBuffer: 1 << 26 })
    const lines = run.stdout.split('\n'), expected = kept.split('\n')
    const others = expected.filter((line, at) => line !== lines[at])
    if (others.length > 0) differing++
    console.log(`Node.js ${version}: ${others.length === 0 ? `the same bits in ${expected.length - 1} digests` : `${others.length} digests differ, the first is ${others[0] ?? ''}`}`)
  }
  finally {
    rmSync(folder, { recursive: true, force: true })
  }
}
console.log(`engines=${majors.length} differing=${differing} missing=${missing}`)
process.exit(differing === 0 && missing === 0 ? 0 : 1)
