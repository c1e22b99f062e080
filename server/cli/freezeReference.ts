import { createHash } from 'node:crypto'
import { existsSync, readFileSync, writeFileSync } from 'node:fs'
import { dirname, join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { referenceVersion } from '../../shared/marking/version'
import { bundleReference } from './bundleReference'

/**
 * node --import tsx server/cli/freezeReference.ts: keeps the judge of this version as one file, once and for all, when a version is released.
 * Last line: version=… sha256=…; exit code 0 when the file is there with this very text. A version that is frozen is never frozen otherwise:
 * raise `referenceVersion` first.
 */
const root = join(dirname(fileURLToPath(import.meta.url)), '../..')
const file = join(root, `server/reference/judge-${referenceVersion}.mjs`)
const list = join(root, 'server/reference/frozen.sha256')

const { bundle } = await bundleReference(root)
const digest = createHash('sha256').update(bundle).digest('hex')
if (existsSync(file) && readFileSync(file, 'utf8') !== bundle) {
  console.error(`Version ${referenceVersion} is frozen already, and its judge was another: raise referenceVersion in shared/marking/version.ts.`)
  process.exitCode = 1
}
else {
  if (!existsSync(file)) {
    writeFileSync(file, bundle)
    writeFileSync(list, `${existsSync(list) ? readFileSync(list, 'utf8') : ''}${digest} judge-${referenceVersion}.mjs\n`)
  }
  console.log(`version=${referenceVersion} sha256=${digest}`)
}
