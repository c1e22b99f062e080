/** The version of the reference: physics, bands, slips and reading together. When a seeded judgement changes (golden test), this changes. */
export const referenceVersion = '1.1.0'

/** Raised when `judgeStep` takes or gives something else: a kept build is called by the interface that it was made for. */
export const judgeInterface = 1
