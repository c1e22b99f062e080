export interface SessionLimits { idleMs: number, longestMs: number }

/** How long a session lasts without being used, and at most: SESSION_IDLE_HOURS (8) and SESSION_HOURS (12). */
export function sessionLimits(env: NodeJS.ProcessEnv = process.env): SessionLimits {
  return { idleMs: hoursOf(env.SESSION_IDLE_HOURS, 8), longestMs: hoursOf(env.SESSION_HOURS, 12) }
}

function hoursOf(text: string | undefined, otherwise: number): number {
  const hours = text === undefined || text === '' ? otherwise : Number(text)
  if (!(hours > 0) || hours > 24 * 366) throw new Error(`"${text}" is not a number of hours.`)
  return hours * 3_600_000
}
