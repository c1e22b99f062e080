import { closeStores, openStores } from '../utils/useStores'

/** Opens the database when the server starts and lets what is under way finish before it stops. */
export default defineNitroPlugin((nitro) => {
  openStores().catch((error: unknown) => {
    console.error(error instanceof Error ? error.message : String(error))
    process.exit(1)
  })
  nitro.hooks.hook('close', closeStores)
})
