/** A number outside a variant's range, or not a number at all. */
export class OutOfRangeError extends Error {
  override readonly name = 'OutOfRangeError'
  constructor(readonly input: string, readonly value: number, readonly validRange: string) {
    super(`${input} = ${String(value)} lies outside ${validRange}`)
  }
}

/** An input that the quantity needs was not given. */
export class MissingInputError extends Error {
  override readonly name = 'MissingInputError'
  constructor(readonly input: string) {
    super(`${input} is missing`)
  }
}

/** A series that cannot be used: too short, of unequal lengths, gaps, or not in order. */
export class SeriesError extends Error {
  override readonly name = 'SeriesError'
  constructor(readonly input: string, readonly reason: string) {
    super(`${input}: ${reason}`)
  }
}

/** A name that is none of the quantity's inputs. */
export class UnknownInputError extends Error {
  override readonly name = 'UnknownInputError'
  constructor(readonly input: string, readonly known: readonly string[]) {
    super(`${input} is not an input here; there ${known.length === 1 ? 'is' : 'are'} ${known.join(', ') || 'none'}`)
  }
}
