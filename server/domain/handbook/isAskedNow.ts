import { z } from 'zod'
import type { Read } from '../../db/writer'
import type { Actor } from '../people/actor'
import { givesAway } from './heldFamilies'

const binding = z.object({ quantity: z.string() })

/**
 * Whether a lab asks a student for this quantity, or for one that it would give away, whose marks are not released to their section: until then the calculator keeps to the
 * worked example, or it would do their steps for them.
 */
export async function isAskedNow(read: Read, actor: Pick<Actor, 'memberships'>, quantityKey: string, now: number): Promise<boolean> {
  const sections = actor.memberships.flatMap(member => member.role === 'student' ? member.sectionIds : [])
  if (sections.length === 0) return false
  const steps = await read.selectFrom('posting').innerJoin('draw', 'draw.lab_id', 'posting.lab_id').innerJoin('step', 'step.lab_revision_id', 'draw.lab_revision_id').select('step.binding_json as binding')
    .where('posting.section_id', 'in', sections).where('posting.state', '=', 'posted').where('posting.released_at', 'is', null).where('posting.opens_at', '<=', now).execute()
  return steps.map(step => binding.safeParse(JSON.parse(step.binding)).data).some(found => found !== undefined && givesAway(quantityKey, found.quantity))
}
