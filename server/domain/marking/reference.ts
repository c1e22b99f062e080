import { createHash } from 'node:crypto'
import type { Judgement, ReadAnswer, StepQuestion } from '#shared/marking/types'
import type { Write } from '../../db/writer'

/** A build of the judge: what it does, the text that it is, and the name that its text gives it. */
export interface Reference {
  digest: Buffer
  version: string
  bundle: string
  goldenSha256: Buffer
  judgeStep: (question: StepQuestion, answer: ReadAnswer) => Judgement
}

/** The interface between the product and a build: raised when `judgeStep` takes or gives something else. */
export const judgeInterface = 1

interface JudgeModule { judgeStep: Reference['judgeStep'], referenceVersion: string }

export const bundleDigest = (bundle: string): Buffer => createHash('sha256').update(bundle, 'utf8').digest()

/** Brings a bundle to life. It judges with its own text and nothing else, so the digest names exactly what judged. */
export async function loadReference(bundle: string, goldenSha256: string): Promise<Reference> {
  const module: unknown = await import(/* @vite-ignore */ `data:text/javascript;base64,${Buffer.from(bundle, 'utf8').toString('base64')}`)
  if (!isJudge(module)) throw new Error('The reference build has no judge of this interface.')
  return { digest: bundleDigest(bundle), version: module.referenceVersion, bundle, goldenSha256: Buffer.from(goldenSha256, 'hex'), judgeStep: module.judgeStep }
}

function isJudge(module: unknown): module is JudgeModule {
  return typeof module === 'object' && module !== null && 'judgeStep' in module && typeof module.judgeStep === 'function' && 'referenceVersion' in module && typeof module.referenceVersion === 'string'
}

/** Keeps the build that judges from now on; a build that is kept already stays as it is. */
export async function keepReference(write: Write, reference: Reference, now: number): Promise<void> {
  await write(trx => trx.insertInto('reference_build').values({
    digest: reference.digest, version: reference.version, interface: judgeInterface, bundle: reference.bundle, golden_sha256: reference.goldenSha256, added_at: now,
  }).onConflict(conflict => conflict.column('digest').doNothing()).execute())
}
