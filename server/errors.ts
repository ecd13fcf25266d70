import type { ErrorCode } from '../shared/contracts/common.ts'
import type { Issue } from '../shared/units/refusal.ts'

interface Extra {
  issues?: readonly Issue[]
  /** The state that a stale write ran into. */
  current?: unknown
  /** Seconds after which it is worth trying again. */
  retryAfter?: number
}

/** Anything that a caller may be told. Only `http/` knows which status it has. */
export class ServiceError extends Error {
  readonly code: ErrorCode
  readonly issues: readonly Issue[]
  readonly current: unknown
  readonly retryAfter: number | undefined

  constructor(code: ErrorCode, detail: string, { issues = [], current, retryAfter }: Extra = {}) {
    super(detail)
    this.name = 'ServiceError'
    this.code = code
    this.issues = issues
    this.current = current
    this.retryAfter = retryAfter
  }
}

export function fail(code: ErrorCode, detail: string, extra?: Extra): never {
  throw new ServiceError(code, detail, extra)
}

/** For a record that is not there, or is not the caller's to know of. */
export function notFound(what: string): never {
  fail('not-found', `There is no such ${what}, or it is not yours to see.`)
}
