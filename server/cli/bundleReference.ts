import { createHash } from 'node:crypto'
import { existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { build } from 'esbuild'
import { referenceVersion } from '../../shared/marking/version'

export interface BundledReference { bundle: string, goldenSha256: string }

/**
 * Makes one file of the judge and all it reads: no clock, no input or output, no import left. Its SHA-256 is its name.
 * Paths in it are relative to the repository, so that the same sources give the same bytes wherever they lie.
 */
export async function bundleReference(root: string): Promise<BundledReference> {
  const made = await build({
    absWorkingDir: root,
    entryPoints: ['shared/marking/judge.ts'],
    bundle: true,
    write: false,
    platform: 'neutral',
    target: 'es2022',
    format: 'esm',
    charset: 'utf8',
    legalComments: 'none',
    alias: { '#shared': join(root, 'shared') },
    logLevel: 'warning',
  })
  const bundle = made.outputFiles[0]?.text
  if (bundle === undefined) throw new Error('The judge could not be bundled.')
  return { bundle, goldenSha256: goldenOf(root) }
}

/** The SHA-256 of the file of seeded judgements that the repository keeps for this version; 64 zeros where none is kept yet. */
function goldenOf(root: string): string {
  const file = join(root, `server/reference/golden/${referenceVersion}.sha256`)
  return existsSync(file) ? createHash('sha256').update(readFileSync(file)).digest('hex') : '0'.repeat(64)
}
