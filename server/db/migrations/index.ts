import type { Migration } from 'kysely'
import { ground } from './0001_ground'

/** Every migration, by name, in order. A test holds this list against the folder. */
export const migrations: Record<string, Migration> = {
  '0001_ground': ground,
}
