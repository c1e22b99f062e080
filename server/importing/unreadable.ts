import type { RefusalCode } from '#shared/errors'

/** A file, or the rest of it, that cannot be read as a table at all. The use case turns it into a refusal. */
export class UnreadableFile extends Error {
  override readonly name = 'UnreadableFile'
  constructor(readonly code: RefusalCode, readonly facts: Readonly<Record<string, string | number>> = {}) {
    super(code)
  }
}
