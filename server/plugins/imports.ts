import { openStores } from '../utils/useStores'
import { closeImports, useImports } from '../utils/useImports'

/** Takes up imports where an earlier process left them, and lets none run on when this one ends. */
export default defineNitroPlugin((nitro) => {
  openStores().then(() => useImports().resume()).catch((error: unknown) => console.error(`Imports are not taken up: ${error instanceof Error ? error.message : String(error)}`))
  nitro.hooks.hook('close', closeImports)
})
