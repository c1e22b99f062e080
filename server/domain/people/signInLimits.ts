import { createHash } from 'node:crypto'
import { refuse } from '#shared/errors'
import type { Counters } from '../../db/counters'

/** Who tries to sign in, from where. */
export interface Trying {
  account: string
  address: string
  /** This browser has signed in to this account before and says so with a signed cookie. */
  isKnownBrowser: boolean
  browser: string | null
}

export interface SignInLimits {
  /** Seconds to wait before the next try, or null. Counts nothing. */
  look: (who: Trying) => Promise<number | null>
  /**
   * Lets a try be judged, and counts it when it was wrong (null). Tries on one account from one place are judged one after another,
   * so that many at once cannot slip through, and many right ones at once are not refused.
   * @throws {DomainError} `too_many_requests`, `busy`
   */
  attempt: <T>(who: Trying, judge: () => Promise<T | null>) => Promise<T | null>
  /** The owner proved to hold the mailbox: every count against the account ends. */
  clearAccount: (who: { account: string, address: string, browser: string | null }) => Promise<void>
  askReset: (who: { account: string, address: string }) => Promise<{ waitS: number | null, isOneTooMany: boolean }>
}

const minutes = 60
const hours = 3600

/**
 * Wrong tries, by whom they would hurt:
 * - on one account from one place, 10 in 15 minutes. A place is a browser that has signed in to the account before, else an address:
 *   a stranger, even one in the same room, never uses up the owner's own tries;
 * - on one account from all unknown browsers together, 100 a day: guessing from many addresses ends. Known browsers and a reset by mail stay open to the owner;
 * - from one address on whatever accounts, 300 in 15 minutes: a class of sixty that signs in at once, each with a slip or two, passes.
 * Right tries count nowhere.
 */
export function signInLimits(counters: Counters): SignInLimits {
  const place = counters.counter('place', 10, 15 * minutes)
  const account = counters.counter('account', 100, 24 * hours)
  const address = counters.counter('address', 300, 15 * minutes)
  const resetsOfAddress = counters.counter('reset_address', 120, 15 * minutes)
  const resetsOfAccount = counters.counter('reset_account', 3, 1 * hours)

  const keys = (who: Trying) => ({
    place: keyOf(who.account, who.isKnownBrowser && who.browser !== null ? `browser ${who.browser}` : `address ${who.address}`),
    account: keyOf(who.account), address: keyOf(who.address),
  })
  async function look(who: Trying): Promise<number | null> {
    const key = keys(who)
    return await place.look(key.place) ?? (who.isKnownBrowser ? null : await account.look(key.account) ?? await address.look(key.address))
  }

  return {
    look,
    attempt: (who, judge) => inTurn(keys(who).place, async () => {
      const key = keys(who)
      const seconds = await look(who)
      if (seconds !== null) refuse('too_many_requests', { seconds })
      const judged = await judge()
      if (judged !== null) {
        await place.clear(key.place)
        return judged
      }
      await place.take(key.place)
      if (!who.isKnownBrowser) {
        await account.take(key.account)
        await address.take(key.address)
      }
      return null
    }),
    async clearAccount({ account: name, address: from, browser }) {
      await account.clear(keyOf(name))
      await place.clear(keyOf(name, `address ${from}`))
      if (browser !== null) await place.clear(keyOf(name, `browser ${browser}`))
    },
    async askReset(who) {
      const waitS = await resetsOfAddress.take(keyOf(who.address))
      if (waitS !== null) return { waitS, isOneTooMany: true }
      return { waitS: null, isOneTooMany: await resetsOfAccount.take(keyOf(who.account)) !== null }
    },
  }
}

const longestTurn = 100
const turns = new Map<string, { last: Promise<unknown>, waiting: number }>()

/** Runs work under one key one after another. */
async function inTurn<T>(key: string, work: () => Promise<T>): Promise<T> {
  const turn = turns.get(key) ?? { last: Promise.resolve(), waiting: 0 }
  if (turn.waiting >= longestTurn) refuse('busy')
  turns.set(key, turn)
  turn.waiting++
  const mine = turn.last.then(work)
  turn.last = mine.catch(() => {})
  try {
    return await mine
  }
  finally {
    if (--turn.waiting === 0) turns.delete(key)
  }
}

/** The file of counts holds no address and no e-mail. */
const keyOf = (...parts: string[]) => createHash('sha256').update(JSON.stringify(parts)).digest('base64url')
