import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { openDatabase } from '../../server/db/open'
import { enrol } from '../../server/domain/terms/enrol'
import { startBuiltServer, type BuiltServer } from '../fixtures/builtServer'
import { labWeek, passphrase } from '../fixtures/labWeek'
import { Visitor } from '../fixtures/visitor'

interface Student { visitor: Visitor, shareId: string }

/** A built server with a lab and students who are signed in and can hand in again and again. Mail waits: no mail server is named. */
export class ClassAtWork {
  private sent = 0
  private constructor(readonly server: BuiltServer, readonly dataDir: string, private readonly students: readonly Student[]) {}

  static async of(size: number, entry?: string): Promise<ClassAtWork> {
    const dataDir = mkdtempSync(join(tmpdir(), 'tetherhouse-class-'))
    const { courseId, labId, student } = await labWeek(dataDir)
    const emails = await addStudents(dataDir, courseId, student, size)
    const server = await startBuiltServer({ dataDir, ...(entry ? { wrap: ([program = process.execPath]) => [program, entry] } : {}) })
    const students: Student[] = []
    for (const email of emails) {
      const visitor = await new Visitor(server.url).signIn(email, passphrase)
      const { labs } = await visitor.get<{ labs: { labId: string, shareId: string | null }[] }>(`/api/courses/${courseId}/work`)
      const shareId = labs.find(lab => lab.labId === labId)?.shareId
      if (!shareId) throw new Error(`${email} has no share.`)
      await visitor.get(`/api/shares/${shareId}/work`)
      students.push({ visitor, shareId })
    }
    return new ClassAtWork(server, dataDir, students)
  }

  /** So many students at once, each handing in so many times, the next as soon as the last was answered; how many were acknowledged: all, or it throws. */
  async handIn(clients: number, times: number): Promise<number> {
    await Promise.all(this.students.slice(0, clients).map(async ({ visitor, shareId }) => {
      for (let time = 0; time < times; time++) {
        const answer = await visitor.send('POST', `/api/shares/${shareId}/submissions`, { answers: { rate: '9.81 K/km', theta: '287.3 K' } }, { 'Idempotency-Key': `a-measured-submission-${this.sent++}` })
        if (answer.status !== 201) throw new Error(`A submission was answered ${answer.status}: ${await answer.text()}`)
        await answer.arrayBuffer()
      }
    }))
    return clients * times
  }

  async close(): Promise<void> {
    await this.server.stop()
    rmSync(this.dataDir, { recursive: true, force: true })
  }
}

async function addStudents(dataDir: string, courseId: string, first: string, size: number): Promise<string[]> {
  const stores = await openDatabase(dataDir)
  const one = await stores.read.selectFrom('person').innerJoin('credential', 'credential.person_id', 'person.id').innerJoin('membership', 'membership.person_id', 'person.id')
    .select(['argon2id', 'section_id', 'membership.id']).where('email_norm', '=', first).executeTakeFirstOrThrow()
  if (one.section_id === null) throw new Error('The first student is in no section.')
  const admin = await stores.read.selectFrom('actor').select('id').where('kind', '=', 'department_role').limit(1).executeTakeFirstOrThrow()
  const now = Date.now()
  const emails = [first]
  for (let no = 1; no < size; no++) {
    const [personId, email] = [`student-${no}`, `student.${no}@example.edu`]
    await stores.write(async (trx) => {
      await trx.insertInto('person').values({ id: personId, display_name: `Student ${no}`, email_norm: email, campus_issuer: null, campus_subject: null, state: 'active', created_at: now, erased_at: null }).execute()
      await trx.insertInto('credential').values({ person_id: personId, argon2id: one.argon2id, changed_at: now }).execute()
    })
    await enrol(stores, { actorId: admin.id, once: null, courseId, enrolment: { role: 'student', personId, sectionId: one.section_id } }, now)
    emails.push(email)
  }
  await stores.write(trx => trx.updateTable('posting').set({ attempts: 100_000 }).execute())
  await stores.close()
  return emails
}
