import { commitAlone } from '../faults/plantedBuild'
import { countSyncs } from './countSyncs'
import type { Ratio } from './ratio'

export const syncsAt32: Ratio = {
  id: 'P5', part: 'syncs-at-32', bar: 0.25, says: 'syncs / submissions acknowledged over HTTP, 32 clients',
  command: 'npm run bench -- --only P5/syncs-at-32',
  plant: commitAlone,
  measure: ({ isShort, entry }) => countSyncs(32, { times: 5, rounds: isShort ? 3 : 7, entry }),
}
