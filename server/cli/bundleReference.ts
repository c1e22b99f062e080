import { existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { build } from 'esbuild'

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

/** The digest over the seeded judgements that this build gives, as the repository keeps it; 64 zeros where none is kept yet. */
function goldenOf(root: string): string {
  const file = join(root, 'server/reference/golden.sha256')
  const kept = existsSync(file) ? /^[0-9a-f]{64}/.exec(readFileSync(file, 'utf8'))?.[0] : undefined
  return kept ?? '0'.repeat(64)
}
