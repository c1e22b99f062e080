import { randomUUID } from 'node:crypto'
import type { H3Event } from 'h3'
import { isSecure } from '../utils/publicUrl'
import { logLine } from '../utils/logLine'

/** What a page may load is said with its nonces by nuxt-security; everything else that is answered is no page and loads nothing. */
const noPage = 'default-src \'none\'; base-uri \'none\'; form-action \'none\'; frame-ancestors \'none\''

/** Headers on every answer, errors and files too, a number for each request, and a line in the log. */
export default defineNitroPlugin((nitro) => {
  nitro.hooks.hook('request', (event) => {
    event.context.requestId = randomUUID()
    event.context.startedAt = performance.now()
    const answer = event.node.res
    answer.setHeader('X-Request-Id', event.context.requestId)
    answer.setHeader('X-Content-Type-Options', 'nosniff')
    answer.setHeader('X-Frame-Options', 'DENY')
    answer.setHeader('Referrer-Policy', 'same-origin')
    answer.setHeader('Cross-Origin-Opener-Policy', 'same-origin')
    answer.setHeader('Cross-Origin-Resource-Policy', 'same-origin')
    answer.setHeader('Content-Security-Policy', noPage)
    if (isSecure()) answer.setHeader('Strict-Transport-Security', 'max-age=31536000; includeSubDomains')
    answer.once('close', () => logRequest(event))
  })
  nitro.hooks.hook('error', (error, { event }) => {
    const status = 'statusCode' in error && typeof error.statusCode === 'number' ? error.statusCode : 500
    if (status < 500) return
    logLine('error', { event: 'failed', request: event?.context.requestId, route: event ? routeOf(event) : undefined, error: error.name, message: error.message, stack: error.stack })
  })
})

function logRequest(event: H3Event): void {
  const { requestId, startedAt } = event.context as { requestId?: string, startedAt?: number }
  logLine('info', { event: 'request', request: requestId, method: event.method, route: routeOf(event), status: event.node.res.statusCode, ms: Math.round((performance.now() - (startedAt ?? 0)) * 10) / 10 })
}

/** The route's pattern, never what was put in its place: a path may hold a token, a query what somebody searched for. */
function routeOf(event: H3Event): string {
  const matched = event.context.matchedRoute?.path
  if (matched && matched !== '/**') return matched
  const path = event.path.split('?')[0] ?? ''
  return path.split('/').map(part => (/^[a-z][a-z-]{0,24}$/.test(part) || part === '' ? part : ':')).join('/')
}
