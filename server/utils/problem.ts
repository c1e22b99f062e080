import type { DomainError, FieldProblem, RefusalCode} from '#shared/errors';
import { refusalWords } from '#shared/text'

/** The one mapper from refusals to HTTP statuses. */
const statusOf: Partial<Record<RefusalCode, number>> = {
  not_signed_in: 401, sign_in_failed: 401,
  not_allowed: 403, wrong_origin: 403, own_work: 403, goes_to_instructor: 403,
  not_found: 404,
  changed_meanwhile: 412, version_missing: 428,
  already_exists: 409, already_ruled: 409, dispute_exists: 409, taken_by_another: 409, plan_changed: 409, already_released: 409, import_running: 409, lab_not_draft: 409,
  lab_closed: 409, lab_not_open: 409, lab_withdrawn: 409, term_closed: 409, dispute_closed: 409, dispute_window_over: 409, attempts_used: 409, marks_shown: 409, not_released: 409, no_practice: 409, proof_open: 409, last_lead: 409, last_admin: 409, import_cancelled: 409,
  too_large: 413, file_too_large_unpacked: 413, wrong_content_type: 415, too_many_requests: 429, busy: 503, no_room: 507, read_only: 503, failed: 500,
  request_key_missing: 400,
}

/** RFC 9457: what went wrong, as JSON. */
export interface Problem {
  type: string
  title: string
  status: number
  code: string
  detail: string
  facts?: Record<string, unknown>
  errors?: readonly FieldProblem[]
}

export function problemOf(error: DomainError): Problem {
  const words = refusalWords[error.code]
  return {
    type: 'about:blank',
    title: words.title,
    status: statusOf[error.code] ?? 422,
    code: error.code,
    detail: words.detail(error.facts),
    ...(Object.keys(error.facts).length > 0 ? { facts: { ...error.facts } } : {}),
    ...(error.fields.length > 0 ? { errors: error.fields } : {}),
  }
}
