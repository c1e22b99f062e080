import { recordDemo } from '../server/domain/people/describeDemo'
import { demoCalendar } from './calendar'
import { Department } from './department'
import { emailOf, mainStudents, staff } from './people'
import type { Stage, Workshop } from './stage'
import { tellData } from './tellData'
import { tellLabs } from './tellLabs'
import { tellPeople } from './tellPeople'
import { Timeline } from './timeline'

export type Made = Readonly<Record<'people' | 'flights' | 'submissions' | 'disputes' | 'entries', number>>

/** Makes the whole demo: what happened in the invented department until now, in the order in which it happened. */
export async function makeDemo(workshop: Workshop): Promise<Made> {
  const { stores, now, secret } = workshop
  const timeline = new Timeline(now)
  const stage: Stage = { workshop, timeline, department: new Department(stores, demoCalendar(now), secret), termIds: {}, flights: { past: [], running: [] } }
  tellPeople(stage)
  tellData(stage)
  tellLabs(stage)
  await timeline.run()
  await mailOfThePast(workshop)
  await recordDemo(stores, { secret, madeAt: now, shown: shownPeople.map(emailOf) })
  return counted(workshop)
}

/** Whose sign-ins are shown: each role, the plain ones first. */
const shownPeople = [
  staff.lead, staff.instructor, staff.ta, staff.otherTa, ...mainStudents.slice(0, 4), staff.admin, staff.technician, staff.visitor, staff.secondLead, staff.taAndStudent,
]

/** What was to be told months ago was told then; only the last day's mail is still to go out. */
async function mailOfThePast({ stores, now }: Workshop): Promise<void> {
  await stores.write(trx => trx.updateTable('outbox').set({ state: 'sent', attempts: 1 }).where('next_at', '<', now - 86_400_000).execute())
}

async function counted({ stores }: Workshop): Promise<Made> {
  const count = async (table: 'person' | 'submission' | 'dispute' | 'ledger_entry') => (await stores.read.selectFrom(table).select(each => each.fn.countAll<number>().as('n')).executeTakeFirstOrThrow()).n
  const flights = await stores.read.selectFrom('data_set').select(each => each.fn.countAll<number>().as('n')).where('kind', '=', 'flight').executeTakeFirstOrThrow()
  return { people: await count('person'), flights: flights.n, submissions: await count('submission'), disputes: await count('dispute'), entries: await count('ledger_entry') }
}
