import { Worker } from 'node:worker_threads'
import type { Judgement, ReadAnswer, StepQuestion } from '#shared/marking/types'

export interface Asked { question: StepQuestion, answer: ReadAnswer }

/** A build that judges in a thread of its own, with a limit on memory: an old build can neither stall nor exhaust what runs now. */
export interface IsolatedJudge {
  judge: (asked: readonly Asked[]) => Promise<Judgement[]>
  end: () => Promise<void>
}

const memoryMb = 256

const program = `
import { parentPort, workerData } from 'node:worker_threads'
const { judgeStep } = await import(workerData.url)
parentPort.on('message', (asked) => {
  try { parentPort.postMessage({ judgements: asked.map(each => judgeStep(each.question, each.answer)) }) }
  catch (error) { parentPort.postMessage({ failure: String(error) }) }
})`

export function isolatedJudge(bundle: string): IsolatedJudge {
  const worker = new Worker(new URL(`data:text/javascript,${encodeURIComponent(program)}`), {
    workerData: { url: `data:text/javascript;base64,${Buffer.from(bundle, 'utf8').toString('base64')}` },
    resourceLimits: { maxOldGenerationSizeMb: memoryMb }, env: {}, execArgv: [],
  })
  let failed: Error | null = null
  let waiting: { resolve: (judgements: Judgement[]) => void, reject: (error: Error) => void } | null = null
  const fail = (error: Error) => {
    failed = error
    waiting?.reject(error)
    waiting = null
  }
  worker.on('message', (message: { judgements: Judgement[] } | { failure: string }) => {
    const asker = waiting
    waiting = null
    if ('failure' in message) asker?.reject(new Error(message.failure))
    else asker?.resolve(message.judgements)
  })
  worker.on('error', fail)
  worker.on('exit', code => fail(new Error(`The judge's thread ended (${code}).`)))
  return {
    judge: asked => new Promise((resolve, reject) => {
      if (failed) return reject(failed)
      waiting = { resolve, reject }
      worker.postMessage(asked)
    }),
    end: async () => {
      await worker.terminate()
    },
  }
}
