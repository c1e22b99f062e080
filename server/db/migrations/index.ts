import type { Migration } from 'kysely'
import { ground } from './0001_ground'
import { openCourses } from './0002_open_courses'
import { termVersions } from './0003_term_versions'
import { privateReasons } from './0004_private_reasons'
import { filesOfPeople } from './0005_files_of_people'
import { ownedReds } from './0006_owned_reds'
import { accessLogRead } from './0007_access_log_read'
import { lastChanges } from './0008_last_changes'
import { repairs } from './0009_repairs'

/** Every migration, by name, in order. A test holds this list against the folder. */
export const migrations: Record<string, Migration> = {
  '0001_ground': ground,
  '0002_open_courses': openCourses,
  '0003_term_versions': termVersions,
  '0004_private_reasons': privateReasons,
  '0005_files_of_people': filesOfPeople,
  '0006_owned_reds': ownedReds,
  '0007_access_log_read': accessLogRead,
  '0008_last_changes': lastChanges,
  '0009_repairs': repairs,
}
