import { isLoopback } from './now'
import { publicUrl } from './publicUrl'

/** The demo is on where DEMO says so; unsaid, only on a loopback host that people reach at that address: behind a proxy its sign-ins and its mail would be everybody's. */
export function isDemo(env: NodeJS.ProcessEnv = process.env): boolean {
  const host = env.HOST || '127.0.0.1'
  const reachedAt = publicUrl(env)
  const isHere = isLoopback(host) && isLoopback(URL.canParse(reachedAt) ? new URL(reachedAt).hostname : host)
  return env.DEMO === undefined || env.DEMO === '' ? isHere : env.DEMO === '1'
}
