import { z } from 'zod'
import { REQUEST_STATUSES } from '../quoting/statuses.ts'
import { byId, id, instant, money, pageQuery, text } from './common.ts'
import { lineRequirement } from './requirement.ts'

export const shipTo = z.strictObject({
  address: text(300),
  /** Tax region of the ship-to address. */
  region: text(40),
  km: z.number().min(0).max(5000),
})
export const requestBody = z.strictObject({
  title: text(120),
  shipTo,
  neededBy: z.iso.date().nullable().default(null),
  notes: z.string().trim().max(2000).default(''),
  lines: z.array(lineRequirement).min(1).max(200),
})
/** A line as kept: what was asked and what the engine offered when it was last saved. */
export const requestLine = z.object({
  id,
  position: z.int(),
  requirement: lineRequirement,
  offered: z.object({ section: z.string(), utilisation: z.number(), unitPrice: money }).nullable(),
})
export const requestDto = z.object({
  id,
  number: z.string(),
  version: z.int(),
  status: z.enum(REQUEST_STATUSES),
  title: z.string(),
  company: z.object({ id, name: z.string() }),
  contact: z.object({ id, name: z.string() }),
  shipTo,
  neededBy: z.string().nullable(),
  notes: z.string(),
  reason: z.string().nullable(),
  lines: z.array(requestLine),
  /** Indicative, of the offered shapes; null until every line has one. */
  indicativeTotal: money.nullable(),
  quote: z.object({ id, number: z.string() }).nullable(),
  createdAt: instant,
  submittedAt: instant.nullable(),
})
export type RequestDto = z.infer<typeof requestDto>
export const requestSummary = requestDto
  .pick({
    id: true,
    number: true,
    status: true,
    title: true,
    company: true,
    neededBy: true,
    indicativeTotal: true,
    quote: true,
    createdAt: true,
    submittedAt: true,
  })
  .extend({ marks: z.int(), pieces: z.int() })
export const requestsQuery = pageQuery.extend({ status: z.enum(REQUEST_STATUSES).optional() })
export const reasonBody = z.strictObject({ reason: text(500) })
export { byId }
