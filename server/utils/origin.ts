import { getHeader, type H3Event } from 'h3'
import { refuse } from '#shared/errors'

/**
 * A request that changes something must come from our own pages or from a program that is no browser:
 * a browser says where a request comes from, and what it says must be us.
 */
export function assertOwnOrigin(event: H3Event): void {
  const site = getHeader(event, 'sec-fetch-site')
  if (site !== undefined && site !== 'same-origin' && site !== 'none') refuse('wrong_origin')
  const origin = getHeader(event, 'origin')
  if (origin === undefined) return
  const host = getHeader(event, 'host')
  if (!URL.canParse(origin) || new URL(origin).host !== host) refuse('wrong_origin')
}
