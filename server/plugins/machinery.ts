import { prepareDecoy } from '../domain/people/passphrase'
import { closeLimits } from '../utils/useLimits'
import { logLine } from '../utils/logLine'
import { closeMachinery, openMachinery } from '../utils/useMachinery'

/** Starts background work with the server and ends it before the database closes (hooks run in the order of the plugins' names). */
export default defineNitroPlugin((nitro) => {
  process.env.NITRO_SHUTDOWN_TIMEOUT ||= '9000' // what is under way gets this long at a stop
  openMachinery().catch((error: unknown) => logLine('error', { event: 'background work not started', message: error instanceof Error ? error.message : String(error) }))
  void prepareDecoy()
  nitro.hooks.hook('close', closeMachinery)
  nitro.hooks.hook('close', closeLimits)
})
