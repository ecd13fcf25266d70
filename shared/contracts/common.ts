import { z } from 'zod'

export const id = z.uuid()
export const instant = z.iso.datetime()
export const day = z.iso.date()
export const text = (max: number) => z.string().trim().min(1).max(max)
export const email = z.email().max(254).toLowerCase()
export const safeInteger = z.int().min(-Number.MAX_SAFE_INTEGER).max(Number.MAX_SAFE_INTEGER)
/** Exact decimal on the wire, such as "1591.84". */
export const decimal = z.string().regex(/^-?\d{1,12}(\.\d{1,12})?$/, 'a decimal number such as 12.50')

export const money = z.strictObject({ amount: safeInteger, currency: z.string().regex(/^[A-Z]{3}$/) })
export type MoneyDto = z.infer<typeof money>

export const ROLES = ['contractor', 'estimator', 'accounts', 'admin'] as const
export const role = z.enum(ROLES)
export type RoleName = z.infer<typeof role>

export const pageQuery = z.strictObject({
  limit: z.coerce.number().int().min(1).max(50).default(25),
  cursor: z.string().max(200).optional(),
  q: z.string().trim().max(100).optional(),
})

export function pageOf<T extends z.ZodType>(item: T) {
  return z.object({ items: z.array(item), nextCursor: z.string().nullable() })
}

/** Stable error codes; the server maps each to its status in one exhaustive map. */
export const ERROR_CODES = [
  'invalid-input',
  'not-json',
  'too-large',
  'unsupported-type',
  'not-signed-in',
  'wrong-credentials',
  'too-many-attempts',
  'forbidden',
  'cross-site',
  'not-found',
  'conflict',
  'stale-version',
  'version-required',
  'idempotency-reuse',
  'refused',
  'not-allowed-now',
  'processor-unavailable',
  'internal',
] as const
export type ErrorCode = (typeof ERROR_CODES)[number]

/** application/problem+json, RFC 9457. `type` is one of our stable codes. */
export const problem = z.object({
  type: z.enum(ERROR_CODES),
  title: z.string(),
  status: z.int(),
  detail: z.string(),
  errors: z.array(z.object({ path: z.string(), message: z.string() })).default([]),
  requestId: z.string(),
  current: z.unknown().optional(),
})
export type Problem = z.infer<typeof problem>

export const nothing = z.object({})
export const byId = z.strictObject({ id })
