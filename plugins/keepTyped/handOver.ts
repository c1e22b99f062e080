import type { EarlyField, EarlyState } from './listenEarly'

/** A form library hands a field's value on a moment after it was typed; presses wait for that. */
const settledMs = 60

/** Does again, on the page that now answers, what `listenEarly` noted while it did not yet. */
export default defineNuxtPlugin((nuxtApp) => {
  const deeds = window.earlyDeeds
  if (!deeds) return
  delete window.earlyDeeds
  nuxtApp.hooks.hookOnce('app:error', deeds.stopListening)
  nuxtApp.hooks.hookOnce('app:suspense:resolve', async () => {
    await nextTick()
    for (const [field, state] of [...deeds.fields]) if (field.isConnected) putBack(field, state)
    setTimeout(() => {
      deeds.stopListening()
      for (const [field, sender] of deeds.acts) {
        if (!field.isConnected) continue
        if (field instanceof HTMLButtonElement) field.click()
        else field.requestSubmit(sender?.isConnected ? sender : null)
      }
    }, settledMs)
  })
})

function putBack(field: EarlyField, { value, isChecked, chosen }: EarlyState): void {
  if (field instanceof HTMLSelectElement) for (const option of field.options) option.selected = chosen.includes(option.value)
  else if (field instanceof HTMLInputElement && (field.type === 'checkbox' || field.type === 'radio')) field.checked = isChecked
  else if (field.type !== 'file' && field.value !== value) field.value = value
  field.dispatchEvent(new Event('input', { bubbles: true }))
  field.dispatchEvent(new Event('change', { bubbles: true }))
}
