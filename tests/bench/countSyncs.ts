import { attachTracer } from '../fixtures/tracer'
import { ClassAtWork } from './classAtWork'
import type { Round } from './ratio'

/** Syncs (fsync and fdatasync, counted from outside) and acknowledged submissions over HTTP, round by round. What the server syncs by itself meanwhile counts too. */
export async function countSyncs(clients: number, { times, rounds, entry }: { times: number, rounds: number, entry?: string | undefined }): Promise<Round[]> {
  const atWork = await ClassAtWork.of(clients, entry)
  try {
    await atWork.handIn(clients, 1)
    const counted: Round[] = []
    while (counted.length < rounds) {
      const tracer = await attachTracer(atWork.server.pid, { calls: ['fsync', 'fdatasync'] })
      const denominator = await atWork.handIn(clients, times)
      const syncs = await tracer.stop()
      if (syncs.length === 0) throw new Error('Not one sync was counted: nothing was measured.')
      counted.push({ numerator: syncs.length, denominator })
    }
    return counted
  }
  finally {
    await atWork.close()
  }
}
