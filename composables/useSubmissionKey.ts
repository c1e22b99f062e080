import { z } from 'zod'

const kept = z.object({ key: z.string(), answers: z.string(), firstAt: z.string() })

/**
 * The key under which a submission is sent. While no answer came back it stays with the same answers, over a reload too:
 * a second click, a retry after a broken line and a reopened tab are one submission. Other answers get another key.
 */
export function useSubmissionKey() {
  const placeOf = (shareId: string) => `tetherhouse.submitting.${shareId}`

  function keyFor(shareId: string, answers: Readonly<Record<string, string>>, attemptsMade: number): { key: string, firstAt: string | null } {
    const said = JSON.stringify([attemptsMade, Object.entries(answers).sort(([a], [b]) => a < b ? -1 : 1)])
    try {
      const earlier = kept.safeParse(JSON.parse(localStorage.getItem(placeOf(shareId)) ?? 'null'))
      if (earlier.success && earlier.data.answers === said) return { key: earlier.data.key, firstAt: earlier.data.firstAt }
    }
    catch {
      // a damaged or forbidden storage: a new key
    }
    const key = Array.from(crypto.getRandomValues(new Uint8Array(16)), byte => byte.toString(16).padStart(2, '0')).join('')
    try {
      localStorage.setItem(placeOf(shareId), JSON.stringify({ key, answers: said, firstAt: new Date().toISOString() }))
    }
    catch {
      // the key lives as long as this page
    }
    return { key, firstAt: null }
  }

  function forget(shareId: string) {
    try {
      localStorage.removeItem(placeOf(shareId))
    }
    catch {
      // nothing was kept
    }
  }
  return { keyFor, forget }
}
