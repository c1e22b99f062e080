import { createHash } from 'node:crypto'
import canonicalize from 'canonicalize'
import { defineEventHandler, getHeader, getQuery, getRouterParams, readRawBody, setResponseHeader, setResponseStatus, type EventHandler, type EventHandlerRequest, type H3Event } from 'h3'
import type { z } from 'zod'
import { DomainError, refuse, type FieldProblem } from '#shared/errors'
import { isOutOfRoom } from '../db/dialect'
import { authorize, type Place } from '../domain/authorize'
import { locate } from '../domain/locate'
import type { Acting, Actor } from '../domain/people/actor'
import { policies, type Action } from '../domain/policies'
import { answerProblem } from './answerProblem'
import { logLine } from './logLine'
import { now } from './now'
import { problemOf } from './problem'
import { findActor } from './requireActor'
import { assertOwnOrigin } from './origin'
import { openStores, useStores } from './useStores'

/** What makes a repeated request one: the person's key, the route, and the digest of the body. */
export interface RequestKey { key: string, route: string, bodySha256: Buffer }

export interface Asked<Params, Query, Body> {
  /** Who asks; null only on public routes. */
  actor: Actor | null
  /** The role in which it is done; null only on public routes. */
  acting: Acting | null
  place: Place | null
  params: Params
  query: Query
  body: Body
  /** Present where the route says `makes: true`. */
  request: RequestKey | null
  /** The version in If-Match, where the route says `guards: true`. */
  seenVersion: number | null
  now: number
  /** The instant at which the complete request had arrived: what lateness is decided from. */
  receivedAt: number
  event: H3Event
}

type Output<Schema extends z.ZodType | undefined, Otherwise> = Schema extends z.ZodType ? z.output<Schema> : Otherwise

export interface ApiRoute<P extends z.ZodType | undefined, Q extends z.ZodType | undefined, B extends z.ZodType | undefined, R extends z.ZodType> {
  action: Action
  summary: string
  params?: P
  query?: Q
  body?: B
  reply: R
  /** POST that makes something: Idempotency-Key is asked for. */
  makes?: true
  /** Two people may change it: If-Match is asked for. */
  guards?: true
  /** The handler streams its body or its answer itself. */
  raw?: 'body' | 'answer'
  /** Status of a success; 200 unless said. */
  status?: 200 | 201 | 202 | 204
  handle: (asked: Asked<Output<P, Record<string, never>>, Output<Q, Record<string, never>>, Output<B, undefined>>) => Promise<z.input<R>> | z.input<R>
}

/** A route as the interface's description reads it: everything but what it does. */
export type DescribedRoute = Omit<ApiRoute<z.ZodType | undefined, z.ZodType | undefined, z.ZodType | undefined, z.ZodType>, 'handle'>
export type ApiHandler<T> = EventHandler<EventHandlerRequest, Promise<T>> & { described: DescribedRoute }

const mutating = new Set(['POST', 'PUT', 'PATCH', 'DELETE'])
const largestJsonBody = 2_000_000

/**
 * One route: who may, what comes in, what goes out, and the one use case that decides.
 * The action is checked before `handle` runs; the answer is cut to its schema, so nothing else leaves.
 */
