import { randomUUID } from 'node:crypto'
import { money, type Money } from '../../../shared/pricing/money.ts'
import { statusAfter } from '../../../shared/quoting/may-move.ts'
import { releaseFault } from '../../../shared/quoting/release.ts'
import type { OrderStatus } from '../../../shared/quoting/statuses.ts'
import { nextNumber } from '../../db/counters.repo.ts'
import type { Reader, Trx } from '../../db/open-database.ts'
import { fail, notFound } from '../../errors.ts'
import { recordAudit } from '../audit/audit.service.ts'
import {
  findOrder,
  findOrderOfQuote,
  insertOrder,
  insertProgress,
  setOrderStatus,
  type OrderRow,
} from './orders.repo.ts'

/** What payments must know of an order. */
export interface OrderForPayment {
  id: string
  number: string
  title: string
  companyId: string
  quoteId: string
  status: OrderStatus
  due: Money
  contact: { name: string; email: string }
}

export interface NewOrder {
  quoteId: string
  letter: string
  companyId: string
  contactId: string
  title: string
  total: Money
  deposit: Money
  /** The name under which it was accepted. */
  acceptedBy: string
  at: string
}

async function orderRow(db: Reader, id: string): Promise<OrderRow> {
  return (await findOrder(db, id)) ?? notFound('order')
}

function forPayment(row: OrderRow): OrderForPayment {
  const { id, number, title, companyId, quoteId, status, depositDue, currency } = row
  return {
    id,
    number,
    title,
    companyId,
    quoteId,
    status,
    due: money(depositDue, currency),
    contact: { name: row.contactName, email: row.contactEmail },
  }
}

export async function orderForPayment(db: Reader, id: string): Promise<OrderForPayment> {
  return forPayment(await orderRow(db, id))
}

export async function orderOfQuote(db: Reader, quoteId: string): Promise<OrderForPayment | undefined> {
  const row = await findOrderOfQuote(db, quoteId)
  return row && forPayment(row)
}

/** An accepted revision becomes an order that waits for its deposit; one with credit terms is released at once. */
export async function createOrder(trx: Trx, order: NewOrder): Promise<{ id: string; number: string }> {
  const id = randomUUID()
  const number = await nextNumber(trx, 'order')
  const { total, deposit, acceptedBy, at, ...of } = order
  const status: OrderStatus = 'awaiting deposit'
  const row = { total: total.amount, depositDue: deposit.amount, currency: total.currency, acceptedBy }
  await insertOrder(trx, { id, number, ...of, ...row, status, acceptedAt: at, releasedAt: null })
  await insertProgress(trx, { id: randomUUID(), orderId: id, status, at, who: acceptedBy })
  await recordAudit(trx, {
    at,
    who: acceptedBy,
    action: 'order made',
    record: number,
    after: { status, total, deposit },
  })
  const { creditTerms } = await orderRow(trx, id)
  if (creditTerms === 1) await releaseOrder(trx, id, money(0, total.currency), 'credit terms', at)
  return { id, number }
}

/** Lets the shop begin: the deposit is in, or the company has credit terms. Nothing when it was released before. */
export async function releaseOrder(
  trx: Trx,
  id: string,
  paid: Money,
  who: string,
  at: string,
): Promise<void> {
  const row = await orderRow(trx, id)
  const status = statusAfter('order', 'system', row.status, 'release')
  if (!status) return
  const creditTerms = row.creditTerms === 1
  const fault = releaseFault({ due: money(row.depositDue, row.currency), paid, creditTerms })
  if (fault) fail('not-allowed-now', `The order is not released: ${fault}.`)
  await setOrderStatus(trx, id, { status, releasedAt: at })
  await insertProgress(trx, { id: randomUUID(), orderId: id, status, at, who })
  await recordAudit(trx, {
    at,
    who,
    action: 'order released',
    record: row.number,
    before: { status: row.status },
    after: { status },
  })
}
