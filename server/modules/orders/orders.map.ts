import type { OrderDto } from '../../../shared/contracts/orders.ts'
import { money, type Money } from '../../../shared/pricing/money.ts'
import type { OrderProgressRow, OrderRow } from './orders.repo.ts'

export function toOrderSummary(row: OrderRow, paid: Money) {
  const { id, number, status, title, acceptedAt } = row
  return {
    ...{ id, number, status, title, acceptedAt },
    company: { id: row.companyId, name: row.companyName },
    total: money(row.total, row.currency),
    deposit: { due: money(row.depositDue, row.currency), paid },
  }
}

export function toOrder(
  row: OrderRow,
  paid: Money,
  payments: OrderDto['payments'],
  progress: readonly OrderProgressRow[],
): OrderDto {
  return {
    ...toOrderSummary(row, paid),
    quote: { id: row.quoteId, number: row.quoteNumber, letter: row.letter },
    acceptedBy: row.acceptedBy,
    releasedAt: row.releasedAt,
    payments,
    progress: progress.map(({ status, at, who }) => ({ status, at, by: who })),
  }
}
