import type { FormKitNode } from '@formkit/core'

/** Puts each message below the field that it is about, and gives back those that are about no field of the form. */
export function placeProblems(node: FormKitNode | undefined, fields: readonly { path: string, message: string }[]): string[] {
  const placed: Record<string, string> = {}
  const rest: string[] = []
  for (const { path, message } of fields) {
    const name = path.split('.').find(part => node?.at(part))
    if (name) placed[name] ??= message
    else if (!rest.includes(message)) rest.push(message)
  }
  node?.setErrors([], placed)
  return rest
}
