import type { Logger } from 'pino'
import type Stripe from 'stripe'
import type { CardFake } from './card-fake.ts'
import { eventObject } from './card-objects.ts'
import type { CardEvent } from './card-store.ts'

export interface Delivery {
  fake: CardFake
  /** Signs as the processor does. */
  stripe: Pick<Stripe, 'webhooks'>
  secret: string
  pageUrl: string
  /** Where the desk takes events. */
  to: string
  logger: Logger
}

const PATIENCE_MS = 10_000

/** Sends one event, signed; whether the desk has taken it. */
export async function deliverEvent(delivery: Delivery, event: CardEvent): Promise<boolean> {
  const { fake, stripe, secret, pageUrl, to } = delivery
  const session = fake.session(event.sessionId)
  if (!session) return true
  const payload = JSON.stringify(eventObject(event, session, pageUrl))
  const signature = stripe.webhooks.generateTestHeaderString({ payload, secret })
  try {
    const reply = await fetch(to, {
      method: 'POST',
      headers: { 'Content-Type': 'application/json', 'Stripe-Signature': signature },
      body: payload,
      signal: AbortSignal.timeout(PATIENCE_MS),
    })
    return reply.ok
  } catch {
    return false
  }
}

/** Sends what is due; what is not taken comes again, later and later. */
export async function deliverDueEvents(delivery: Delivery): Promise<void> {
  const { fake, logger } = delivery
  fake.expire()
  const due = fake.store.state.events.filter(({ delivered, nextAt }) => !delivered && nextAt <= Date.now())
  for (const event of due) {
    event.delivered = await deliverEvent(delivery, event)
    event.attempts += 1
    event.nextAt = Date.now() + Math.min(1000 * 2 ** event.attempts, 60_000)
    if (!event.delivered) logger.debug({ event: event.id }, 'the desk did not take an event yet')
    fake.store.keep()
  }
}
