import { longestLine, RowSplitter } from './bytes'
import { guessLayout, sampleBytes, type Guess } from './layout'
import { unpacked } from './unpack'
import { UnreadableFile } from './unreadable'

/**
 * Looks through a whole file once before it is kept: is it text, are its lines lines, does it end where a row ends.
 * Gives the guess at its layout. Needs no more memory for a long file than for a short one.
 * @throws {UnreadableFile}
 */
export async function inspectFile(source: AsyncIterable<Buffer>, limits: { mostBytes: number, limitLabel: string }, name: string): Promise<Guess> {
  let head: Buffer[] | null = []
  let headBytes = 0
  let hasLineEnd = false
  let look: Look | null = null
  for await (const chunk of unpacked(source, limits)) {
    if (look) {
      look.push(chunk)
      continue
    }
    head!.push(chunk)
    headBytes += chunk.length
    hasLineEnd ||= chunk.includes(0x0A) || chunk.includes(0x0D)
    if (!hasLineEnd && headBytes > longestLine) throw new UnreadableFile('file_line_too_long', { line: 1, limit: '1 MiB' })
    if (headBytes >= sampleBytes && hasLineEnd) {
      look = new Look(Buffer.concat(head!), false, name)
      head = null
    }
  }
  if (!look) {
    if (headBytes === 0) throw new UnreadableFile('file_empty')
    if (/\.gz$/i.test(name) && isStillPacked(head!)) throw new UnreadableFile('file_not_gzip')
    look = new Look(Buffer.concat(head!), true, name)
  }
  return look.end()
}

/** A name in `.gz` whose content was no gzip, and is no text either. */
const isStillPacked = (parts: readonly Buffer[]): boolean => parts.some(part => part.includes(0))

class Look {
  private readonly guess: Guess
  private readonly splitter: RowSplitter
  private lastLine = 0
  private isUnended = false
  private lastCount = 0
  private width = 0

  constructor(sample: Buffer, isWhole: boolean, name: string) {
    this.guess = guessLayout(sample, isWhole, titleOf(name))
    const { recipe } = this.guess
    this.width = this.guess.columns.length
    this.splitter = new RowSplitter({ encoding: recipe.encoding, delimiter: recipe.delimiter, onRow: (fields) => {
      this.lastLine = fields.line
      this.lastCount = fields.count
      this.isUnended = fields.isUnended
    } })
    this.splitter.push(sample)
  }

  push(chunk: Buffer): void {
    this.splitter.push(chunk)
  }

  end(): Guess {
    this.splitter.end()
    if (this.isUnended && this.lastCount < this.width) throw new UnreadableFile('file_cut', { line: this.lastLine })
    return this.guess
  }
}

/** A name for people out of a file's name. */
export function titleOf(name: string): string {
  return name.replace(/\.gz$/i, '').replace(/\.(csv|txt|dat|tsv|psv)$/i, '').replace(/_+/g, ' ').trim().slice(0, 120) || 'Record'
}
