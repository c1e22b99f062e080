import { z } from 'zod'
import { computeBody, computeReply } from '#shared/schemas/handbook'
import { computeQuantity } from '../../../../domain/handbook/computeQuantity'
import type { Actor } from '../../../../domain/people/actor'
import { defineApiHandler } from '../../../../utils/defineApiHandler'

export default defineApiHandler({
  action: 'reference:read',
  summary: 'Computes a quantity from typed values, with its working and a curve; stores nothing',
  params: z.object({ quantityKey: z.string().max(80) }),
  body: computeBody,
  reply: computeReply,
  handle: ({ params, body, actor }) => computeQuantity(params.quantityKey, body, isStaff(actor)),
})

function isStaff(actor: Actor | null): boolean {
  return actor !== null && (actor.memberships.some(member => member.role !== 'student') || actor.departmentRoles.length > 0)
}
