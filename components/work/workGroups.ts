import type { WorkStep } from '#shared/schemas/work'

/** What stands together on the work page: one step, or all entries of a fit or of a table. */
export type WorkGroup = { kind: 'one', key: string, step: WorkStep } | { kind: 'fit' | 'table', key: string, title: string, steps: WorkStep[] }

export function groupsOf(steps: readonly WorkStep[]): WorkGroup[] {
  const groups: WorkGroup[] = []
  for (const step of steps) {
    const last = groups.at(-1)
    if (!step.block || (step.kind !== 'fit' && step.kind !== 'table')) groups.push({ kind: 'one', key: step.key, step })
    else if (last && last.kind !== 'one' && last.key === step.block.key) last.steps.push(step)
    else groups.push({ kind: step.kind, key: step.block.key, title: step.block.title, steps: [step] })
  }
  return groups
}

/** A block of cells as a spreadsheet copies it: lines of cells between tabs. Null for a single value, which a field takes as it is. */
export function pastedCells(text: string): string[][] | null {
  const lines = text.replace(/\r\n?/g, '\n').replace(/\n$/, '').split('\n')
  return lines.length === 1 && !lines[0]?.includes('\t') ? null : lines.map(line => line.split('\t').map(cell => cell.trim()))
}
