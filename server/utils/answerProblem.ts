import { setResponseHeader, setResponseStatus, type H3Event } from 'h3'
import type { Problem } from './problem'

/** Answers with RFC 9457's problem+json. */
export function answerProblem<P extends Problem>(event: H3Event, problem: P): P {
  setResponseStatus(event, problem.status)
  setResponseHeader(event, 'Content-Type', 'application/problem+json; charset=utf-8')
  setResponseHeader(event, 'Cache-Control', 'no-store')
  if (problem.code === 'too_many_requests' && typeof problem.facts?.seconds === 'number') setResponseHeader(event, 'Retry-After', problem.facts.seconds)
  return problem
}
