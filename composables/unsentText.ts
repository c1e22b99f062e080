import { z } from 'zod'

/** A text that the server does not have yet, and the saved version over which it was typed. */
export interface Unsent { typed: string, baseVersion: number }

const unsentTexts = z.record(z.string(), z.object({ typed: z.string(), baseVersion: z.number().int() }))

/** One place per person and share: whoever signs in next at this browser does not see it. */
const placeOf = (who: { personId: string, shareId: string }): string => `tetherhouse.unsent.${who.personId}.${who.shareId}`

/** What this browser kept of a share's fields; nothing on the server, and nothing where storage is forbidden or damaged. */
export function unsentOf(who: { personId: string, shareId: string }): Record<string, Unsent> {
  if (!import.meta.client) return {}
  try {
    const read = unsentTexts.safeParse(JSON.parse(localStorage.getItem(placeOf(who)) ?? '{}'))
    return read.success ? read.data : {}
  }
  catch {
    return {}
  }
}

/** Keeps texts until the server has them; an empty record clears the place. */
export function keepUnsent(who: { personId: string, shareId: string }, unsent: Readonly<Record<string, Unsent>>): void {
  if (!import.meta.client) return
  try {
    if (Object.keys(unsent).length === 0) localStorage.removeItem(placeOf(who))
    else localStorage.setItem(placeOf(who), JSON.stringify(unsent))
  }
  catch {
    // A full or forbidden storage leaves the text in the page; the page says "not saved".
  }
}
