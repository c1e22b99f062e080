import type { RefusedRow } from '#shared/schemas/data'
import type { ObservationsWriter } from '../observations/chunks'

const rowsPerChunk = 5000
const longestText = 200

/** The rows that were not taken, kept in chunks as they come: a file of a million bad rows needs no more memory than one of ten. */
export class RefusedRows {
  count = 0
  readonly chunks: string[] = []
  /** The first few, for a message when nothing at all could be taken. */
  readonly first: RefusedRow[] = []
  private open: RefusedRow[] = []

  constructor(private readonly observations: ObservationsWriter | null) {}

  add(line: number, column: string, text: string, reason: string): void {
    const row = { line, column, text: text.length > longestText ? `${text.slice(0, longestText)}…` : text, reason }
    this.count += 1
    if (this.first.length < 20) this.first.push(row)
    if (!this.observations) return
    this.open.push(row)
    if (this.open.length >= rowsPerChunk) this.flush()
  }

  /** @returns the names of the chunks, in order */
  finish(): string[] {
    if (this.open.length > 0) this.flush()
    return this.chunks
  }

  private flush(): void {
    if (!this.observations) return
    this.chunks.push(this.observations.putChunk('refusals', Buffer.from(JSON.stringify(this.open))).sha256.toString('hex'))
    this.open = []
  }
}
