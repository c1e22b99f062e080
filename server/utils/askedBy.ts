import { refuse } from '#shared/errors'
import type { Asked } from '../domain/asked'
import type { Acting, Actor } from '../domain/people/actor'

/** Turns a request into what a use case is told of its asker: the acting role and the request key. */
export function askedBy({ actor, acting, request, now }: { actor: Actor | null, acting: Acting | null, request: { key: string, route: string, bodySha256: Buffer } | null, now: number }): Asked {
  if (!actor || !acting) return refuse('not_signed_in')
  return { actorId: acting.actorId, once: request ? { ...request, personId: actor.personId, now } : null }
}
