/** A question that cannot be answered, with the input that is to blame. */
export class Refusal extends Error {
  constructor(readonly code: string, detail: string, readonly input?: string) {
    super(detail)
  }
}
