import { bundle, goldenSha256 } from '#reference'
import { keepReference, loadReference, type Reference } from '../domain/marking/reference'
import { now } from './now'
import { openStores } from './useStores'

let loading: Promise<Reference> | undefined

/** The build that this server judges with: brought to life once, and kept in the database before it judges anything. */
export function useReference(): Promise<Reference> {
  loading ??= (async () => {
    const reference = await loadReference(bundle, goldenSha256)
    const { write } = await openStores()
    await keepReference(write, reference, now())
    return reference
  })()
  loading.catch(() => { loading = undefined })
  return loading
}
