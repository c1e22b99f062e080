import { askedSteps } from '#shared/schemas/askedSteps'
import type { Practice } from '#shared/schemas/practice'
import type { Read } from '../../../db/writer'
import type { LoadedShare } from '../../shares/loadedShare'
import { servedJson } from '../../shares/servedShare'
import { renderLabText } from '../renderLabText'
import { openPractice, type AskForPractice } from './openPractice'
import { practicedSteps } from './practicedSteps'

/** What a student practices on: the lab's own readings and the steps that can be tried on them. No worked answer is in it. */
export async function readPractice(read: Read, loadShare: (shareId: string) => Promise<LoadedShare>, who: AskForPractice, now: number): Promise<Practice> {
  const { body, practice, rows, asks } = await openPractice(read, loadShare, who, now)
  const practiced = new Set(practicedSteps(body).map(step => step.key))
  return {
    title: body.title, served: servedJson(rows, practice, 'ground'),
    steps: askedSteps(body).map((step, at) => ({
      key: step.key, no: at + 1, title: step.title, isTried: practiced.has(step.key), isOwnReading: step.kind === 'reading',
      ask: practiced.has(step.key) ? asks[step.key] ?? step.title : '', textHtml: practiced.has(step.key) && step.text !== '' ? renderLabText(step.text) : '',
    })),
  }
}
