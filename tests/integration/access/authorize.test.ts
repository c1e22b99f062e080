import { afterEach, describe, expect, it, vi } from 'vitest'
import type { Place } from '../../../server/domain/authorize'
import type { Actor } from '../../../server/domain/people/actor'
import { policies, type Action, type Policy } from '../../../server/domain/policies'
import { expected, type Named } from '../../access/model'
import type { WorldObjects, WorldPerson } from '../../fixtures/world'

type Table = Record<string, Policy>

const person = (name: string, memberships: WorldPerson['memberships'], department: WorldPerson['department'] = []): WorldPerson =>
  ({ name, email: '', personId: name, isClosed: false, memberships, department, canary: '' })
const people: WorldPerson[] = [
  person('student', [{ id: 'm-student', course: 'main', role: 'student', sections: ['A'] }]),
  person('classmate', [{ id: 'm-classmate', course: 'main', role: 'student', sections: ['A'] }]),
  person('studentOfB', [{ id: 'm-b', course: 'main', role: 'student', sections: ['B'] }]),
  person('elsewhere', [{ id: 'm-else', course: 'other', role: 'student', sections: ['C'] }]),
  person('past', [{ id: 'm-past', course: 'past', role: 'student', sections: ['P'] }]),
  person('ta', [{ id: 'm-ta', course: 'main', role: 'ta', sections: ['A'] }]),
  person('taOfB', [{ id: 'm-tab', course: 'main', role: 'ta', sections: ['B'] }]),
  person('both', [{ id: 'm-both-ta', course: 'main', role: 'ta', sections: ['A'] }, { id: 'm-both-student', course: 'other', role: 'student', sections: ['C'] }]),
  person('instructor', [{ id: 'm-inst', course: 'main', role: 'instructor', sections: [] }]),
  person('lead', [{ id: 'm-lead', course: 'main', role: 'lead', sections: [] }, { id: 'm-lead-past', course: 'past', role: 'lead', sections: [] }]),
  person('technician', [], ['technician']), person('visitor', [], ['visitor']), person('admin', [], ['admin']),
  person('adminWhoStudies', [{ id: 'm-ad', course: 'main', role: 'student', sections: ['B'] }], ['admin']),
  person('nothing', []),
]
const objects: WorldObjects[] = [
  { course: 'main', section: 'A', owner: 'student', isOpen: true, ids: {} }, { course: 'main', section: 'B', owner: 'studentOfB', isOpen: true, ids: {} },
  { course: 'main', section: 'A', owner: 'student', isOpen: false, ids: {} }, { course: 'other', section: 'C', owner: 'elsewhere', isOpen: true, ids: {} }, { course: 'past', section: 'P', owner: 'past', isOpen: true, ids: {} },
]
const actorOf = (one: WorldPerson): Actor => ({
  personId: one.personId, displayName: one.name, email: '', sessionId: '', departmentRoles: one.department.map(role => ({ id: `d-${role}`, role, scopeJson: null, untilAt: null })),
  memberships: one.memberships.map(held => ({ id: held.id, courseId: held.course, role: held.role, sectionIds: held.sections })),
})
const placeOf = ({ object, reaches, isOfLab, isNothing }: Named): Place | null => {
  if (isNothing) return { courseId: null, sectionIds: [], ownerIds: [], termState: null, openSectionIds: null, isDepartmentWide: false }
  return object && {
    courseId: object.course, termState: object.course === 'past' ? 'closed' : 'running', isDepartmentWide: false,
    sectionIds: reaches === 'course' ? [] : [object.section],
    ownerIds: reaches === 'holder' ? people.find(one => one.name === object.owner)!.memberships.map(held => held.id) : [],
    openSectionIds: isOfLab ? (object.isOpen ? [object.section] : []) : null,
  }
}

/** Every action for everybody on everything: where does the gate say otherwise than the model? */
async function disagreements(table: Table): Promise<{ cells: number, list: string[] }> {
  vi.resetModules()
  vi.doMock('../../../server/domain/policies', () => ({ policies: table }))
  const { authorize } = await import('../../../server/domain/authorize')
  const list: string[] = []
  let cells = 0
  for (const action of Object.keys(policies) as Action[]) {
    for (const one of [...people, null]) {
      for (const reaches of ['course', 'section', 'holder'] as const) {
        for (const [at, object] of [...objects, null, undefined].entries()) {
          const named: Named = { object: object ?? null, isNothing: object === undefined, reaches, isOfLab: reaches !== 'course' }
          const want = expected(policies[action], one, named)
          let got: string
          try {
            authorize(action, one && actorOf(one), placeOf(named))
            got = 'through'
          }
          catch (error) {
            got = error instanceof Error ? error.message : String(error)
          }
          cells++
          if (got !== want) list.push(`${action} by ${one?.name ?? 'nobody'} on ${reaches} ${at}: expected ${want}, got ${got}`)
        }
      }
    }
  }
  return { cells, list }
}

afterEach(() => {
  vi.doUnmock('../../../server/domain/policies')
  vi.resetModules()
})

describe('the gate', () => {
  it('decides every action for everybody on everything as the table says', async () => {
    const { cells, list } = await disagreements(policies)
    expect(list.slice(0, 20)).toEqual([])
    expect(cells).toBeGreaterThan(10_000)
  })

  it.each<[string, (table: Table) => void]>([
    ['students who may read data before the lab', (table) => { table['data:read'] = { ...table['data:read']!, roles: [...table['data:read']!.roles, 'student'] } }],
    ['submissions open to the whole course', (table) => { table['submission:read'] = { ...table['submission:read']!, scope: 'course' } }],
    ['a lab that can be worked on before it opens', (table) => { table['lab:work'] = { scope: 'own', roles: ['student'] } }],
    ['rulings in a closed term', (table) => { table['dispute:rule'] = { scope: 'section', roles: ['lead', 'instructor', 'ta'] } }],
    ['the department’s ledger for the technician', (table) => { table['department:ledger'] = { scope: 'department', roles: ['admin', 'technician'] } }],
    ['people of a course without signing in', (table) => { table['course:people'] = { scope: 'public', roles: [] } }],
    ['disputes for any TA', (table) => { table['dispute:take'] = { ...table['dispute:take']!, scope: 'course' } }],
  ])('is caught with a hole in it: %s', async (_name, plant) => {
    const table: Table = { ...policies }
    plant(table)
    expect((await disagreements(table)).list.length).toBeGreaterThan(0)
  })
})
