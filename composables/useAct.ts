/**
 * One act of a page: while it runs nothing is sent twice, and what went wrong is kept beside it. The request key stays the same
 * for the same content until it has succeeded, so that a repetition after a lost answer is not done twice.
 */
export function useAct() {
  const isBusy = ref(false)
  const failure = ref<unknown>(null)
  let key = ''
  let keyedContent: string | null = null

  async function run<T>(content: unknown, work: (headers: { 'Idempotency-Key': string }) => Promise<T>): Promise<T | undefined> {
    if (isBusy.value) return undefined
    isBusy.value = true
    failure.value = null
    const text = JSON.stringify(content ?? null)
    if (text !== keyedContent) {
      key = crypto.randomUUID()
      keyedContent = text
    }
    try {
      const answer = await work({ 'Idempotency-Key': key })
      keyedContent = null
      return answer
    }
    catch (error) {
      failure.value = error
      return undefined
    }
    finally {
      isBusy.value = false
    }
  }
  return { isBusy, failure, run }
}
