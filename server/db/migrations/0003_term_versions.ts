import type { Kysely, Migration } from 'kysely'

/** Two admins may change one term: the one who saved second is told, as with courses and labs. */
export const termVersions: Migration = {
  async up(db: Kysely<unknown>): Promise<void> {
    await db.schema.alterTable('term').addColumn('version', 'integer', column => column.notNull().defaultTo(1)).execute()
  },
}
