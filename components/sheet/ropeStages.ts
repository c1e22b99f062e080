export interface RopeStage {
  /** What the knot carries: a step's number. */
  no?: number | string
  /** What it is called: for people who hear it, and below the knot where `hasWords`. */
  label: string
  isDone: boolean
  /** Where a knot leads. */
  to?: string
}

/** Above this many knots the strand's length says it, and the missing ones are named. */
export const mostKnots = 12

/** "31 of 40 saved; not yet: 4, 6". Names at most eight. */
export function ropeSummary(stages: readonly RopeStage[], doneWord = 'saved'): string {
  const open = stages.filter(stage => !stage.isDone)
  const told = `${stages.length - open.length} of ${stages.length} ${doneWord}`
  if (open.length === 0) return told
  const names = open.slice(0, 8).map(stage => stage.no ?? stage.label).join(', ')
  return `${told}; not yet: ${names}${open.length > 8 ? ` and ${open.length - 8} more` : ''}`
}
