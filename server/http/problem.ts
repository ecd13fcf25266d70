import type { ErrorRequestHandler, Request, RequestHandler } from 'express'
import type { Logger } from 'pino'
import { z } from 'zod'
import type { ErrorCode, Problem } from '../../shared/contracts/common.ts'
import { Refusal, type Issue } from '../../shared/units/refusal.ts'
import { ServiceError } from '../errors.ts'

const STATUS = {
  'invalid-input': 422,
  'not-json': 400,
  'too-large': 413,
  'unsupported-type': 415,
  'not-signed-in': 401,
  'wrong-credentials': 401,
  'too-many-attempts': 429,
  forbidden: 403,
  'cross-site': 403,
  'not-found': 404,
  conflict: 409,
  'stale-version': 412,
  'version-required': 428,
  'idempotency-reuse': 409,
  refused: 422,
  'not-allowed-now': 409,
  'processor-unavailable': 503,
  internal: 500,
} as const satisfies Record<ErrorCode, number>

const TITLE = {
  'invalid-input': 'Something in the input is not right',
  'not-json': 'The body is not JSON',
  'too-large': 'The body is too large',
  'unsupported-type': 'The body is of a type that is not taken',
  'not-signed-in': 'Not signed in',
  'wrong-credentials': 'E-mail or password is not right',
  'too-many-attempts': 'Too many attempts',
  forbidden: 'Not yours to do',
  'cross-site': 'Not asked from this site',
  'not-found': 'Not found',
  conflict: 'It conflicts with what is there',
  'stale-version': 'Changed by somebody else',
  'version-required': 'Version missing',
  'idempotency-reuse': 'Key used for something else',
  refused: 'This cannot be taken',
  'not-allowed-now': 'Not possible as things stand',
  'processor-unavailable': 'The card processor cannot be reached',
  internal: 'Something went wrong here',
} as const satisfies Record<ErrorCode, string>

/** What zod found, each with its path; unknown fields by name. */
export function issuesOf(error: z.ZodError): Issue[] {
  return error.issues.flatMap((issue): Issue[] => {
    const path = issue.path.join('.')
    if (issue.code === 'unrecognized_keys') {
      return issue.keys.map((key) => ({
        path: path ? `${path}.${key}` : key,
        message: 'there is no such field; leave it out',
      }))
    }
    return [{ path, message: issue.message }]
  })
}

/** What body parsing throws has a `type`. */
const parserFault = z.object({ type: z.string(), status: z.number() })
const PARSER_CODES: Record<string, ErrorCode> = {
  'entity.parse.failed': 'not-json',
  'entity.too.large': 'too-large',
  'encoding.unsupported': 'unsupported-type',
  'charset.unsupported': 'unsupported-type',
}
const PARSER_DETAILS: Partial<Record<ErrorCode, string>> = {
  'not-json': 'The body must be one JSON value in UTF-8.',
  'too-large': 'The body is larger than this operation takes.',
  'unsupported-type': 'Send application/json in UTF-8.',
}

function asServiceError(error: unknown): ServiceError | undefined {
  if (error instanceof ServiceError) return error
  if (error instanceof Refusal) return new ServiceError('refused', error.message, { issues: error.issues })
  const parsed = parserFault.safeParse(error)
  const code = parsed.success && (PARSER_CODES[parsed.data.type] ?? (parsed.data.status < 500 && 'not-json'))
  return code ? new ServiceError(code, PARSER_DETAILS[code] ?? '') : undefined
}

function problemOf(error: ServiceError, requestId: string): Problem {
  const { code, message, issues, current } = error
  return {
    type: code,
    title: TITLE[code],
    status: STATUS[code],
    detail: message,
    errors: [...issues],
    requestId,
    ...(current === undefined ? {} : { current }),
  }
}

/** RFC 9457. What we did not foresee is logged whole and answered with nothing but its request id. */
export function problems(logger: Logger): ErrorRequestHandler {
  return (error: unknown, req, res, next) => {
    const known = asServiceError(error)
    if (!known) logger.error({ err: error, requestId: req.id, path: req.path }, 'unforeseen')
    if (res.headersSent) {
      next(error)
      return
    }
    const shown = known ?? new ServiceError('internal', 'It has been noted under the number of this request.')
    if (shown.retryAfter !== undefined) res.set('Retry-After', String(shown.retryAfter))
    const problem = problemOf(shown, String(req.id))
    res.status(problem.status).type('application/problem+json').send(JSON.stringify(problem))
  }
}

/** For an address of the API that is none. */
export const noSuchOperation: RequestHandler = (req: Request) => {
  throw new ServiceError('not-found', `There is nothing at ${req.method} ${req.path}.`)
}
