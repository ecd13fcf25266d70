import type { AnswerOf, QueryOf } from '../../../shared/contracts/operations.ts'
import type { OrderDto } from '../../../shared/contracts/orders.ts'
import { pageFrom, readCursor } from '../../db/cursor.ts'
import type { Db, Reader } from '../../db/open-database.ts'
import { notFound } from '../../errors.ts'
import { isShop, personOf, type Principal } from '../../http/principal.ts'
import { depositPaid, paymentsOfOrder } from '../payments/payments.service.ts'
import { toOrder, toOrderSummary } from './orders.map.ts'
import { findOrder, findOrders, progressOf, type OrderRow } from './orders.repo.ts'

function mayKnow(principal: Principal, order: OrderRow): boolean {
  if (principal.kind === 'link') return principal.quoteId === order.quoteId
  if (principal.kind === 'nobody') return false
  return isShop(principal) || principal.companyId === order.companyId
}

/** An order, for the shop, its company, and the holder of its quote's link. */
export async function readOrder(db: Reader, principal: Principal, id: string): Promise<OrderDto> {
  const row = await findOrder(db, id)
  if (!row || !mayKnow(principal, row)) return notFound('order')
  const paid = await depositPaid(db, id, row.currency)
  return toOrder(row, paid, await paymentsOfOrder(db, id), await progressOf(db, id))
}

export async function listOrders(
  db: Db,
  principal: Principal,
  { limit, cursor, q, status }: QueryOf<'listOrders'>,
): Promise<AnswerOf<'listOrders'>> {
  const rows = await findOrders(db, {
    companyId: personOf(principal).companyId ?? undefined,
    status,
    text: q,
    cursor: readCursor(cursor),
    limit: limit + 1,
  })
  const shown = await Promise.all(
    rows.map(async (row) => ({ row, paid: await depositPaid(db, row.id, row.currency) })),
  )
  return pageFrom(
    shown,
    limit,
    ({ row }) => ({ at: row.acceptedAt, id: row.id }),
    ({ row, paid }) => toOrderSummary(row, paid),
  )
}
