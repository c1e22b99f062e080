import type { FileStore } from '../server/files/store'
import type { Judging } from '../server/domain/submissions/submitLab'
import type { Stores } from '../server/db/writer'
import type { Observations } from '../server/observations/chunks'
import type { Department } from './department'
import type { Timeline } from './timeline'

/** What the demo is made with: the same things that the server hands to its use cases. */
export interface Workshop {
  stores: Stores
  observations: Observations
  files: FileStore
  judging: Judging
  dataDir: string
  secret: string
  now: number
}

export type TermKey = 'past' | 'running'

/** Where the stories are told: filled as time goes on, so that what is read here is there by then. */
export interface Stage {
  workshop: Workshop
  department: Department
  timeline: Timeline
  termIds: Partial<Record<TermKey, string>>
  /** Versions of flights by term, in the order of their numbers. */
  flights: Record<TermKey, string[]>
}

export function termId(stage: Stage, key: TermKey): string {
  const id = stage.termIds[key]
  if (id === undefined) throw new Error(`The ${key} term has not begun in this story.`)
  return id
}
