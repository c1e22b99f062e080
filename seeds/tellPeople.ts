import { closed1004 } from '#shared/thermo/conventions/closed1004'
import { ensureConvention } from '../server/domain/labs/conventions'
import { dayOfTerm, instantOf } from './calendar'
import { mainStudents, pastStudents, smallStudents, staff } from './people'
import { termId, type Stage } from './stage'

const day = 86_400_000

/** Who came when: the first admin, colleagues, two terms, their courses and students, two late adds, one who left, a reviewer. */
export function tellPeople(stage: Stage): void {
  const { department, timeline, workshop } = stage
  const { past, running, today } = department.calendar
  const pastStart = instantOf(past.startsOn, '09:00')
  const start = instantOf(running.startsOn, '09:00')
  const colleagues = Object.values(staff)
  const late = mainStudents.slice(28)

  timeline.at(pastStart - 35 * day, async (now) => {
    await department.found(now)
    await workshop.stores.write(trx => ensureConvention(trx, closed1004, now))
  })
  timeline.at(pastStart - 34 * day, now => department.invite(colleagues, now))
  timeline.at(pastStart - 32 * day, now => department.acceptAll(colleagues, now))
  timeline.at(pastStart - 28 * day, async (now) => {
    stage.termIds.past = (await department.openPastTerm(now)).termId
    await department.appointTechnician(now)
    await department.staffMain(stage.termIds.past, [staff.formerTa, staff.taAndStudent], now)
  })
  timeline.at(pastStart - 10 * day, now => department.invite(pastStudents, now))
  timeline.at(pastStart - 8 * day, now => department.acceptAll(pastStudents, now))
  timeline.at(pastStart - 6 * day, now => department.fill(termId(stage, 'past'), 'main', pastStudents, now))
  timeline.at(pastStart - 5 * day, now => department.fill(termId(stage, 'past'), 'small', pastStudents.slice(10), now))
  timeline.at(instantOf(past.endsOn, '16:30') + 10 * day, now => department.setTerm(termId(stage, 'past'), 'closed', now))

  timeline.at(start - 24 * day, async (now) => {
    stage.termIds.running = (await department.rollOver(termId(stage, 'past'), now)).termId
    await department.setTerm(stage.termIds.running, 'running', now)
  })
  timeline.at(start - 20 * day, now => department.changeStaff(termId(stage, 'running'), now))
  timeline.at(start - 12 * day, now => department.invite([...mainStudents.slice(0, 28), ...smallStudents], now))
  timeline.at(start - 9 * day, now => department.acceptAll([...mainStudents, ...smallStudents], now))
  timeline.at(start - 7 * day, now => department.fill(termId(stage, 'running'), 'main', mainStudents.slice(0, 28), now))
  timeline.at(start - 6 * day, now => department.fill(termId(stage, 'running'), 'small', smallStudents, now))
  timeline.at(instantOf(dayOfTerm(running, 4, 2), '10:20'), now => department.invite(late, now))
  timeline.at(instantOf(dayOfTerm(running, 4, 2), '15:05'), async (now) => {
    await department.acceptAll(late, now)
    await department.fill(termId(stage, 'running'), 'main', late, now)
  })
  timeline.at(instantOf(dayOfTerm(running, 3, 3), '11:40'), async (now) => {
    const { id } = await department.course(termId(stage, 'past'), 'main')
    await department.appointVisitor([id], today.add({ weeks: 6 }).toString(), now)
  })
  timeline.at(instantOf(dayOfTerm(running, 6, 2), '09:15'), async (now) => {
    const { id } = await department.course(termId(stage, 'running'), 'main')
    await department.drop(id, mainStudents[22] ?? late[0] ?? staff.formerTa, now)
  })
}
