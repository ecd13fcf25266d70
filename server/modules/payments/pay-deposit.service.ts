import { randomUUID } from 'node:crypto'
import type { AnswerOf } from '../../../shared/contracts/operations.ts'
import type { OrderDto } from '../../../shared/contracts/orders.ts'
import { money, moneyToDecimal, subtract, type Money } from '../../../shared/pricing/money.ts'
import { mayMove } from '../../../shared/quoting/may-move.ts'
import { write } from '../../db/open-database.ts'
import type { Deps } from '../../deps.ts'
import { fail } from '../../errors.ts'
import type { Once } from '../../http/once.ts'
import { actorOf, nameForAudit, type Principal } from '../../http/principal.ts'
import { recordAudit } from '../audit/audit.service.ts'
import { readOrder } from '../orders/read-orders.service.ts'
import { openCheckout } from './open-checkout.service.ts'
import { insertPayment, paymentsAbout, updatePayment } from './payments.repo.ts'
import type { PaymentsTable } from './payments.table.ts'

/** What a card checkout takes, minor units: 0.50 to 999 999.99. */
const LEAST = 50
const MOST = 99_999_999

type Answer = AnswerOf<'payDeposit'>

/**
 * Opens the processor's hosted page for what of the deposit is missing. The payment is kept under its own key before
 * the processor is asked, so that however often this is tried there is one checkout.
 */
export async function payDeposit(
  deps: Deps,
  principal: Principal,
  orderId: string,
  once: Once,
): Promise<Answer> {
  const order = await readOrder(deps.db, principal, orderId)
  if (!mayMove('order', actorOf(principal), order.status, 'pay')) {
    fail('not-allowed-now', `The order is ${order.status}: no deposit is due.`)
  }
  const missing = subtract(order.deposit.due, order.deposit.paid)
  checkAmount(missing)
  const payment = await openPayment(deps, order, missing, nameForAudit(principal))
  const amount = money(payment.amount, payment.currency)
  if (payment.sessionUrl !== null) {
    const answer = { url: payment.sessionUrl, amount }
    await write(deps.db, (trx) => once(trx, answer))
    return answer
  }
  const session = await openCheckout(deps, order, payment)
  const answer = { url: session.url, amount }
  await write(deps.db, async (trx) => {
    await updatePayment(trx, payment.id, {
      sessionId: session.id,
      sessionUrl: session.url,
      sessionExpiresAt: session.expiresAt,
    })
    await once(trx, answer)
  })
  return answer
}

function checkAmount({ amount, currency }: Money): void {
  if (amount >= LEAST && amount <= MOST) return
  const [least, most] = [LEAST, MOST].map((one) => moneyToDecimal(money(one, currency)))
  fail(
    'not-allowed-now',
    `A card takes ${currency} ${least} to ${most}; ask the shop for its account and pay by transfer.`,
  )
}

/** The checkout that is still open, or a new payment. */
function openPayment(
  { db, clock }: Deps,
  order: OrderDto,
  missing: Money,
  who: string,
): Promise<PaymentsTable> {
  return write(db, async (trx) => {
    const at = clock().toISOString()
    const open = (await paymentsAbout(trx, order.id)).find(
      (row) => isOpen(row, at) && row.amount === missing.amount,
    )
    if (open) return open
    const row: PaymentsTable = {
      ...{ id: randomUUID(), orderId: order.id, purpose: 'deposit', status: 'pending' },
      ...{ amount: missing.amount, currency: missing.currency },
      ...{ sessionId: null, sessionUrl: null, sessionExpiresAt: null },
      ...{ failure: null, createdAt: at, settledAt: null },
    }
    await insertPayment(trx, row)
    await recordAudit(trx, {
      ...{ at, who, action: 'payment begun', record: order.number },
      after: { payment: row.id, amount: missing },
    })
    return row
  })
}

/** After a declined card the page stays open for another. */
function isOpen({ status, sessionExpiresAt }: PaymentsTable, at: string): boolean {
  if (status !== 'pending' && status !== 'failed') return false
  return sessionExpiresAt === null ? status === 'pending' : sessionExpiresAt > at
}
