export type EarlyField = HTMLInputElement | HTMLTextAreaElement | HTMLSelectElement

/** What a field held when it was last changed by the person in front of it. */
export interface EarlyState { value: string, isChecked: boolean, chosen: string[] }

export interface EarlyDeeds {
  fields: Map<EarlyField, EarlyState>
  /** Buttons pressed and forms sent, each once, in their order; what sent a form stands with it. */
  acts: Map<HTMLButtonElement | HTMLFormElement, HTMLElement | null>
  /** From here on the page answers for itself. */
  stopListening: () => void
}

declare global {
  interface Window { earlyDeeds?: EarlyDeeds }
}

/**
 * Runs in the head of each page, before anything can be typed. A page that the server drew can be seen seconds before its scripts
 * take it over, and taking over sets each field to what the server knew: what was typed meanwhile would be gone, a press would do
 * nothing, and a form would be sent as an address with its fields in it. So all of it is noted here, and `handOver` does it again.
 *
 * Its source text goes into the page: it stands alone, without imports and without anything outside it.
 */
export function listenEarly(): void {
  const fields: EarlyDeeds['fields'] = new Map()
  const acts: EarlyDeeds['acts'] = new Map()
  const isField = (target: EventTarget | null): target is EarlyField =>
    target instanceof HTMLInputElement || target instanceof HTMLTextAreaElement || target instanceof HTMLSelectElement

  const note = (event: Event) => {
    const field = event.target
    if (!isField(field)) return
    fields.delete(field) // of two choices in a group the later one comes last
    fields.set(field, {
      value: field.value,
      isChecked: field instanceof HTMLInputElement && field.checked,
      chosen: field instanceof HTMLSelectElement ? Array.from(field.selectedOptions, option => option.value) : [],
    })
  }
  // The next stroke goes onto what was typed before, where the scripts have emptied the field between two strokes.
  const mend = (event: Event) => {
    const field = event.target
    if (!isField(field) || field instanceof HTMLSelectElement) return
    const noted = fields.get(field)
    if (!noted || noted.value === field.value || noted.value === '') return
    field.value = noted.value
  }
  const hold = (event: Event) => {
    event.preventDefault()
    event.stopImmediatePropagation()
  }
  const press = (event: Event) => {
    const button = event.target instanceof Element ? event.target.closest('button') : null
    if (!button || (button.form && button.type === 'submit')) return
    hold(event)
    acts.set(button, null)
  }
  const send = (event: SubmitEvent) => {
    if (!(event.target instanceof HTMLFormElement)) return
    hold(event)
    acts.set(event.target, event.submitter)
  }

  document.addEventListener('beforeinput', mend, true)
  document.addEventListener('input', note, true)
  document.addEventListener('change', note, true)
  document.addEventListener('click', press, true)
  document.addEventListener('submit', send, true)
  window.earlyDeeds = {
    fields,
    acts,
    stopListening: () => {
      document.removeEventListener('beforeinput', mend, true)
      document.removeEventListener('input', note, true)
      document.removeEventListener('change', note, true)
      document.removeEventListener('click', press, true)
      document.removeEventListener('submit', send, true)
    },
  }
}
