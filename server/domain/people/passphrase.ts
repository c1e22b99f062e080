import { randomBytes } from 'node:crypto'
import { hash, verify } from '@node-rs/argon2'
import { refuse } from '#shared/errors'

/** argon2id, 19 MiB, two passes (OWASP's least). At most two at a time: more would starve everything else on a small machine. */
const cost = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const
const atOnce = 2
const longestQueue = 200

let running = 0
const queue: (() => void)[] = []

async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (running >= atOnce) {
    if (queue.length >= longestQueue) refuse('busy')
    await new Promise<void>(resolve => queue.push(resolve)) // the place is handed over, never free in between
  }
  else running++
  try {
    return await work()
  }
  finally {
    const next = queue.shift()
    if (next) next()
    else running--
  }
}

export const hashPassphrase = (passphrase: string): Promise<string> => inTurn(() => hash(passphrase.normalize('NFC'), cost))
export const matchesPassphrase = (stored: string, passphrase: string): Promise<boolean> => inTurn(() => verify(stored, passphrase.normalize('NFC')))

/** A hash of nothing anyone knows: an unknown account takes as long as a known one. */
let decoy: Promise<string> | undefined
export async function matchNothing(passphrase: string): Promise<false> {
  await matchesPassphrase(await prepareDecoy(), passphrase)
  return false
}

/** Called at the start, so that the first unknown account does not take twice as long. */
export function prepareDecoy(): Promise<string> {
  decoy ??= hashPassphrase(randomBytes(32).toString('base64url'))
  return decoy
}
