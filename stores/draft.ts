import { defineStore } from 'pinia'
import type { SavedDraft } from '#shared/schemas/work'
import { readProblem } from '~/composables/readProblem'
import { keepUnsent, unsentOf, type Unsent } from '~/composables/unsentText'

/** What the server has of a field. */
export interface SavedText { typed: string, version: number, savedAt: string | null }

export type FieldState = 'saved' | 'typing' | 'saving' | 'no_connection' | 'conflict' | 'refused'

/** One field of a share: what is typed here, what the server has, and what stands between them. */
export interface DraftField {
  typed: string
  saved: SavedText
  state: FieldState
  /** The text that another tab or device saved meanwhile; shown beside the one typed here. */
  other: SavedText | null
  /** Why the server would not take it. */
  refusal: string | null
}

const pause = 700
const retryAfter = 5000

/**
 * What a student has typed, kept until the server has it: saved as it is typed, in the browser while there is no connection,
 * and never over what another tab or device saved.
 */
export const useDraftStore = defineStore('draft', () => {
  const owner = ref<{ personId: string, shareId: string } | null>(null)
  const fields = ref<Record<string, DraftField>>({})
  /** Since when the server does not answer; null while it does. */
  const silentSince = ref<string | null>(null)
  const isSignedOut = ref(false)
  const timers = new Map<string, ReturnType<typeof setTimeout>>()
  const sending = new Set<string>()

  const isAllSaved = computed(() => Object.values(fields.value).every(field => field.state === 'saved'))
  const typedAnswers = computed(() => Object.fromEntries(Object.entries(fields.value).map(([key, field]) => [key, field.typed])))

  /** Opens a share: the server's texts, and over them what this browser still had to send. */
  function open(who: { personId: string, shareId: string }, stepKeys: readonly string[], saved: readonly { stepKey: string, typed: string, version: number, savedAt: string }[]) {
    for (const timer of timers.values()) clearTimeout(timer)
    timers.clear()
    owner.value = who
    silentSince.value = null
    isSignedOut.value = false
    fields.value = Object.fromEntries(stepKeys.map((key) => {
      const found = saved.find(draft => draft.stepKey === key)
      const text: SavedText = found ? { typed: found.typed, version: found.version, savedAt: found.savedAt } : { typed: '', version: 0, savedAt: null }
      return [key, { typed: text.typed, saved: text, state: 'saved', other: null, refusal: null } satisfies DraftField]
    }))
  }

  /** Takes up what this browser kept from an earlier visit. Only in the browser: the server's page knows nothing of it. */
  function takeUp() {
    if (!owner.value) return
    for (const [key, unsent] of Object.entries(unsentOf(owner.value))) {
      const field = fields.value[key]
      if (!field || unsent.typed === field.saved.typed) continue
      field.typed = unsent.typed
      if (unsent.baseVersion === field.saved.version) send(key)
      else setConflict(field, field.saved)
    }
    keep()
  }

  function write(key: string, typed: string) {
    const field = fields.value[key]
    if (!field || field.typed === typed) return
    field.typed = typed
    field.refusal = null
    if (field.state !== 'conflict') {
      field.state = 'typing'
      later(key, pause)
    }
    keep()
  }

  function later(key: string, wait: number) {
    clearTimeout(timers.get(key))
    timers.set(key, setTimeout(() => send(key), wait))
  }

  function setConflict(field: DraftField, other: SavedText) {
    field.state = 'conflict'
    field.other = other
  }

  async function send(key: string) {
    const field = fields.value[key]
    const who = owner.value
    if (!field || !who || field.state === 'conflict' || sending.has(key)) return
    if (field.typed === field.saved.typed) {
      field.state = 'saved'
      return keep()
    }
    const typed = field.typed
    field.state = 'saving'
    sending.add(key)
    try {
      const saved = await $fetch<SavedDraft>(`/api/shares/${who.shareId}/drafts/${key}`, { method: 'PUT', body: { typed, baseVersion: field.saved.version } })
      field.saved = { typed: saved.typed, version: saved.version, savedAt: saved.savedAt }
      field.state = field.typed === typed ? 'saved' : 'typing'
      silentSince.value = null
      isSignedOut.value = false
    }
    catch (error) {
      meet(field, error)
    }
    finally {
      sending.delete(key)
      keep()
    }
    const next = fields.value[key]?.state
    if (next === 'typing') later(key, pause)
    if (next === 'no_connection') later(key, retryAfter)
  }

  function meet(field: DraftField, error: unknown) {
    const problem = readProblem(error)
    if (problem.code === 'changed_meanwhile' && typeof problem.facts.typed === 'string' && typeof problem.facts.version === 'number') {
      return setConflict(field, { typed: problem.facts.typed, version: problem.facts.version, savedAt: typeof problem.facts.savedAt === 'string' ? problem.facts.savedAt : null })
    }
    if (problem.status === 0 || problem.status >= 500) {
      silentSince.value ??= new Date().toISOString()
      field.state = 'no_connection'
      return
    }
    if (problem.code === 'not_signed_in') isSignedOut.value = true
    field.state = 'refused'
    field.refusal = problem.fields[0]?.message ?? problem.detail
  }

  /** Two texts stand beside each other: the person takes one. */
  function settle(key: string, which: 'here' | 'other') {
    const field = fields.value[key]
    if (!field?.other) return
    field.saved = field.other
    if (which === 'other') field.typed = field.other.typed
    field.other = null
    field.state = 'typing'
    void send(key)
  }

  /** Sends what is waiting: when the connection is back, and before submitting. */
  async function sendAll() {
    const open = Object.entries(fields.value).filter(([, field]) => field.state !== 'saved' && field.state !== 'conflict')
    for (const [key] of open) clearTimeout(timers.get(key))
    await Promise.all(open.map(([key]) => send(key)))
  }

  function keep() {
    if (!owner.value) return
    const unsent: Record<string, Unsent> = {}
    for (const [key, field] of Object.entries(fields.value)) {
      if (field.typed !== field.saved.typed) unsent[key] = { typed: field.typed, baseVersion: field.saved.version }
    }
    keepUnsent(owner.value, unsent)
  }

  return { owner, fields, silentSince, isSignedOut, isAllSaved, typedAnswers, open, takeUp, write, settle, sendAll }
})
