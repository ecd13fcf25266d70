import { write } from '../../db/open-database.ts'
import type { Deps } from '../../deps.ts'
import { recordAudit } from '../audit/audit.service.ts'
import { findEvent, keepEvent, unsettledPayments } from './payments.repo.ts'
import type { PaymentsTable } from './payments.table.ts'
import { handleDueEvents } from './stripe-events.service.ts'

const MINUTE_MS = 60_000
/** Events mostly come within seconds; before this nothing is missed. */
const PATIENCE_MS = 10 * MINUTE_MS
/** A page that closed this long ago has nothing new to tell. */
const AFTER_MS = 24 * 60 * MINUTE_MS
const BATCH = 50

/**
 * Asks the processor about payments of which no word came, for an event may be lost for good. What it says is put into
 * the inbox as an event would be, and so goes the same way; that it was missed stands in the audit trail.
 */
export async function sweepPayments(deps: Deps): Promise<void> {
  const { db, clock, logger } = deps
  const now = clock().getTime()
  const payments = await unsettledPayments(db, {
    openedBefore: new Date(now - PATIENCE_MS).toISOString(),
    endedAfter: new Date(now - AFTER_MS).toISOString(),
    limit: BATCH,
  })
  for (const payment of payments) {
    await askAbout(deps, payment).catch((error: unknown) =>
      logger.warn({ err: error, payment: payment.id }, 'the processor did not say how a payment stands'),
    )
  }
  await handleDueEvents(deps)
}

async function askAbout({ stripe, db, clock }: Deps, payment: PaymentsTable): Promise<void> {
  if (payment.sessionId === null) return
  const session = await stripe.checkout.sessions.retrieve(payment.sessionId)
  const type = missedType(payment, session)
  if (type === undefined) return
  const id = `sweep ${session.id} ${type}`
  const at = clock().toISOString()
  await write(db, async (trx) => {
    if (await findEvent(trx, id)) return
    await keepEvent(trx, {
      ...{ id, type, objectId: session.id, receivedAt: at },
      ...{ handledAt: null, attempts: 0, nextAt: at, outcome: null },
    })
    await recordAudit(trx, {
      ...{ at, who: 'the desk', action: 'event missed', record: payment.id },
      after: { checkout: session.id, type },
    })
  })
}

function missedType(
  { status }: PaymentsTable,
  session: { payment_status: string; status: string | null },
): string | undefined {
  if (session.payment_status === 'paid') return 'checkout.session.completed'
  return session.status === 'expired' && status === 'pending' ? 'checkout.session.expired' : undefined
}
