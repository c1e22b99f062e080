/**
 * What happens in the demo, each at its instant. Things are told in any order and done in the order of time, so that
 * the ledger reads as it would have been written.
 */
export class Timeline {
  private readonly events: { at: number, order: number, work: (now: number) => Promise<unknown> }[] = []
  private done = Number.NEGATIVE_INFINITY

  constructor(private readonly until: number) {}

  /** What lies after the day of seeding has not happened yet and is left out. */
  at(instant: number, work: (now: number) => Promise<unknown>): void {
    if (instant > this.until) return
    if (instant < this.done) throw new Error(`An event of ${new Date(instant).toISOString()} was told after ${new Date(this.done).toISOString()} had passed.`)
    this.events.push({ at: instant, order: this.events.length, work })
  }

  /** Does everything; what an event tells in turn is taken in, as long as it is not in the past. */
  async run(): Promise<number> {
    let count = 0
    while (this.events.length > 0) {
      this.events.sort((a, b) => a.at - b.at || a.order - b.order)
      const next = this.events.shift()
      if (!next) break
      this.done = next.at
      await next.work(next.at)
      count++
    }
    return count
  }
}
