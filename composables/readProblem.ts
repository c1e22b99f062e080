import { z } from 'zod'

export interface ShownProblem {
  title: string
  detail: string
  code: string
  status: number
  fields: readonly { path: string, message: string }[]
  facts: Readonly<Record<string, unknown>>
}

const problemShape = z.object({
  title: z.string(), detail: z.string(), code: z.string(), status: z.number(),
  errors: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
  facts: z.record(z.string(), z.unknown()).optional(),
})

const failureShape = z.object({ data: z.unknown(), statusCode: z.number().optional(), status: z.number().optional() }).partial()

/** What a failed request means to a person: the server's own words where it gave some, else what can be said without them. */
export function readProblem(error: unknown): ShownProblem {
  const failure = failureShape.safeParse(error)
  // Nuxt wraps the answer of a failed request once more when it comes from a page's own error.
  const inner = failure.success ? failureShape.safeParse(failure.data.data) : null
  for (const candidate of [failure.success ? failure.data.data : undefined, inner?.success ? inner.data.data : undefined]) {
    const told = problemShape.safeParse(candidate)
    if (told.success) return { ...told.data, fields: told.data.errors ?? [], facts: told.data.facts ?? {} }
  }
  const status = failure.success ? failure.data.statusCode ?? failure.data.status ?? 0 : 0
  const bare = { code: 'unknown', status, fields: [], facts: {} }
  if (status === 0) return { ...bare, code: 'no_connection', title: 'No connection', detail: 'The request did not reach the server. What you typed is still here; try again when the connection is back.' }
  if (status === 404) return { ...bare, code: 'not_found', title: 'Not found', detail: 'There is nothing here that you can open.' }
  return { ...bare, title: 'It did not work', detail: `The server failed (${status}). What you typed is still here; try again, and tell the department admin if it goes on.` }
}
