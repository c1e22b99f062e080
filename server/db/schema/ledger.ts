/** Rows of main.db as they stand, in the order of migrations/ground/ledger.ts. */
export interface LedgerChainTable {
  id: string
  seq: number
  head: Buffer
}

export interface LedgerEntryTable {
  chain_id: string
  seq: number
  at: number
  actor: string
  action: string
  facts_json: string
  private_digest: Buffer | null
  prev: Buffer
  digest: Buffer
}

export interface PrivateBodyTable {
  digest: Buffer
  about_membership_id: string
  salt: Buffer
  body: string
}

export interface WorkFileTable {
  digest: Buffer
  about_membership_id: string
  size: number
  original_name: string
}

export interface LedgerAnchorTable {
  chain_id: string
  seq: number
  sent_to: string
  digest: Buffer
  sent_at: number
}
