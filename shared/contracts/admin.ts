import { z } from 'zod'
import { id, instant, pageQuery } from './common.ts'

/** The price book in force as sections of named figures, for reading. */
export const priceBookAnswer = z.object({
  version: z.int(),
  firstDay: z.iso.date(),
  currency: z.string(),
  groups: z.array(
    z.object({
      title: z.string(),
      rows: z.array(z.object({ name: z.string(), value: z.string(), unit: z.string() })),
    }),
  ),
})
export const auditEntry = z.object({
  id: z.int(),
  at: instant,
  who: z.string(),
  action: z.string(),
  record: z.string(),
  before: z.unknown(),
  after: z.unknown(),
})
export const auditAnswer = z.object({
  items: z.array(auditEntry),
  nextCursor: z.string().nullable(),
  chain: z.enum(['whole', 'broken']),
})
export const auditQuery = pageQuery
export { id }
