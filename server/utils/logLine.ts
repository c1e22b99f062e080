import { isDemo } from './isDemo'

export type LogLevel = 'info' | 'warn' | 'error'

/**
 * One line of JSON. Values are encoded, so that nothing a client sends can begin a line of its own. Errors go to stderr, always;
 * the rest to stdout, except in the demo, where a person watches the terminal. LOG=requests and LOG=errors say otherwise.
 */
export function logLine(level: LogLevel, facts: Readonly<Record<string, string | number | boolean | null | undefined>>, env: NodeJS.ProcessEnv = process.env): void {
  const line = `${JSON.stringify({ at: new Date().toISOString(), level, ...facts })}\n`
  if (level === 'error') process.stderr.write(line)
  else if (env.LOG ? env.LOG === 'requests' : !isDemo(env)) process.stdout.write(line)
}
