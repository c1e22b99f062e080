import type { Migration } from 'kysely'
import { ground } from './0001_ground'
import { openCourses } from './0002_open_courses'
import { termVersions } from './0003_term_versions'

/** Every migration, by name, in order. A test holds this list against the folder. */
export const migrations: Record<string, Migration> = {
  '0001_ground': ground,
  '0002_open_courses': openCourses,
  '0003_term_versions': termVersions,
}
