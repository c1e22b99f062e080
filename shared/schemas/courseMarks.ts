import { z } from 'zod'
import { marksTable, myLabMarks } from './marks'
import { repairEntry, soFar } from './repairs'

/** A course's marks: a student's own labs, or the staff's table of a section. */
export const courseMarks = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('own'), labs: z.array(myLabMarks), repairs: z.array(repairEntry), soFar }),
  z.object({ kind: z.literal('table'), table: marksTable }),
])
