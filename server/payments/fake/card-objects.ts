import type { CardEvent, CardSession } from './card-store.ts'

/* Objects as the processor's API has them; only the fields that a checkout of ours uses. */

export function sessionObject(session: CardSession, pageUrl: string) {
  const { id, status, amount, currency, metadata, intentId, createdAt, expiresAt } = session
  return {
    object: 'checkout.session',
    ...{ id, status, currency, metadata, livemode: false, mode: 'payment' },
    amount_total: amount,
    amount_subtotal: amount,
    payment_status: status === 'complete' ? 'paid' : 'unpaid',
    payment_intent: intentId,
    created: createdAt,
    expires_at: expiresAt,
    success_url: session.successUrl,
    cancel_url: session.cancelUrl,
    url: status === 'open' ? `${pageUrl}/pay/${id}` : null,
  }
}

export function intentObject(session: CardSession) {
  const { intentId, intentStatus, amount, currency, metadata, failure, createdAt } = session
  return {
    object: 'payment_intent',
    ...{
      id: intentId,
      status: intentStatus,
      amount,
      currency,
      metadata,
      livemode: false,
      created: createdAt,
    },
    amount_received: intentStatus === 'succeeded' ? amount : 0,
    last_payment_error:
      failure === null ? null : { type: 'card_error', code: 'card_declined', message: failure },
  }
}

export function eventObject(event: CardEvent, session: CardSession, pageUrl: string) {
  const { id, type, createdAt } = event
  const object = type.startsWith('payment_intent.') ? intentObject(session) : sessionObject(session, pageUrl)
  return { object: 'event', ...{ id, type, livemode: false, created: createdAt }, data: { object } }
}
