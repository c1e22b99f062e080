/** Work that comes round. `every` is the pause between the end of one turn and the start of the next. */
export interface Turn { everyMs: number, work: () => Promise<unknown>, onError?: (error: unknown) => void }

/** Runs each turn again and again, never twice at once, until stopped. */
export function startSchedule(turns: readonly Turn[]) {
  const timers = new Set<NodeJS.Timeout>()
  const running = new Set<Promise<unknown>>()
  let isStopping = false

  function plan(turn: Turn, afterMs: number): void {
    if (isStopping) return
    const timer = setTimeout(() => {
      timers.delete(timer)
      const one = turn.work().catch(error => turn.onError?.(error)).finally(() => {
        running.delete(one)
        plan(turn, turn.everyMs)
      })
      running.add(one)
    }, afterMs)
    timers.add(timer)
  }
  for (const turn of turns) plan(turn, Math.min(turn.everyMs, 500))

  return {
    async stop(withinMs = 5000): Promise<void> {
      isStopping = true
      for (const timer of timers) clearTimeout(timer)
      await Promise.race([Promise.allSettled([...running]), new Promise(resolve => setTimeout(resolve, withinMs).unref())])
    },
  }
}
