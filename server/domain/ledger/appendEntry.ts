import { createHash, randomBytes } from 'node:crypto'
import { insertRows, keptQuery } from '../../db/keptQuery'
import type { Trx } from '../../db/writer'
import { canonicalJson } from './canonicalJson'

export interface LedgerEntry { chain: string, seq: number, digest: Buffer }

/** Ids, numbers and digests only: no name and no free text, so that erasing a person leaves the chain whole. */
export type LedgerFacts = Readonly<Record<string, unknown>>

const noHead = Buffer.alloc(32)

export const courseChain = (courseId: string): string => `course:${courseId}`
export const departmentChain = 'department'

/** SHA-256 over RFC 8785 canonical JSON. */
export function digestOf(value: unknown): Buffer {
  return createHash('sha256').update(canonicalJson(value)).digest()
}

/** What an entry's digest covers. `audit` computes the same. */
export function entryDigest(entry: { chain: string, seq: number, at: number, actor: string, action: string, factsJson: string, privateDigest: Buffer | null, prev: Buffer }): Buffer {
  return digestOf({
    chain: entry.chain, seq: entry.seq, at: entry.at, actor: entry.actor, action: entry.action, facts: entry.factsJson,
    private: entry.privateDigest?.toString('hex') ?? null, prev: entry.prev.toString('hex'),
  })
}

const chainById = keptQuery((db, given: { id: string }) => db.selectFrom('ledger_chain').select(['seq', 'head']).where('id', '=', given.id))

async function beginChain(trx: Trx, id: string): Promise<{ seq: number, head: Buffer }> {
  await trx.insertInto('ledger_chain').values({ id, seq: 0, head: noHead }).execute()
  return { seq: 0, head: noHead }
}

/** Writes the next link of a chain, in the same unit of work as what it records. */
export async function appendEntry(trx: Trx, entry: { chain: string, at: number, actor: string, action: string, facts: LedgerFacts, privateDigest?: Buffer | null }): Promise<LedgerEntry> {
  const chain = (await chainById(trx, { id: entry.chain }))[0] ?? await beginChain(trx, entry.chain)
  const seq = chain.seq + 1
  const factsJson = canonicalJson(entry.facts)
  const privateDigest = entry.privateDigest ?? null
  const digest = entryDigest({ ...entry, seq, factsJson, privateDigest, prev: chain.head })
  await insertRows(trx, 'ledger_entry', [{
    chain_id: entry.chain, seq, at: entry.at, actor: entry.actor, action: entry.action, facts_json: factsJson, private_digest: privateDigest, prev: chain.head, digest,
  }])
  return { chain: entry.chain, seq, digest }
}

/** Keeps a text that may be erased later; everywhere else stands its salted digest. */
export async function keepPrivateText(trx: Trx, aboutMembershipId: string, body: string): Promise<Buffer> {
  const salt = randomBytes(16)
  const digest = createHash('sha256').update(salt).update(body).digest()
  await trx.insertInto('private_body').values({ digest, about_membership_id: aboutMembershipId, salt, body }).execute()
  return digest
}
