import { askedOf } from '#shared/schemas/askedSteps'
import type { LabBody } from '#shared/schemas/lab'
import type { StepKind } from '#shared/schemas/steps'
import type { DraftStep } from './labDraft'

/** The kinds of step, as an author chooses among them. */
export const kindWords: Readonly<Record<StepKind, string>> = {
  number: 'number', fit: 'fit to the layer', table: 'table', diagram: 'read off the plot', reading: 'own reading', choice: 'choice',
}
export const stepKinds: readonly { kind: StepKind, word: string, says: string }[] = [
  { kind: 'number', word: kindWords.number, says: 'one value with its unit, or a class' },
  { kind: 'fit', word: kindWords.fit, says: 'slope, intercept and standard error' },
  { kind: 'table', word: kindWords.table, says: 'values in rows and columns' },
  { kind: 'diagram', word: kindWords.diagram, says: 'good to half a division' },
  { kind: 'reading', word: kindWords.reading, says: 'on an instrument, beside the station' },
  { kind: 'choice', word: kindWords.choice, says: 'one or several options, with reasons' },
]

/** What each step asks: key and title of its entries, as they stand in the fields now. */
export function entriesOf(step: DraftStep, body: LabBody | null): { key: string, title: string }[] {
  const read = body?.steps.find(each => each.key === step.key)
  if (read) return askedOf(read).map(({ key, title }) => ({ key, title }))
  if (step.kind === 'fit') return [{ key: `${step.key}-slope`, title: `${step.title}: lapse rate` }]
  return step.kind === 'table' ? [] : [{ key: step.key, title: step.title }]
}
