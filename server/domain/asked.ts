import { once, type Once } from '../db/queries/requestKeys'
import type { Trx } from '../db/writer'

/** Who asks for a change, and the request key by which a repetition is known; without one, work is done as it is asked. */
export interface Asked { actorId: string, once: Once | null }

export const doOnce = <T>(trx: Trx, asked: Asked, work: () => Promise<T>): Promise<T> => asked.once ? once(trx, asked.once, work) : work()
