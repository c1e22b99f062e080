import type { FormKitNode } from '@formkit/core'

/** Which classes of ours FormKit's parts wear; the rest of its parts go bare. */
const classes: Readonly<Record<string, readonly string[]>> = {
  outer: ['field'],
  label: ['label'],
  legend: ['label'],
  help: ['help'],
  message: ['wrong'],
  options: ['pick'],
}

export function rootClasses(section: string, node: FormKitNode): Record<string, boolean> {
  if (section === 'outer' && (node.props.type === 'form' || node.props.type === 'hidden')) return {}
  return Object.fromEntries((classes[section] ?? []).map(name => [name, true]))
}
