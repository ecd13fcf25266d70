import type { Insertable } from 'kysely'
import type { Cursor } from '../../db/cursor.ts'
import { containsText, olderThan } from '../../db/list-conditions.ts'
import type { Reader, Trx } from '../../db/open-database.ts'
import type { Account, LedgerTable } from './accounts.table.ts'

export async function insertEntries(trx: Trx, rows: Insertable<LedgerTable>[]): Promise<void> {
  await trx.insertInto('ledger').values(rows).execute()
}

function entries(db: Reader) {
  return db
    .selectFrom('ledger')
    .leftJoin('orders', 'orders.id', 'ledger.orderId')
    .selectAll('ledger')
    .select('orders.number as orderNumber')
}
export type EntryRow = Awaited<ReturnType<ReturnType<typeof entries>['executeTakeFirstOrThrow']>>

/** Newest first. */
export function entriesBefore(
  db: Reader,
  wanted: {
    account: Account | undefined
    text: string | undefined
    cursor: Cursor | undefined
    limit: number
  },
): Promise<EntryRow[]> {
  const { account, text, cursor, limit } = wanted
  return entries(db)
    .$if(account !== undefined, (query) => query.where('ledger.account', '=', account ?? 'bank'))
    .$if(!!text, (query) => query.where(containsText(text ?? '', 'ledger.memo')))
    .$if(cursor !== undefined, (query) =>
      cursor ? query.where(olderThan('ledger.at', 'ledger.id', cursor)) : query,
    )
    .orderBy('ledger.at', 'desc')
    .orderBy('ledger.id', 'desc')
    .limit(limit)
    .execute()
}

/** All of them, first to last, the two sides of a booking together. */
export function allEntries(db: Reader): Promise<EntryRow[]> {
  return entries(db)
    .orderBy('ledger.at')
    .orderBy('ledger.transactionId')
    .orderBy('ledger.amount', 'desc')
    .execute()
}

export function balances(db: Reader, currency: string) {
  return db
    .selectFrom('ledger')
    .select(['account'])
    .select((is) => [
      is.fn.sum<number>(is.case().when('amount', '>', 0).then(is.ref('amount')).else(0).end()).as('debit'),
      is.fn.sum<number>(is.case().when('amount', '<', 0).then(is.ref('amount')).else(0).end()).as('credit'),
    ])
    .where('currency', '=', currency)
    .groupBy('account')
    .execute()
}

/** Orders with what of their deposit is in. */
export function deposits(db: Reader, cursor: Cursor | undefined, text: string | undefined, limit: number) {
  return db
    .selectFrom('orders')
    .innerJoin('companies', 'companies.id', 'orders.companyId')
    .select(['orders.id', 'orders.number', 'orders.status', 'orders.depositDue', 'orders.currency'])
    .select(['orders.acceptedAt', 'companies.id as companyId', 'companies.name as companyName'])
    .select((is) =>
      is
        .selectFrom('payments')
        .select((inner) => inner.fn.coalesce(inner.fn.sum<number>('payments.amount'), inner.lit(0)).as('sum'))
        .whereRef('payments.orderId', '=', 'orders.id')
        .where('payments.status', '=', 'succeeded')
        .as('paid'),
    )
    .$if(!!text, (query) => query.where(containsText(text ?? '', 'orders.number', 'companies.name')))
    .$if(cursor !== undefined, (query) =>
      cursor ? query.where(olderThan('orders.acceptedAt', 'orders.id', cursor)) : query,
    )
    .orderBy('orders.acceptedAt', 'desc')
    .orderBy('orders.id', 'desc')
    .limit(limit)
    .execute()
}

/** Deposits that are waited for, and that came: minor units. */
export async function depositSums(db: Reader, currency: string): Promise<{ due: number; paid: number }> {
  const paid = await db
    .selectFrom('payments')
    .select((is) => is.fn.coalesce(is.fn.sum<number>('amount'), is.lit(0)).as('sum'))
    .where('status', '=', 'succeeded')
    .where('currency', '=', currency)
    .executeTakeFirstOrThrow()
  const due = await db
    .selectFrom('orders')
    .select((is) => is.fn.coalesce(is.fn.sum<number>('depositDue'), is.lit(0)).as('sum'))
    .where('status', '=', 'awaiting deposit')
    .where('currency', '=', currency)
    .executeTakeFirstOrThrow()
  const part = await db
    .selectFrom('payments')
    .innerJoin('orders', 'orders.id', 'payments.orderId')
    .select((is) => is.fn.coalesce(is.fn.sum<number>('payments.amount'), is.lit(0)).as('sum'))
    .where('payments.status', '=', 'succeeded')
    .where('orders.status', '=', 'awaiting deposit')
    .where('payments.currency', '=', currency)
    .executeTakeFirstOrThrow()
  return { due: due.sum - part.sum, paid: paid.sum }
}
