import type { NoticeFacts } from '#shared/schemas/notices'
import type { Letter } from '../letter'

export function marksReleased(facts: NoticeFacts<'marks_released'>, link: (path: string) => string): Letter {
  return {
    subject: `Marks are out: ${facts.lab}`,
    says: [`The marks for ${facts.lab} (${facts.course}) are released. The worked values for your data are beside them.`],
    link: { words: 'See your marks', url: link(facts.path) },
  }
}
