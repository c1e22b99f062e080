import { createHash, randomBytes } from 'node:crypto'
import { sql, type Kysely, type Migration } from 'kysely'
import { appendOnly } from '../appendOnly'
import { runStatements } from '../dialect'

/**
 * Why a ruling was made and why a share was drawn anew is free text about a student: it moves to where it can be erased, and its salted digest stays.
 * Entries of the ledger that were written before cover the text itself; `audit` reads it where it is kept now.
 */
export const privateReasons: Migration = {
  async up(db: Kysely<unknown>): Promise<void> {
    await move(db, 'ruling', sql`select ruling.id, ruling.reason, (select min(holder_member.membership_id) from dispute join submission on submission.id = dispute.submission_id
      join share on share.id = submission.share_id join holder_member on holder_member.holder_id = share.holder_id where dispute.id = ruling.dispute_id) as about from ruling`)
    await move(db, 'share', sql`select share.id, share.reason, (select min(holder_member.membership_id) from holder_member where holder_member.holder_id = share.holder_id) as about from share where share.reason is not null`)
  },
}

interface Reason { id: string, reason: string, about: string }

async function move(db: Kysely<unknown>, table: 'ruling' | 'share', found: ReturnType<typeof sql>): Promise<void> {
  const { rows } = await sql<Reason>`${found}`.execute(db)
  await sql.raw(`drop trigger ${table}_no_update`).execute(db)
  await sql.raw(`drop trigger ${table}_no_delete`).execute(db)
  await sql.raw(`alter table ${table} rename column reason to reason_digest`).execute(db)
  for (const { id, reason, about } of rows) {
    const salt = randomBytes(16)
    const digest = createHash('sha256').update(salt).update(reason).digest()
    await sql`insert into private_body (digest, about_membership_id, salt, body) values (${digest}, ${about}, ${salt}, ${reason})`.execute(db)
    await sql`update ${sql.table(table)} set reason_digest = ${digest.toString('hex')} where id = ${id}`.execute(db)
  }
  await runStatements(db, appendOnly(table))
}
