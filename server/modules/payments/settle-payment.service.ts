import type Stripe from 'stripe'
import { money } from '../../../shared/pricing/money.ts'
import { statusAfter } from '../../../shared/quoting/may-move.ts'
import { write, type Trx } from '../../db/open-database.ts'
import type { Deps } from '../../deps.ts'
import { moneyText } from '../../money-and-dates.ts'
import { postToLedger } from '../accounts/ledger.service.ts'
import { recordAudit } from '../audit/audit.service.ts'
import { orderForPayment, releaseOrder } from '../orders/orders.service.ts'
import { enqueueMail } from '../outbox/outbox.service.ts'
import { findEvent, findPayment, updateEvent, updatePayment } from './payments.repo.ts'
import { depositPaid } from './payments.service.ts'
import type { PaymentsTable, StripeEventsTable } from './payments.table.ts'

/** How the audit trail names it. */
export const PROCESSOR = 'the card processor'

/** What the processor says of a checkout against what we asked for; a word for what differs, or nothing. */
function difference(payment: PaymentsTable, session: Stripe.Checkout.Session): string | undefined {
  if (session.payment_status !== 'paid') return 'not paid yet'
  if (session.amount_total !== payment.amount) return `amount ${session.amount_total}`
  if (session.currency?.toUpperCase() !== payment.currency) return `currency ${session.currency}`
  if (session.metadata?.orderId !== payment.orderId) return 'another order'
  // A crash after asking left us without the session's id; then the payment's own id is what ties them.
  if (payment.sessionId !== null && payment.sessionId !== session.id) return 'another checkout'
  return undefined
}

/** The money is in: payment, ledger, receipt and release, all together and once, however often the event comes. */
export async function settlePayment(
  deps: Deps,
  event: StripeEventsTable,
  session: Stripe.Checkout.Session,
): Promise<void> {
  const { db, clock, logger } = deps
  await write(db, async (trx) => {
    const at = clock().toISOString()
    const finish = (outcome: string) => updateEvent(trx, event.id, { handledAt: at, outcome })
    if (await isHandled(trx, event)) return
    const payment = await paymentOf(trx, session.metadata?.paymentId)
    if (!payment) return finish('not ours')
    const differs = difference(payment, session)
    if (differs) {
      logger.error({ event: event.id, payment: payment.id, differs }, 'the processor says something else')
      const record = { payment: payment.id, session: session.id, differs }
      await recordAudit(trx, {
        at,
        who: PROCESSOR,
        action: 'payment differs',
        record: payment.id,
        after: record,
      })
      return finish(`differs: ${differs}`)
    }
    const status = statusAfter('payment', 'system', payment.status, 'settle')
    if (!status) return finish(`already ${payment.status}`)
    await updatePayment(trx, payment.id, { status, settledAt: at, failure: null, sessionId: session.id })
    await bookDeposit(trx, deps, { ...payment, status }, at)
    return finish('settled')
  })
}

async function bookDeposit(
  trx: Trx,
  { config, shop }: Deps,
  payment: PaymentsTable,
  at: string,
): Promise<void> {
  const order = await orderForPayment(trx, payment.orderId)
  const amount = money(payment.amount, payment.currency)
  await postToLedger(trx, {
    ...{ at, memo: `Deposit of order ${order.number} by card`, orderId: order.id, paymentId: payment.id },
    currency: payment.currency,
    entries: [
      { account: 'card clearing', amount: payment.amount },
      { account: 'customer deposits', amount: -payment.amount },
    ],
  })
  await recordAudit(trx, {
    ...{ at, who: PROCESSOR, action: 'deposit received', record: order.number },
    after: { payment: payment.id, amount },
  })
  await enqueueMail(trx, {
    ...{ to: order.contact.email, at, quoteId: order.quoteId, orderId: order.id },
    letter: {
      kind: 'deposit receipt',
      data: {
        ...{ name: order.contact.name, shop: shop.name, order: order.number, title: order.title, at },
        amount: moneyText(amount),
        url: `${config.publicUrl}/orders/${order.id}`,
      },
    },
  })
  const paid = await depositPaid(trx, order.id, payment.currency)
  if (paid.amount >= order.due.amount) await releaseOrder(trx, order.id, paid, PROCESSOR, at)
}

interface Failure {
  paymentId: string | undefined
  reason: string
  /** The checkout that cannot be paid any more, if it is closed. */
  closed: string | undefined
}

/** The card was refused, or the page was left. What is settled stays settled, whichever event comes last. */
export async function failPayment(
  { db, clock, config, shop }: Deps,
  event: StripeEventsTable,
  { paymentId, reason, closed }: Failure,
): Promise<void> {
  await write(db, async (trx) => {
    const at = clock().toISOString()
    const finish = (outcome: string) => updateEvent(trx, event.id, { handledAt: at, outcome })
    if (await isHandled(trx, event)) return
    const payment = await paymentOf(trx, paymentId)
    if (!payment) return finish('not ours')
    const again = payment.status === 'failed' ? payment.status : undefined
    const status = statusAfter('payment', 'system', payment.status, 'fail') ?? again
    if (!status) return finish(`already ${payment.status}`)
    const ended = closed !== undefined && closed === payment.sessionId ? { sessionExpiresAt: at } : {}
    await updatePayment(trx, payment.id, { status, failure: reason, ...ended })
    const order = await orderForPayment(trx, payment.orderId)
    const amount = money(payment.amount, payment.currency)
    await recordAudit(trx, {
      ...{ at, who: PROCESSOR, action: 'payment failed', record: order.number },
      after: { payment: payment.id, reason },
    })
    // Paid meanwhile in another way: a letter that asks to try again would only alarm.
    if (order.status !== 'awaiting deposit') return finish('failed')
    await enqueueMail(trx, {
      ...{ to: order.contact.email, at, quoteId: order.quoteId, orderId: order.id },
      letter: {
        kind: 'payment failed',
        data: {
          ...{ name: order.contact.name, shop: shop.name, order: order.number, title: order.title, reason },
          amount: moneyText(amount),
          url: `${config.publicUrl}/orders/${order.id}`,
        },
      },
    })
    return finish('failed')
  })
}

async function isHandled(trx: Trx, { id }: StripeEventsTable): Promise<boolean> {
  return (await findEvent(trx, id))?.handledAt != null
}

async function paymentOf(trx: Trx, id: string | undefined): Promise<PaymentsTable | undefined> {
  return id === undefined ? undefined : findPayment(trx, id)
}
