import { createHash } from 'node:crypto'
import { existsSync, readdirSync, readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { describe, expect, it } from 'vitest'
import type { judgeStep } from '#shared/marking/judge'
import { referenceVersion } from '#shared/marking/version'
import { bundleReference } from '../../../server/cli/bundleReference'
import { goldenLines } from '../../fixtures/marking/golden'

const folder = fileURLToPath(new URL('../../../server/reference/', import.meta.url))
const frozen = readdirSync(folder).filter(name => name.startsWith('judge-'))
const list = existsSync(`${folder}frozen.sha256`) ? readFileSync(`${folder}frozen.sha256`, 'utf8').trim().split('\n') : []

describe('frozen builds of the judge', () => {
  it('are the very files that were frozen', () => {
    expect(frozen.map(name => `${createHash('sha256').update(readFileSync(folder + name)).digest('hex')} ${name}`).sort()).toEqual([...list].sort())
  })
  it.runIf(frozen.includes(`judge-${referenceVersion}.mjs`))('that of this version is what the sources make, and judges alike', async () => {
    const file = `${folder}judge-${referenceVersion}.mjs`
    expect((await bundleReference(fileURLToPath(new URL('../../../', import.meta.url)))).bundle === readFileSync(file, 'utf8'), `the judge changed since ${referenceVersion} was frozen: raise referenceVersion`).toBe(true)
    const build: { judgeStep: typeof judgeStep } = await import(file)
    const kept = readFileSync(`${folder}golden/${referenceVersion}.sha256`, 'utf8').trim().split('\n')
    expect(goldenLines(5, build.judgeStep)).toEqual(kept.filter((_line, at) => at % 5 === 0 || at === kept.length - 1))
  }, 120_000)
})
