import { Document } from 'yaml'
import type { LabBody } from '#shared/schemas/lab'
import type { LabStep } from '#shared/schemas/steps'
import { isPlainText, isPlainTitle } from './layout'
import { writeReadings } from './readingsTable'
import { headFields } from './spelledHead'
import { stepFields } from './spelledStep'
import { writeFields } from './spelling'

const headComment = ' A lab as text: change it in any editor and take it in again where labs are begun.\n Settings stand between the dashes and in the blocks that open with ```step; the rest is Markdown, with formulas between dollar signs.'

/**
 * A lab as one text that a person can read and change: `readLabFile` makes the same lab of it again.
 * @example writeLabFile(body).startsWith('---\n') // true
 */
export function writeLabFile(body: LabBody): string {
  const { steps, practice, ...rest } = body
  const head = writeFields(headFields, { ...withoutOpen(rest, ['text', 'guide']), practice: practice && { leg: practice.leg, lowM: practice.lowM, highM: practice.highM } })
  return [
    `---\n${yamlOf(head, headComment)}---`,
    ...inTheOpen(body.text),
    ...steps.flatMap(writeStep),
    ...(practice ? [`## Readings for the practice\n\n\`\`\`readings\n${writeReadings(practice)}\n\`\`\``] : []),
    ...(body.guide !== '' && isPlainText(body.guide) ? [`# Marking guide\n\n${body.guide}`] : []),
  ].join('\n\n') + '\n'
}

function writeStep(step: LabStep): string[] {
  const hasPlainTitle = isPlainTitle(step.title)
  const settings = writeFields(stepFields[step.kind], { ...withoutOpen(step, ['text']), title: hasPlainTitle ? undefined : step.title })
  return [`## ${hasPlainTitle ? step.title : 'Step'}\n\n\`\`\`step\n${yamlOf(settings)}\`\`\``, ...inTheOpen(step.text)]
}

/** Texts that stand in the open are no settings; those that could not be told from the file's own marks are. */
function withoutOpen<Body extends object>(body: Body, names: readonly (keyof Body)[]): Record<string, unknown> {
  return Object.fromEntries(Object.entries(body).filter(([name, value]) => !names.some(open => open === name) || (typeof value === 'string' && !isPlainText(value))))
}

const inTheOpen = (text: string): string[] => text !== '' && isPlainText(text) ? [text] : []

function yamlOf(settings: Record<string, unknown>, comment?: string): string {
  const document = new Document(settings, { version: '1.2', schema: 'core', aliasDuplicateObjects: false })
  if (comment !== undefined) document.commentBefore = comment
  return document.toString({ lineWidth: 0 })
}
