import { readFileSync } from 'node:fs'

/** Only a test on a loopback host may move the clock, by a file that holds one instant. `start.mjs` refuses NOW_FILE otherwise. */
export function mayMoveClock(env: NodeJS.ProcessEnv = process.env): boolean {
  return env.NODE_ENV === 'test' && isLoopback(env.HOST || '127.0.0.1')
}

export function isLoopback(host: string): boolean {
  return host === 'localhost' || host === '::1' || host === '[::1]' || /^127\.\d{1,3}\.\d{1,3}\.\d{1,3}$/.test(host)
}

/** Now, in epoch milliseconds. Read at each use, never kept. */
export function now(): number {
  const file = process.env.NOW_FILE
  if (!file || !mayMoveClock()) return Date.now()
  const instant = Date.parse(readFileSync(file, 'utf8').trim())
  if (Number.isNaN(instant)) throw new Error(`NOW_FILE does not hold an ISO 8601 instant: ${file}`)
  return instant
}
