import type { z } from 'zod'
import type { labPreviewReply } from '#shared/schemas/labReplies'
import { draftOf, type LabDraft } from './labDraft'
import { readDraft } from './readDraft'
import type { EditedLab } from './quantityList'

type Preview = Pick<z.output<typeof labPreviewReply>, 'html' | 'asks' | 'stepHtml' | 'problems'>

const quiet = 450 // ms without a key before the server is asked for a preview

/** The editor's state: fields as typed, what the server makes of them while one writes, and keeping them against the version that was seen. */
export function useLabEditor(lab: Ref<EditedLab>) {
  const draft = ref<LabDraft>(draftOf(lab.value.revision.body))
  const version = ref(lab.value.version)
  const preview = ref<Preview>({ html: lab.value.html, asks: lab.value.asks, stepHtml: lab.value.stepHtml, problems: lab.value.problems })
  const isKept = ref(true)
  const isKeeping = ref(false)
  const failure = ref<unknown>(null)
  const read = computed(() => readDraft(draft.value))
  /** What the fields say, and where they can be read, what the reference says of the bindings. */
  const problems = computed(() => read.value.body ? preview.value.problems : read.value.problems)

  let asked = 0
  async function askPreview(): Promise<void> {
    const mine = ++asked
    try {
      const told = await $fetch<Preview>(`/api/labs/${lab.value.id}/preview`, { method: 'POST', body: { text: draft.value.text.slice(0, 40_000), body: read.value.body } })
      if (mine !== asked) return
      preview.value = read.value.body ? told : { ...preview.value, html: told.html }
    }
    catch {
      // the next key asks again; keeping says what is wrong
    }
  }

  let timer: ReturnType<typeof setTimeout> | undefined
  watch(draft, () => {
    isKept.value = false
    clearTimeout(timer)
    timer = setTimeout(askPreview, quiet)
  }, { deep: true })
  onBeforeUnmount(() => clearTimeout(timer))

  /** The version that somebody else saved meanwhile; null while nobody did. */
  const newer = computed(() => {
    const problem = failure.value === null ? null : readProblem(failure.value)
    return problem?.code === 'changed_meanwhile' && typeof problem.facts.version === 'number' ? problem.facts.version : null
  })

  /** What one has typed in place of what the other saved: asked for in so many words, never by itself. */
  async function keepOver(): Promise<boolean> {
    if (newer.value === null) return false
    version.value = newer.value
    return keep()
  }

  async function keep(): Promise<boolean> {
    if (!read.value.body) return false
    isKeeping.value = true
    failure.value = null
    const sent = JSON.stringify(draft.value)
    try {
      const told = await $fetch<{ version: number }>(`/api/labs/${lab.value.id}/revision`, { method: 'PUT', headers: { 'If-Match': String(version.value) }, body: read.value.body })
      version.value = told.version
      if (sent === JSON.stringify(draft.value)) isKept.value = true
      return true
    }
    catch (error) {
      failure.value = error
      return false
    }
    finally {
      isKeeping.value = false
    }
  }

  return { draft, version, preview, problems, read, isKept, isKeeping, failure, newer, keep, keepOver }
}
