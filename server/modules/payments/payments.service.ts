import type { OrderDto } from '../../../shared/contracts/orders.ts'
import { add, money, type Money } from '../../../shared/pricing/money.ts'
import type { Reader } from '../../db/open-database.ts'
import { paymentsAbout } from './payments.repo.ts'

/** Payments of an order, first to last. */
export async function paymentsOfOrder(db: Reader, orderId: string): Promise<OrderDto['payments']> {
  const rows = await paymentsAbout(db, orderId)
  return rows.map(({ id, purpose, status, amount, currency, failure, createdAt, settledAt }) => ({
    ...{ id, purpose, status, failure, createdAt, settledAt },
    amount: money(amount, currency),
  }))
}

/** What of the deposit is in. */
export async function depositPaid(db: Reader, orderId: string, currency: string): Promise<Money> {
  const rows = await paymentsAbout(db, orderId)
  const settled = rows.filter(({ status, purpose }) => status === 'succeeded' && purpose === 'deposit')
  return add(money(0, currency), ...settled.map((row) => money(row.amount, row.currency)))
}
