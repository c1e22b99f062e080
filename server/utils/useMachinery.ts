import { startMachinery, type Machinery } from '../jobs/startMachinery'
import type { CaughtMail } from '../mail/fake'
import { isDemo } from './isDemo'
import { logLine } from './logLine'
import { now } from './now'
import { publicUrl } from './publicUrl'
import { dataDir, openStores } from './useStores'

let machinery: Machinery | undefined
let starting: Promise<void> | undefined

export function openMachinery(): Promise<void> {
  starting ??= openStores().then(async (stores) => {
    machinery = await startMachinery({
      stores, dataDir: dataDir(), publicUrl: publicUrl(), env: process.env, catchesMail: isDemo() || process.env.NODE_ENV === 'development', now, log: logLine,
    })
  })
  return starting
}

export async function closeMachinery(): Promise<void> {
  await starting?.catch(() => {})
  await machinery?.stop()
  machinery = undefined
}

/** Tells the runner that there is work; called after a commit, it saves waiting for the next look. */
export const wakeMachinery = (): void => machinery?.wake()

/** What the local mail server caught, newest first; null where there is none. */
export const caughtMails = (): readonly CaughtMail[] | null => machinery?.fake?.caught() ?? null
