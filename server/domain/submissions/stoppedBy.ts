import type { Work } from '#shared/schemas/work'
import type { PostedGround } from './ground'
import { decideLateness } from './lateness'

/**
 * Why nothing more can be handed in on a ground at an instant; null while it can. Whoever has handed in and whose marks are released has seen the
 * worked value of their own data: no attempt is left then. Whoever has not handed in yet still may.
 */
export function stoppedBy(ground: PostedGround, at: number): Work['stopped'] {
  if (ground.termState === 'closed' && (ground.allowedUntil ?? 0) < at) return 'term_closed'
  if (decideLateness(ground, at).isClosed) return 'lab_closed'
  if (ground.attemptsMade >= ground.attempts) return 'attempts_used'
  return ground.attemptsMade > 0 && ground.releasedAt !== null && ground.releasedAt <= at ? 'marks_shown' : null
}
