import Stripe from 'stripe'
import type { OrderDto } from '../../../shared/contracts/orders.ts'
import { write } from '../../db/open-database.ts'
import type { Deps } from '../../deps.ts'
import { fail } from '../../errors.ts'
import { closeUnopened } from './payments.repo.ts'
import type { PaymentsTable } from './payments.table.ts'

export interface Checkout {
  id: string
  url: string
  /** Instant, ISO 8601. */
  expiresAt: string
}

/** Asks the processor for its hosted page, under the payment's own id: however often, one page. */
export async function openCheckout(deps: Deps, order: OrderDto, payment: PaymentsTable): Promise<Checkout> {
  const { stripe, config, logger, db } = deps
  const metadata = { paymentId: payment.id, orderId: order.id }
  const back = `${config.publicUrl}/orders/${order.id}`
  try {
    const session = await stripe.checkout.sessions.create(
      {
        mode: 'payment',
        client_reference_id: order.number,
        metadata,
        payment_intent_data: { metadata, description: `Deposit, order ${order.number}` },
        line_items: [
          {
            quantity: 1,
            price_data: {
              currency: payment.currency.toLowerCase(),
              unit_amount: payment.amount,
              product_data: { name: `Deposit, order ${order.number}` },
            },
          },
        ],
        success_url: `${back}?paid=yes`,
        cancel_url: `${back}?paid=no`,
      },
      { idempotencyKey: payment.id },
    )
    if (!session.url) throw new Error('a checkout without a page')
    return { id: session.id, url: session.url, expiresAt: new Date(session.expires_at * 1000).toISOString() }
  } catch (error) {
    logger.error({ err: error, payment: payment.id }, 'the processor did not open a checkout')
    if (isLastWord(error)) {
      await write(db, (trx) => closeUnopened(trx, payment.id, 'The card page could not be opened.'))
    }
    return fail(
      'processor-unavailable',
      'The card page could not be opened. Nothing was taken; try again in a minute.',
    )
  }
}

/**
 * The processor keeps what it first answered under a key for a day, a fault of its own included: asked again it would
 * say the same. Such a payment is closed, and the next try is a new one. When no answer came the key stays, since the
 * page may have been made.
 */
function isLastWord(error: unknown): boolean {
  if (!(error instanceof Stripe.errors.StripeError)) return false
  const { statusCode = 0 } = error
  return statusCode >= 500 || (statusCode === 400 && error instanceof Stripe.errors.StripeIdempotencyError)
}