export function defineApiHandler<R extends z.ZodType, P extends z.ZodType | undefined = undefined, Q extends z.ZodType | undefined = undefined, B extends z.ZodType | undefined = undefined>(route: ApiRoute<P, Q, B, R>): ApiHandler<z.output<R>> {
  const handler = defineEventHandler(async (event): Promise<z.output<R>> => {
    try {
      await openStores()
      const at = now()
      const actor = await findActor(event, at)
      if (mutating.has(event.method)) assertOwnOrigin(event)
      const rawParams = Object.fromEntries(Object.entries(getRouterParams(event, { decode: true })).map(([name, value]) => [name, String(value)]))
      if (!actor && policies[route.action].scope !== 'public') refuse('not_signed_in')
      const place = policies[route.action].scope === 'public' ? null : await locate(useStores().read, rawParams, at)
      const acting = authorize(route.action, actor, place)
      const params = readPart(route.params, rawParams, 'not_found')
      const query = readPart(route.query, singleValues(getQuery(event)))
      const { body, bodySha256 } = route.raw === 'body' || !route.body ? { body: undefined, bodySha256: emptyDigest } : await readJson(event, route.body)
      const receivedAt = now()
      const request = route.makes ? { key: requestKeyOf(event), route: `${event.method} ${event.path.split('?')[0]}`, bodySha256 } : null
      const seenVersion = route.guards ? seenVersionOf(event) : null
      const result = await route.handle({
        actor, acting, place, request, seenVersion, now: at, receivedAt, event,
        params: params as Output<P, Record<string, never>>, query: query as Output<Q, Record<string, never>>, body: body as Output<B, undefined>,
      })
      setResponseHeader(event, 'Cache-Control', 'no-store')
      if (route.raw === 'answer') return result as z.output<R>
      setResponseStatus(event, route.status ?? 200)
      return route.reply.parse(result) as z.output<R>
    }
    catch (error) {
      const refused = error instanceof DomainError ? error : isOutOfRoom(error) ? new DomainError('no_room') : null
      if (!refused) {
        logLine('error', { event: 'failed', request: event.context.requestId, action: route.action, error: error instanceof Error ? error.name : typeof error, stack: error instanceof Error ? error.stack : String(error) })
      }
      return answerProblem(event, problemOf(refused ?? new DomainError('failed', { request: event.context.requestId ?? null }))) as never
    }
  })
  return Object.assign(handler, { described: route satisfies DescribedRoute })
}

const emptyDigest = createHash('sha256').update('').digest()

async function readJson(event: H3Event, schema: z.ZodType): Promise<{ body: unknown, bodySha256: Buffer }> {
  const type = getHeader(event, 'content-type') ?? ''
  if (!/^application\/json\b/i.test(type)) refuse('wrong_content_type', { expected: 'application/json' })
  // The body is read whole: its length must be told beforehand, and then it cannot grow.
  if (getHeader(event, 'transfer-encoding') !== undefined) refuse('invalid', {}, [{ path: '', message: 'Send a Content-Length.' }])
  if (Number(getHeader(event, 'content-length') ?? 0) > largestJsonBody) refuse('too_large', { limit: '2 MB' })
  const text = (await readRawBody(event, 'utf8')) ?? ''
  if (text.length > largestJsonBody) refuse('too_large', { limit: '2 MB' })
  const parsed = parseJson(text)
  return { body: readPart(schema, parsed), bodySha256: createHash('sha256').update(canonicalize(parsed) ?? '').digest() }
}

function parseJson(text: string): unknown {
  try {
    return JSON.parse(text)
  }
  catch {
    return refuse('invalid', {}, [{ path: '', message: 'The body is not JSON.' }])
  }
}

function readPart(schema: z.ZodType | undefined, value: unknown, code: 'invalid' | 'not_found' = 'invalid'): unknown {
  if (!schema) return {}
  const read = schema.safeParse(value)
  if (read.success) return read.data
  const fields: FieldProblem[] = read.error.issues.map(issue => ({ path: issue.path.join('.'), message: issue.message }))
  return code === 'not_found' ? refuse('not_found') : refuse('invalid', {}, fields)
}

/** A repeated query parameter is refused rather than read one way here and another way there. */
function singleValues(query: Record<string, unknown>): Record<string, unknown> {
  for (const [name, value] of Object.entries(query)) if (Array.isArray(value)) refuse('invalid', {}, [{ path: name, message: 'Given more than once.' }])
  return query
}

function requestKeyOf(event: H3Event): string {
  const key = getHeader(event, 'idempotency-key')?.trim() ?? ''
  if (!/^[\x21-\x7e]{8,200}$/.test(key)) refuse('request_key_missing')
  return key
}

function seenVersionOf(event: H3Event): number {
  const match = /^"?(\d{1,15})"?$/.exec(getHeader(event, 'if-match')?.trim() ?? '')
  if (!match) return refuse('version_missing')
  return Number(match[1])
}
