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
