import type { World, WorldObjects } from '../fixtures/world'
import type { Named } from './model'

/** What each parameter of a route names, from wide to narrow. A new name must be entered here, or the sweep fails and says so. */
const placed: Record<string, { reaches: Named['reaches'], isOfLab: boolean }> = {
  courseId: { reaches: 'course', isOfLab: false },
  sectionId: { reaches: 'section', isOfLab: false },
  memberId: { reaches: 'section', isOfLab: false },
  labId: { reaches: 'course', isOfLab: true },
  postingId: { reaches: 'section', isOfLab: true },
  shareId: { reaches: 'holder', isOfLab: true },
  submissionId: { reaches: 'holder', isOfLab: true },
  receiptNo: { reaches: 'holder', isOfLab: true },
  disputeId: { reaches: 'holder', isOfLab: true },
  dataSetId: { reaches: 'course', isOfLab: false },
  versionId: { reaches: 'course', isOfLab: false },
  uploadId: { reaches: 'course', isOfLab: false },
  jobId: { reaches: 'course', isOfLab: false },
}
/** Objects of the department and of the reference: who may is decided by the role alone. */
const unplaced = ['membershipId', 'personId', 'termId', 'roleId', 'quantityKey', 'conventionKey', 'mailId']
/** Names inside an object, which must be one that it has: another object's name for it is a missing one. */
const inside: Record<string, string | null> = { stepKey: 'rate', digest: null }

export interface Cell { where: string, path: string, named: Named, /** The object exists and every parameter is its own. */ isWhole: boolean }

const nonsense = ['%00', '../../etc/passwd', '\' or 1=1 --', '__proto__', 'x'.repeat(3000), '0']

/** Every way to fill a route's parameters: with each object of the world, with one that is not there, with nonsense, and with parts of two objects. */
export function cellsOf(pattern: string, world: World, nonsenses = nonsense): Cell[] {
  const names = [...pattern.matchAll(/\{(\w+)\}/g)].map(match => match[1]!)
  const unknown = names.filter(name => !(name in placed) && !unplaced.includes(name) && !(name in inside))
  if (unknown.length > 0) throw new Error(`${pattern}: say in tests/access/samples.ts what the parameter "${unknown[0]}" names.`)
  const narrowest = Object.keys(placed).filter(name => names.includes(name)).at(-1)
  const isNothing = narrowest === undefined
  const kind = narrowest === undefined ? { reaches: 'course' as const, isOfLab: false } : placed[narrowest]!
  const fill = (value: (name: string) => string) => pattern.replace(/\{(\w+)\}/g, (_, name: string) => encodeURIComponent(value(name)))
  if (names.length === 0) return [{ where: 'it', path: pattern, named: { object: null, isNothing, ...kind }, isWhole: true }]

  const cells: Cell[] = []
  for (const [where, object] of Object.entries(world.objects)) {
    if (names.some(name => valueOf(object, name) === undefined)) continue
    // What is the same for two objects (a course of both) is asked for once.
    const path = fill(name => valueOf(object, name)!)
    if (!cells.some(cell => cell.path === path)) cells.push({ where, path, named: { object, isNothing, ...kind }, isWhole: true })
  }
  const missing = { object: null, isNothing, ...kind }
  cells.push({ where: 'missing', path: fill(name => inside[name] ?? (name === 'digest' ? 'ab'.repeat(32) : '0190a1b2-0000-7000-8000-000000000000')), named: missing, isWhole: false })
  for (const text of nonsenses) cells.push({ where: `nonsense ${text.slice(0, 12)}`, path: fill(() => text), named: missing, isWhole: false })
  const [outer] = names.filter(name => name in placed)
  if (outer !== undefined && names.filter(name => name in placed || inside[name] === null).length > 1) {
    const own = world.objects.own!
    const foreign = world.objects.otherCourses!
    cells.push({ where: 'own course, other course’s object', path: fill(name => (name === outer ? valueOf(own, name) : valueOf(foreign, name)) ?? '0'), named: missing, isWhole: false })
    cells.push({ where: 'other course, own object', path: fill(name => (name === outer ? valueOf(foreign, name) : valueOf(own, name)) ?? '0'), named: missing, isWhole: false })
  }
  return cells
}

const valueOf = (object: WorldObjects, name: string): string | undefined => inside[name] ?? object.ids[name]
