/** Where a person may go, by role: the booms of the mast. */
export type PlaceKey = 'work' | 'marks' | 'disputes' | 'labs' | 'data' | 'people' | 'terms' | 'courses' | 'ledger' | 'access' | 'mail' | 'jobs' | 'visit'

/** `key` tells what a count belongs to; a place without one has none. */
export interface MastPlace { key: PlaceKey | null, word: string, to: string }
export interface PlaceCounts { due: number, open: number, fresh: number }

const words: Record<PlaceKey, string> = {
  work: 'Work', marks: 'Marks', disputes: 'Disputes', labs: 'Labs', data: 'Data', people: 'People',
  terms: 'Terms', courses: 'Courses', ledger: 'Ledger', access: 'Looks', mail: 'Mail', jobs: 'Jobs', visit: 'What you may read',
}

const byCourseRole: Record<'lead' | 'instructor' | 'ta' | 'student', readonly PlaceKey[]> = {
  student: ['work', 'marks', 'disputes'],
  ta: ['labs', 'disputes', 'marks', 'data', 'people'],
  instructor: ['labs', 'data', 'marks', 'disputes', 'people'],
  lead: ['labs', 'data', 'marks', 'disputes', 'people'],
}

const byDepartmentRole: Record<'admin' | 'technician' | 'visitor', readonly PlaceKey[]> = {
  admin: ['terms', 'courses', 'people', 'ledger', 'access', 'mail', 'jobs'],
  technician: ['data', 'jobs'],
  visitor: ['visit'],
}

export function coursePlaces(courseId: string, role: keyof typeof byCourseRole): MastPlace[] {
  return byCourseRole[role].map(key => ({ key, word: words[key], to: `/c/${courseId}/${key}` }))
}

export function departmentPlaces(roles: readonly (keyof typeof byDepartmentRole)[]): MastPlace[] {
  const keys = [...new Set(roles.flatMap(role => byDepartmentRole[role]))]
  return keys.map(key => ({ key, word: words[key], to: `/department/${key}` }))
}

/** Outside a course the booms are the courses that run, and the list of all. */
export function outerPlaces(courses: readonly { id: string, code: string, role: keyof typeof byCourseRole, termState: string }[]): MastPlace[] {
  const running = courses.filter(course => course.termState !== 'closed').slice(0, 4)
  return [{ key: null, word: 'All courses', to: '/' }, ...running.map(course => ({ key: null, word: course.code, to: coursePlaces(course.id, course.role)[0]?.to ?? '/' }))]
}

/** What stands beside a place: a count as words, or nothing. */
export function countWord(key: PlaceKey | null, counts: PlaceCounts | null): string | null {
  if (!counts) return null
  if (key === 'work' && counts.due > 0) return `${counts.due} due`
  if (key === 'disputes' && counts.open > 0) return `${counts.open} open`
  if (key === 'marks' && counts.fresh > 0) return `${counts.fresh} new`
  return null
}

/** A place is where one is when the address is it or lies beneath it. */
export function isHere(place: MastPlace, path: string): boolean {
  return path === place.to || path.startsWith(`${place.to}/`)
}

export const roleWord: Record<'lead' | 'instructor' | 'ta' | 'student' | 'admin' | 'technician' | 'visitor', string> = {
  lead: 'lead', instructor: 'instructor', ta: 'TA', student: 'student', admin: 'department admin', technician: 'technician', visitor: 'visitor',
}
