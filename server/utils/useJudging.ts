import { loadShare } from '../domain/shares/loadShare'
import type { LoadedShare } from '../domain/shares/loadedShare'
import type { Judging } from '../domain/submissions/submitLab'
import { useObservations } from './useImports'
import { useReference } from './useReference'
import { useStores } from './useStores'

/** A share with its rows, from this server's stores. */
export const loadShareHere = (shareId: string): Promise<LoadedShare> => loadShare(useStores().read, useObservations(), shareId)

/** What submissions are judged with here. */
export async function useJudging(): Promise<Judging> {
  return { reference: await useReference(), loadShare: loadShareHere }
}
