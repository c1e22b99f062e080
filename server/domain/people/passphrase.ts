import { hash, verify } from '@node-rs/argon2'
import { refuse } from '#shared/errors'

/** argon2id, 19 MiB, two passes (OWASP's least). At most two at a time: more would starve everything else on a small machine. */
const cost = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const
const atOnce = 2
const longestQueue = 200

let running = 0
const queue: (() => void)[] = []

async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (queue.length >= longestQueue) refuse('busy')
  if (running >= atOnce) await new Promise<void>(resolve => queue.push(resolve))
  running++
  try {
    return await work()
  }
  finally {
    running--
    queue.shift()?.()
  }
}

export const hashPassphrase = (passphrase: string): Promise<string> => inTurn(() => hash(passphrase.normalize('NFC'), cost))
export const matchesPassphrase = (stored: string, passphrase: string): Promise<boolean> => inTurn(() => verify(stored, passphrase.normalize('NFC')))

/** A hash of nothing anyone knows: an unknown account takes as long as a known one. */
let decoy: Promise<string> | undefined
export async function matchNothing(passphrase: string): Promise<false> {
  decoy ??= hashPassphrase('an account that does not exist')
  await matchesPassphrase(await decoy, passphrase)
  return false
}
