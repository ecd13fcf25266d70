import { z } from 'zod'
import { REVISION_STATUSES } from '../quoting/statuses.ts'
import { decimal, id, instant, money, pageQuery, text } from './common.ts'
import { basePlateAnswer, columnCheck } from './checks.ts'
import { lineSpec, pricedQuote, shownLineSpec } from './pricing.ts'
import { alternative } from './proposals.ts'
import { lineRequirement } from './requirement.ts'
import { outline } from './sections.ts'

export const quoteLine = z.object({
  mark: z.string(),
  requirement: lineRequirement,
  spec: shownLineSpec,
  check: columnCheck,
  base: basePlateAnswer.nullable(),
  designationSI: z.string(),
  outline,
  depth: z.number(),
  width: z.number(),
  /** Shop only: what else would do, priced. */
  alternatives: z.array(alternative).optional(),
})
export type QuoteLineDto = z.infer<typeof quoteLine>

export const revision = z.object({
  letter: z.string(),
  status: z.enum(REVISION_STATUSES),
  version: z.int(),
  lines: z.array(quoteLine),
  price: pricedQuote,
  /** Percent the customer is given off, as a fraction: "0.05". */
  discount: decimal,
  note: z.string(),
  approvedBy: z.string().nullable(),
  approvedAt: instant.nullable(),
  sentAt: instant.nullable(),
  validUntil: instant.nullable(),
  answeredBy: z.string().nullable(),
  answeredAt: instant.nullable(),
  answerReason: z.string().nullable(),
  /** Why it cannot be approved now, each in words; empty when it can. Shop only. */
  blockers: z.array(z.string()).optional(),
})
export type RevisionDto = z.infer<typeof revision>

export const letterEntry = z.object({
  id,
  subject: z.string(),
  to: z.string(),
  status: z.enum(['waiting', 'sent', 'parked']),
  attempts: z.int(),
  createdAt: instant,
  sentAt: instant.nullable(),
})
export const quoteDto = z.object({
  id,
  number: z.string(),
  request: z.object({ id, number: z.string(), title: z.string() }),
  company: z.object({ id, name: z.string() }),
  contact: z.object({ name: z.string(), email: z.string() }),
  shipTo: z.object({ address: z.string(), region: z.string(), km: z.number() }),
  revisions: z.array(
    z.object({
      letter: z.string(),
      status: z.enum(REVISION_STATUSES),
      total: money,
      sentAt: instant.nullable(),
    }),
  ),
  current: revision,
  order: z.object({ id, number: z.string(), status: z.string() }).nullable(),
  basis: z.array(z.string()),
  exclusions: z.array(z.string()),
  cautions: z.array(z.string()),
  /** Shop only: e-mails about it, with their fate. */
  letters: z.array(letterEntry).optional(),
})
export type QuoteDto = z.infer<typeof quoteDto>
export const quoteSummary = z.object({
  id,
  number: z.string(),
  letter: z.string(),
  status: z.enum(REVISION_STATUSES),
  title: z.string(),
  company: z.object({ id, name: z.string() }),
  total: money,
  validUntil: instant.nullable(),
  createdAt: instant,
})
export const quotesQuery = pageQuery.extend({ status: z.enum(REVISION_STATUSES).optional() })
export const quoteAt = z.strictObject({ id, letter: z.string().regex(/^[A-Z]{1,2}$/) })

/** The estimator's edit of a draft: the whole work as it shall be. */
export const revisionBody = z.strictObject({
  lines: z.array(lineSpec).min(1).max(200),
  discount: decimal.default('0'),
  note: z.string().trim().max(2000).default(''),
})
export const acceptBody = z.strictObject({
  name: text(120),
  cautionsRead: z.literal(true, 'read and confirm the cautions before accepting'),
})
export const declineBody = z.strictObject({ name: text(120), reason: text(500) })
export const acceptAnswer = z.object({ order: z.object({ id, number: z.string() }) })
