import { bringOverAtEachCommit } from '../faults/plantedBuild'
import { countSyncs } from './countSyncs'
import type { Ratio } from './ratio'

/** Now and then a round has two more: the log is brought over into the database each thousand pages. */
export const syncsAt1: Ratio = {
  id: 'P5', part: 'syncs-at-1', bar: 1, says: 'syncs / submissions acknowledged over HTTP, 1 client',
  command: 'npm run bench -- --only P5/syncs-at-1',
  plant: bringOverAtEachCommit,
  measure: ({ isShort, entry }) => countSyncs(1, { times: 5, rounds: isShort ? 5 : 11, entry }),
}
