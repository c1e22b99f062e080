/**
 * What can go wrong in a way that is expected. A code is stable: pages choose their words by it (`text.ts`),
 * and `server/utils/problem.ts` alone turns it into a status.
 */
export const refusalCodes = [
  // asking
  'not_signed_in', 'not_found', 'not_allowed', 'invalid', 'too_large', 'too_many_requests', 'wrong_content_type', 'wrong_origin',
  'request_key_missing', 'request_key_reused', 'version_missing', 'changed_meanwhile', 'no_room', 'read_only', 'busy', 'failed',
  // people
  'sign_in_failed', 'token_invalid', 'passphrase_too_short', 'passphrase_too_common', 'already_exists',
  // terms and rosters
  'term_closed', 'plan_changed', 'roster_unreadable', 'last_lead', 'last_admin',
  // data
  'file_empty', 'file_header_only', 'file_binary', 'file_wrong_delimiter', 'file_line_too_long', 'file_not_gzip', 'file_cut', 'file_quote_open', 'file_too_many_columns', 'file_too_large_unpacked', 'no_time_column', 'no_height_column',
  'column_missing', 'zone_unknown', 'nothing_taken', 'import_cancelled', 'import_running', 'import_failed', 'too_many_stations', 'flight_too_long',
  // labs
  'convention_open', 'lab_text_unreadable', 'lab_not_draft', 'lab_closed', 'lab_not_open', 'lab_withdrawn', 'share_degenerate', 'binding_invalid', 'band_too_wide', 'proof_open', 'no_practice', 'no_share', 'dates_invalid', 'not_released', 'already_released',
  'nothing_to_submit', 'attempts_used', 'marks_shown', 'wrong_dimension',
  // moderation
  'dispute_exists', 'dispute_closed', 'dispute_window_over', 'own_work', 'taken_by_another', 'already_ruled', 'goes_to_instructor', 'points_out_of_range',
] as const
export type RefusalCode = (typeof refusalCodes)[number]

export interface FieldProblem { path: string, message: string }

/** A refusal that the asker should hear of: what, where, and the facts that the words need. */
export class DomainError extends Error {
  override readonly name = 'DomainError'
  constructor(readonly code: RefusalCode, readonly facts: Readonly<Record<string, string | number | boolean | null>> = {}, readonly fields: readonly FieldProblem[] = []) {
    super(code)
  }
}

/** Refuses. Its type lets it stand where a value is expected. */
export function refuse(code: RefusalCode, facts?: Readonly<Record<string, string | number | boolean | null>>, fields?: readonly FieldProblem[]): never {
  throw new DomainError(code, facts, fields)
}
