import { z } from 'zod'
import { ORDER_STATUSES, PAYMENT_STATUSES } from '../quoting/statuses.ts'
import { id, instant, money, pageQuery } from './common.ts'

export const payment = z.object({
  id,
  purpose: z.enum(['deposit']),
  status: z.enum(PAYMENT_STATUSES),
  amount: money,
  failure: z.string().nullable(),
  createdAt: instant,
  settledAt: instant.nullable(),
})
export const orderDto = z.object({
  id,
  number: z.string(),
  status: z.enum(ORDER_STATUSES),
  title: z.string(),
  company: z.object({ id, name: z.string() }),
  quote: z.object({ id, number: z.string(), letter: z.string() }),
  total: money,
  deposit: z.object({ due: money, paid: money }),
  acceptedBy: z.string(),
  acceptedAt: instant,
  releasedAt: instant.nullable(),
  payments: z.array(payment),
  progress: z.array(z.object({ status: z.enum(ORDER_STATUSES), at: instant, by: z.string() })),
})
export type OrderDto = z.infer<typeof orderDto>
export const orderSummary = orderDto.pick({
  id: true,
  number: true,
  status: true,
  title: true,
  company: true,
  total: true,
  deposit: true,
  acceptedAt: true,
})
export const ordersQuery = pageQuery.extend({ status: z.enum(ORDER_STATUSES).optional() })
/** Where the payer goes: the card processor's hosted page. */
export const checkoutAnswer = z.object({ url: z.url(), amount: money })
