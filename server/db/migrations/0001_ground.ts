import type { Migration } from 'kysely'
import { runStatements } from '../dialect'
import { dataTables } from './ground/data'
import { departmentTables } from './ground/department'
import { guards } from './ground/guards'
import { indexes } from './ground/indexes'
import { labsTables } from './ground/labs'
import { ledgerTables } from './ground/ledger'
import { machineryTables } from './ground/machinery'
import { moderationTables } from './ground/moderation'
import { peopleTables } from './ground/people'
import { referenceTables } from './ground/reference'
import { workTables } from './ground/work'

/** The ground that everything stands on: all tables, what never changes, and the indexes. */
export const ground: Migration = {
  async up(db) {
    const text = [
      peopleTables, referenceTables, departmentTables, dataTables, labsTables, ledgerTables, workTables, moderationTables, machineryTables, guards, indexes,
    ].join('\n')
    await runStatements(db, text)
  },
}
