// The ledger, and the texts that may be erased without breaking it.
export const ledgerTables = `create table ledger_chain (id text primary key, seq integer not null, head blob not null check (length(head) = 32)) strict;
create table ledger_entry (
  chain_id text not null references ledger_chain, seq integer not null, at integer not null, actor text not null, action text not null,
  facts_json text not null,             -- ids, before, after, digests of the rows it covers; no name, no free text
  private_digest blob,                  -- sha256(salt ‖ body) of what may be erased
  prev blob not null check (length(prev) = 32), digest blob not null check (length(digest) = 32), primary key (chain_id, seq)
) strict;
-- everything written by or about a person that the records rule may erase; others keep only its digest
create table private_body (digest blob primary key check (length(digest) = 32), about_membership_id text not null references membership,
  salt blob not null check (length(salt) >= 16), body text not null) strict;
create table work_file (digest blob primary key check (length(digest) = 32), about_membership_id text not null references membership,
  size integer not null, original_name text not null) strict;
create table ledger_anchor (chain_id text not null, seq integer not null, sent_to text not null, digest blob not null, sent_at integer not null,
  primary key (chain_id, seq, sent_to)) strict, without rowid;
`
