import { isLoopback } from './now'

/** The demo is on where DEMO says so; unsaid, only on a loopback host. */
export function isDemo(env: NodeJS.ProcessEnv = process.env): boolean {
  const isHere = isLoopback(env.HOST || '127.0.0.1')
  return env.DEMO === undefined || env.DEMO === '' ? isHere : env.DEMO === '1'
}
