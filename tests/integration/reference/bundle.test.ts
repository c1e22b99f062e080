import { fileURLToPath } from 'node:url'
import { build } from 'esbuild'
import { expect, it } from 'vitest'
import { judgeStep } from '#shared/marking/judge'
import type { Judgement, ReadAnswer, StepQuestion } from '#shared/marking/types'
import { reading, setS, stepOf } from '../../fixtures/marking/ask'

interface Build { judgeStep: (question: StepQuestion, answer: ReadAnswer) => Judgement, referenceVersion: string }
const isBuild = (module: unknown): module is Build => typeof module === 'object' && module !== null && 'judgeStep' in module && typeof module.judgeStep === 'function'

it('the judge becomes one neutral file without imports, clock or chance, and judges the same', async () => {
  const made = await build({ entryPoints: [fileURLToPath(new URL('../../../shared/marking/judge.ts', import.meta.url))], bundle: true, write: false, platform: 'neutral', format: 'esm', target: 'es2022' })
  const text = made.outputFiles[0]?.text ?? ''
  expect(text).not.toMatch(/^\s*import\b|\brequire\(|Date\.now|new Date|Math\.random|\bprocess\.[a-zA-Z]|fetch\(/m)
  const module: unknown = await import(/* @vite-ignore */ `data:text/javascript;base64,${Buffer.from(text).toString('base64')}`)
  if (!isBuild(module)) throw new Error('no judge in it')
  const question = stepOf('lapse-rate-least-squares', setS), answer = reading('lapse-rate-least-squares', '10.40 K/km')
  expect(JSON.stringify(module.judgeStep(question, answer))).toBe(JSON.stringify(judgeStep(question, answer)))
})
