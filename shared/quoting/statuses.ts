export const REQUEST_STATUSES = [
  'draft',
  'submitted',
  'in review',
  'quoted',
  'closed',
  'withdrawn',
  'declined',
] as const
export type RequestStatus = (typeof REQUEST_STATUSES)[number]

export const REVISION_STATUSES = [
  'draft',
  'approved',
  'sent',
  'accepted',
  'declined',
  'expired',
  'superseded',
  'withdrawn',
] as const
export type RevisionStatus = (typeof REVISION_STATUSES)[number]

export const ORDER_STATUSES = [
  'awaiting deposit',
  'released',
  'in fabrication',
  'ready',
  'dispatched',
  'completed',
  'cancelled',
] as const
export type OrderStatus = (typeof ORDER_STATUSES)[number]

export const PAYMENT_STATUSES = [
  'pending',
  'succeeded',
  'failed',
  'refunded in part',
  'refunded',
  'disputed',
] as const
export type PaymentStatus = (typeof PAYMENT_STATUSES)[number]

/** Who acts: people by role, `link` for the holder of a quote's private link, `system` for time and the processor. */
export const ACTORS = ['contractor', 'estimator', 'accounts', 'admin', 'link', 'system'] as const
export type Actor = (typeof ACTORS)[number]

export interface StatusOf {
  request: RequestStatus
  revision: RevisionStatus
  order: OrderStatus
  payment: PaymentStatus
}
export type Kind = keyof StatusOf

export const STATUSES: { readonly [K in Kind]: readonly StatusOf[K][] } = {
  request: REQUEST_STATUSES,
  revision: REVISION_STATUSES,
  order: ORDER_STATUSES,
  payment: PAYMENT_STATUSES,
}
