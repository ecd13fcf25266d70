import type { OrderStatus } from '../../../shared/quoting/statuses.ts'

export interface OrdersTable {
  id: string
  number: string
  quoteId: string
  /** Of the revision that was accepted. */
  letter: string
  companyId: string
  contactId: string
  status: OrderStatus
  title: string
  total: number
  depositDue: number
  currency: string
  /** The name under which it was accepted. */
  acceptedBy: string
  acceptedAt: string
  releasedAt: string | null
}

/** Every status that an order came to, with who and when. */
export interface OrderProgressTable {
  id: string
  orderId: string
  status: OrderStatus
  at: string
  who: string
}
