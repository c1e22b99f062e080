import { askedSteps } from '#shared/schemas/askedSteps'
import type { LabBody } from '#shared/schemas/lab'
import type { Read } from '../../db/writer'
import type { Observations } from '../../observations/chunks'
import { servedJson } from '../shares/servedShare'
import { bindingProblems } from './bindingProblems'
import { checkShare, shareTitle } from './checkShare'
import { prepareLab } from './prepareLab'
import { renderLabText } from './renderLabText'
import { asksOf } from './askOf'

/** What an author is writing, as a student would see it: text, asks, and one share with its data, the worked values beside it. Nothing is kept. */
export async function previewLab(read: Read, observations: Observations, input: { labId: string, text: string, body: LabBody | null, shareNo?: number | undefined }) {
  const html = renderLabText(input.text)
  if (!input.body) return { html, asks: {}, stepHtml: {}, problems: [], share: null }
  const lab = await prepareLab(read, observations, input.labId, input.body)
  const problems = bindingProblems(lab)
  const item = input.shareNo === undefined ? undefined : lab.items[input.shareNo]
  const canShow = item !== undefined && problems.length === 0
  const shown = canShow ? lab.serve(item) : null
  return {
    html, problems,
    asks: asksOf(input.body, lab.convention, null),
    stepHtml: Object.fromEntries(askedSteps(input.body).map(step => [step.key, step.text === '' ? '' : renderLabText(step.text)])),
    share: canShow && shown
      ? {
          no: input.shareNo ?? 0, of: lab.items.length, title: shareTitle(lab, item),
          served: servedJson(shown.rows, item, lab.flightOf(item.versionId).flight.heightDatum), asks: shown.asks, answers: checkShare(lab, item).steps,
        }
      : null,
  }
}
