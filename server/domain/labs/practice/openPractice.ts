import { refuse } from '#shared/errors'
import type { Read } from '../../../db/writer'
import type { LoadedShare } from '../../shares/loadedShare'
import type { ShareGround } from '../../shares/questionFor'
import { serveFlight, serveRows } from '../../shares/servedData'
import { postedGround, readGround } from '../../submissions/ground'
import { asksOf } from '../askOf'
import { practiceFlight } from './practiceFlight'

export interface AskForPractice { membershipId: string, shareId: string }

/** The practice of the lab that a share is of: the lab's own readings in place of the share's rows, and nothing of the share but its lab and convention. */
export async function openPractice(read: Read, loadShare: (shareId: string) => Promise<LoadedShare>, who: AskForPractice, now: number) {
  postedGround(await readGround(read, who.shareId, who.membershipId), now)
  const { revision: { body }, convention } = await loadShare(who.shareId)
  const { practice } = body
  if (!practice) return refuse('no_practice')
  const rows = serveRows(serveFlight(practiceFlight(practice), body), practice)
  const ground: ShareGround = { rows, convention, share: { item: { lowM: practice.lowM, highM: practice.highM } }, revision: { body } }
  const asks = asksOf(body, convention, { item: practice, heightDatum: 'ground', rows })
  return { body, practice, rows, ground, asks }
}
