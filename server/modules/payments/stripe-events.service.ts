import { z } from 'zod'
import { write } from '../../db/open-database.ts'
import type { Deps } from '../../deps.ts'
import { fail } from '../../errors.ts'
import { recordAudit } from '../audit/audit.service.ts'
import { dueEvents, keepEvent, updateEvent } from './payments.repo.ts'
import type { StripeEventsTable } from './payments.table.ts'
import { failPayment, PROCESSOR, settlePayment } from './settle-payment.service.ts'

/** An event may be this old, or this far ahead, and no more: the SDK does not look at the future. */
const TOLERANCE_S = 300
const LEASE_MS = 45_000
const MOST_ATTEMPTS = 50
const BATCH = 20

// The last one counts when there are several, as it does for the SDK.
const signedAt = (header: string) =>
  Number(
    header
      .split(',')
      .findLast((part) => part.startsWith('t='))
      ?.slice(2) ?? 0,
  )
const aboutObject = z.object({ id: z.string() })

/** Takes a signed event into the inbox. Throws for one that is not the processor's; twice the same is once. */
export async function receiveEvent(deps: Deps, body: unknown, signature: string): Promise<void> {
  const { stripe, config, clock, db, logger } = deps
  const now = clock().getTime()
  if (!Buffer.isBuffer(body) || signedAt(signature) > now / 1000 + TOLERANCE_S) return refuseEvent()
  const { webhookSecret } = config.stripe
  let event
  try {
    event = stripe.webhooks.constructEvent(body, signature, webhookSecret, TOLERANCE_S, undefined, now)
  } catch {
    return refuseEvent()
  }
  const at = clock().toISOString()
  const { id, type, data } = event
  const objectId = aboutObject.safeParse(data.object).data?.id ?? ''
  await write(db, (trx) =>
    keepEvent(trx, {
      ...{ id, type, objectId, receivedAt: at, handledAt: null, attempts: 0, nextAt: at, outcome: null },
    }),
  )
  // It is safe now and answered at once; whatever happens to us here, the job finds it again.
  void handleDueEvents(deps).catch((error: unknown) => logger.error({ err: error }, 'events wait'))
}

function refuseEvent(): never {
  fail('invalid-input', 'The signature does not hold.', {
    issues: [{ path: 'Stripe-Signature', message: 'one that the processor made, of late' }],
  })
}

/** Acts on what waits in the inbox. */
export async function handleDueEvents(deps: Deps): Promise<void> {
  const { db, clock } = deps
  const events = await write(db, async (trx) => {
    const now = clock()
    const due = await dueEvents(trx, now.toISOString(), BATCH)
    const nextAt = new Date(now.getTime() + LEASE_MS).toISOString()
    for (const { id, attempts } of due) await updateEvent(trx, id, { nextAt, attempts: attempts + 1 })
    return due
  })
  for (const event of events) await handleEvent(deps, event)
}

async function handleEvent(deps: Deps, event: StripeEventsTable): Promise<void> {
  const { db, clock, logger } = deps
  try {
    await act(deps, event)
  } catch (error) {
    logger.error({ err: error, event: event.id }, 'an event could not be acted on')
    const attempts = event.attempts + 1
    const wait = Math.min(2000 * 2 ** attempts, 3_600_000)
    const nextAt = new Date(clock().getTime() + wait).toISOString()
    const outcome = error instanceof Error ? error.message.slice(0, 300) : 'unknown'
    await write(db, async (trx) => {
      if (attempts < MOST_ATTEMPTS) return updateEvent(trx, event.id, { nextAt, outcome })
      const at = clock().toISOString()
      const record = { type: event.type, object: event.objectId, outcome }
      await recordAudit(trx, {
        at,
        who: PROCESSOR,
        action: 'event given up',
        record: event.id,
        after: record,
      })
      return updateEvent(trx, event.id, { outcome, handledAt: at })
    })
  }
}

/** By the type, what to look at again: the event itself is taken as a hint, the object is asked for. */
async function act(deps: Deps, event: StripeEventsTable): Promise<void> {
  const { stripe, db, clock } = deps
  switch (event.type) {
    case 'checkout.session.completed':
    case 'checkout.session.async_payment_succeeded':
      return settlePayment(deps, event, await stripe.checkout.sessions.retrieve(event.objectId))
    case 'checkout.session.async_payment_failed':
    case 'checkout.session.expired': {
      const session = await stripe.checkout.sessions.retrieve(event.objectId)
      const reason =
        session.status === 'expired' ? 'The card page was left open too long.' : 'The bank refused it.'
      const closed = session.status === 'open' ? undefined : session.id
      return failPayment(deps, event, { paymentId: session.metadata?.paymentId, reason, closed })
    }
    case 'payment_intent.payment_failed': {
      const intent = await stripe.paymentIntents.retrieve(event.objectId)
      if (intent.status === 'succeeded') return write(db, (trx) => done(trx, event, 'overtaken', clock()))
      const reason = intent.last_payment_error?.message ?? 'The bank refused it.'
      return failPayment(deps, event, { paymentId: intent.metadata.paymentId, reason, closed: undefined })
    }
    default:
      return write(db, (trx) => done(trx, event, 'not needed', clock()))
  }
}

function done(
  trx: Parameters<typeof updateEvent>[0],
  { id }: StripeEventsTable,
  outcome: string,
  now: Date,
): Promise<void> {
  return updateEvent(trx, id, { handledAt: now.toISOString(), outcome })
}
