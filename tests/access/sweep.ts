import { policies, type Action, type Policy } from '../../server/domain/policies'
import { Visitor } from '../fixtures/visitor'
import type { World, WorldPerson } from '../fixtures/world'
import { expected } from './model'
import { cellsOf } from './samples'

export interface Operation { method: string, path: string, action: string | undefined, hasBody: boolean, asksForKey: boolean }

/** What the built server says that it answers to. */
export async function operationsOf(url: string): Promise<Operation[]> {
  const { paths } = await new Visitor(url).get<{ paths: Record<string, Record<string, { 'x-action'?: string, 'requestBody'?: unknown, 'parameters'?: { in: string, name: string }[] }>> }>('/api/openapi.json')
  return Object.entries(paths).flatMap(([path, methods]) => Object.entries(methods).map(([method, operation]) => ({
    method: method.toUpperCase(), path, action: operation['x-action'], hasBody: operation.requestBody !== undefined,
    asksForKey: (operation.parameters ?? []).some(parameter => parameter.in === 'header'),
  })))
}

export const policyOf = (action: string | undefined): Policy | undefined => (action !== undefined && action in policies ? policies[action as Action] : undefined)

export interface Swept { cells: number, findings: string[] }

export interface SweepOptions {
  url: string
  operations: readonly Operation[]
  world: World
  /** One browser a person, signed in. */
  browsers: Readonly<Record<string, Visitor>>
  /** Looks only at these cells: for a quick run. */
  actors?: readonly string[]
}

/**
 * Asks for every route as everybody, with every object, and compares what comes with what the table says.
 * Bodies and keys are left out, so that whoever gets through is told what is missing and nothing is done.
 */
export async function sweep({ url, operations, world, browsers, actors }: SweepOptions): Promise<Swept> {
  const findings: string[] = []
  let cells = 0
  const tasks: (() => Promise<void>)[] = []
  // What needs neither body nor key would be done: it comes last.
  const order = operations.toSorted((a, b) => Number(isBare(a)) - Number(isBare(b)))
  for (const operation of order) {
    const policy = policyOf(operation.action)
    if (!policy) {
      findings.push(`${operation.method} ${operation.path}: no action of the table ("${operation.action ?? 'none'}")`)
      continue
    }
    for (const actor of actors ?? [...Object.keys(world.people), 'nobody']) {
      const person = world.people[actor] ?? null
      // Ending one's own sessions would end the sweep for that person; its refusals are still asked for.
      if (policy.scope === 'session' && isBare(operation) && operation.method !== 'GET' && person && !person.isClosed) continue
      const refusals: { where: string, said: string }[] = []
      // Nonsense is read before anybody's role is: a few people are enough to send it.
      const list = cellsOf(operation.path, world, ['nobody', 'student', 'lead', 'admin'].includes(actor) ? undefined : ['0'])
      cells += list.length
      tasks.push(async () => {
        for (const cell of list) {
          const want = expected(policy, person, cell.named)
          const browser = browsers[actor] ?? new Visitor(url)
          const answer = await browser.send(operation.method, cell.path, operation.hasBody ? {} : undefined)
          const text = await answer.text()
          const at = `${operation.method} ${cell.path.length > 200 ? operation.path : cell.path} [${cell.where}] as ${actor} (${operation.action})`
          const code = codeOf(answer.status, text)
          if (answer.status >= 500 && code !== 'busy') findings.push(`${at}: a server error ${answer.status} ${text.slice(0, 200)}`)
          else if (!agrees(want, code, answer.status, policy, cell.isWhole)) findings.push(`${at}: expected ${want}, got ${answer.status} ${code ?? text.slice(0, 80)}`)
          if (code === 'not_found') refusals.push({ where: cell.where, said: `${answer.status} ${headersOf(answer)} ${text}` })
          for (const leak of leaksOf(text, person, world)) findings.push(`${at}: the answer holds ${leak}`)
        }
        // What is foreign answers byte for byte like what is not there.
        const missing = refusals.find(refusal => refusal.where === 'missing')
        for (const refusal of refusals) if (missing && refusal.said !== missing.said) findings.push(`${operation.method} ${operation.path} as ${actor}: "${refusal.where}" answers otherwise than what is missing:\n  ${refusal.said}\n  ${missing.said}`)
      })
    }
  }
  await inParallel(tasks, 8)
  return { cells, findings }
}

const isBare = (operation: Operation) => operation.method !== 'GET' && !operation.hasBody && !operation.asksForKey

/** Got through: to the work, or to being told what the request lacks. Refused: exactly so. */
function agrees(want: ReturnType<typeof expected>, code: string | null, status: number, policy: Policy, isWhole: boolean): boolean {
  if (want !== 'through') return code === want
  if (code === 'not_signed_in' || code === 'not_allowed' || code === 'term_closed') return false
  // In the department, in the reference and on public routes the work itself finds out that an object is not there.
  if (code === 'not_found') return policy.scope === 'public' || ((policy.scope === 'department' || policy.scope === 'session') && !isWhole)
  return status < 500
}

function codeOf(status: number, text: string): string | null {
  if (status < 400) return null
  try {
    const parsed: unknown = JSON.parse(text)
    return typeof parsed === 'object' && parsed !== null && 'code' in parsed ? String(parsed.code) : `status_${status}`
  }
  catch {
    return `status_${status}`
  }
}

const changing = new Set(['date', 'x-request-id', 'connection', 'keep-alive', 'set-cookie', 'content-security-policy'])
const headersOf = (answer: Response) => JSON.stringify([...answer.headers].filter(([name]) => !changing.has(name)))

/** Marks of other people's work, and of courses in which this person has no part, that must not be in an answer. */
export function leaksOf(text: string, person: WorldPerson | null, world: World): string[] {
  const leaks: string[] = []
  const isDepartment = person?.department.includes('admin') ?? false
  const holds = (course: string) => person !== null && !person.isClosed && person.memberships.some(held => held.course === course)
  for (const [course, canary] of Object.entries(world.courseCanaries)) {
    const isVisitor = person?.department.includes('visitor') ?? false // the world's visitor reads the main course
    const isTechnician = person?.department.includes('technician') ?? false
    if (text.includes(canary) && !holds(course) && !isDepartment && !isTechnician && !(isVisitor && course === 'main')) leaks.push(`what belongs to the ${course} course`)
  }
  for (const [key, other] of Object.entries(world.people)) {
    if (!text.includes(other.canary) && !text.toLowerCase().includes(other.email)) continue
    if (other === person && !person.isClosed) continue
    const isStaffOfTheirs = other.memberships.some(theirs => person?.memberships.some(mine => mine.course === theirs.course && mine.role !== 'student'))
    const isTheirStaff = other.memberships.some(theirs => theirs.role !== 'student' && person?.memberships.some(mine => mine.course === theirs.course))
    // Whoever keeps the instruments sees which of the staff made a data set.
    if (person?.department.includes('technician') && other.memberships.every(theirs => theirs.role !== 'student')) continue
    const wasInTheirCourse = key === 'dropped' && person?.memberships.some(mine => mine.course === 'main' && mine.role !== 'student')
    if (isDepartment || (person !== null && !person.isClosed && (isStaffOfTheirs || isTheirStaff || wasInTheirCourse))) continue
    leaks.push(`what belongs to ${key}`)
  }
  return leaks
}

export async function inParallel(tasks: readonly (() => Promise<void>)[], atOnce: number): Promise<void> {
  let at = 0
  await Promise.all(Array.from({ length: atOnce }, async () => {
    for (let task = tasks[at++]; task; task = tasks[at++]) await task()
  }))
}
