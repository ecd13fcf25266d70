import type { PaymentStatus } from '../../../shared/quoting/statuses.ts'

export interface PaymentsTable {
  /** Also the key under which the processor is asked: however often, one checkout. */
  id: string
  orderId: string
  purpose: 'deposit'
  status: PaymentStatus
  amount: number
  currency: string
  sessionId: string | null
  sessionUrl: string | null
  sessionExpiresAt: string | null
  failure: string | null
  createdAt: string
  settledAt: string | null
}

/** What the processor said, kept before it is acted on; each event once. */
export interface StripeEventsTable {
  id: string
  type: string
  /** The checkout session or payment intent that it is about. */
  objectId: string
  receivedAt: string
  handledAt: string | null
  attempts: number
  /** When it is tried next; while somebody is at it, when it would be free again. */
  nextAt: string
  outcome: string | null
}
