import type { Insertable, Updateable } from 'kysely'
import type { Reader, Trx } from '../../db/open-database.ts'
import type { PaymentsTable, StripeEventsTable } from './payments.table.ts'

export function paymentsAbout(db: Reader, orderId: string): Promise<PaymentsTable[]> {
  return db
    .selectFrom('payments')
    .selectAll()
    .where('orderId', '=', orderId)
    .orderBy('createdAt')
    .orderBy('id')
    .execute()
}

export function findPayment(db: Reader, id: string): Promise<PaymentsTable | undefined> {
  return db.selectFrom('payments').selectAll().where('id', '=', id).executeTakeFirst()
}

export async function insertPayment(trx: Trx, row: Insertable<PaymentsTable>): Promise<void> {
  await trx.insertInto('payments').values(row).execute()
}

export async function updatePayment(trx: Trx, id: string, change: Updateable<PaymentsTable>): Promise<void> {
  await trx.updateTable('payments').set(change).where('id', '=', id).execute()
}

/** Closes a payment of which no page was ever shown. */
export async function closeUnopened(trx: Trx, id: string, failure: string): Promise<void> {
  await trx
    .updateTable('payments')
    .set({ status: 'failed', failure })
    .where('id', '=', id)
    .where('status', '=', 'pending')
    .where('sessionId', 'is', null)
    .execute()
}

/** Whose page was shown and of which the outcome is not known, while the processor may still tell. */
export function unsettledPayments(
  db: Reader,
  { openedBefore, endedAfter, limit }: { openedBefore: string; endedAfter: string; limit: number },
): Promise<PaymentsTable[]> {
  return db
    .selectFrom('payments')
    .selectAll()
    .where('status', 'in', ['pending', 'failed'])
    .where('sessionId', 'is not', null)
    .where('createdAt', '<=', openedBefore)
    .where('sessionExpiresAt', '>', endedAfter)
    .orderBy('createdAt')
    .limit(limit)
    .execute()
}

/** Kept once; one that is sent again and was not acted on yet has its turn at once. */
export async function keepEvent(trx: Trx, row: Insertable<StripeEventsTable>): Promise<void> {
  await trx
    .insertInto('stripeEvents')
    .values(row)
    .onConflict((conflict) =>
      conflict.column('id').doUpdateSet({ nextAt: row.nextAt }).where('stripeEvents.handledAt', 'is', null),
    )
    .execute()
}

export function findEvent(db: Reader, id: string): Promise<StripeEventsTable | undefined> {
  return db.selectFrom('stripeEvents').selectAll().where('id', '=', id).executeTakeFirst()
}

export function dueEvents(db: Reader, now: string, limit: number): Promise<StripeEventsTable[]> {
  return db
    .selectFrom('stripeEvents')
    .selectAll()
    .where('handledAt', 'is', null)
    .where('nextAt', '<=', now)
    .orderBy('receivedAt')
    .limit(limit)
    .execute()
}

export async function updateEvent(
  trx: Trx,
  id: string,
  change: Updateable<StripeEventsTable>,
): Promise<void> {
  await trx.updateTable('stripeEvents').set(change).where('id', '=', id).execute()
}
