import type { Read } from '../../db/writer'

/** What staff accepted of late work: it stands in place of what was decided at receipt, which stays stored. */
export interface AcceptedLateness { lateUnits: number, lateRuleJson: string }

export async function acceptedLateness(read: Read, submissionIds: readonly string[]): Promise<ReadonlyMap<string, AcceptedLateness>> {
  if (submissionIds.length === 0) return new Map()
  const rows = await read.selectFrom('repair').select(['submission_id', 'late_units', 'late_rule_json']).where('submission_id', 'in', [...submissionIds]).execute()
  return new Map(rows.flatMap(row => row.submission_id === null || row.late_units === null || row.late_rule_json === null ? [] : [[row.submission_id, { lateUnits: row.late_units, lateRuleJson: row.late_rule_json }] as const]))
}
