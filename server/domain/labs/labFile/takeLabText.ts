import { refuse } from '#shared/errors'
import type { Read } from '../../../db/writer'
import { latestRevision } from '../latestRevision'
import { writeLabFile } from './writeLabFile'

/** A lab as it stands, as the text that a person opens in an editor, with a file name made from its title. */
export async function takeLabText(read: Read, labId: string): Promise<{ name: string, text: string }> {
  const lab = await read.selectFrom('lab').select('id').where('id', '=', labId).executeTakeFirst()
  if (!lab) return refuse('not_found')
  const { body } = await latestRevision(read, lab.id)
  const name = body.title.toLowerCase().normalize('NFKD').replace(/[^a-z0-9]+/g, '-').replace(/^-+|-+$/g, '').slice(0, 60)
  return { name: `${name || 'lab'}.md`, text: writeLabFile(body) }
}
