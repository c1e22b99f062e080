import type { Stores } from '../../db/writer'
import { heldSessions } from './heldSessions'

export async function endSession({ write }: Stores, tokenSha256: Buffer, why: string, now: number): Promise<void> {
  if (heldSessions.end(tokenSha256)) return
  await write(trx => trx.updateTable('session').set({ ended_at: now, ended_why: why }).where('token_sha256', '=', tokenSha256).where('ended_at', 'is', null).execute())
}

/** Ends every session of a person: "sign out everywhere". */
export async function endAllSessions({ write }: Stores, personId: string, why: string, now: number): Promise<void> {
  heldSessions.endAll(personId)
  await write(trx => trx.updateTable('session').set({ ended_at: now, ended_why: why }).where('person_id', '=', personId).where('ended_at', 'is', null).execute())
}
