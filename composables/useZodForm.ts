import type { FormKitNode } from '@formkit/core'
import type { z } from 'zod'

/**
 * Lets a FormKit form be read by one of the schemas that the server uses: what the schema or the server refuses
 * comes back to the field it belongs to, and what was typed stays.
 */
export function useZodForm<Schema extends z.ZodType>(schema: Schema, send: (value: z.output<Schema>) => Promise<void>) {
  const problem = ref<ReturnType<typeof readProblem> | null>(null)
  const isSending = ref(false)

  async function submit(values: unknown, node: FormKitNode): Promise<void> {
    node.clearErrors()
    problem.value = null
    const read = schema.safeParse(values)
    if (!read.success) {
      node.setErrors([], byField(read.error.issues.map(issue => ({ path: issue.path.join('.'), message: issue.message }))))
      return
    }
    isSending.value = true
    try {
      await send(read.data)
    }
    catch (error) {
      problem.value = readProblem(error)
      node.setErrors([], byField(problem.value.fields))
    }
    finally {
      isSending.value = false
    }
  }

  return { submit, problem, isSending }
}

function byField(problems: readonly { path: string, message: string }[]): Record<string, string[]> {
  const fields: Record<string, string[]> = {}
  for (const { path, message } of problems) (fields[path] ??= []).push(message)
  return fields
}
