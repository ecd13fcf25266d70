import type { Insertable, Selectable } from 'kysely'
import type { OrderStatus } from '../../../shared/quoting/statuses.ts'
import type { Cursor } from '../../db/cursor.ts'
import { containsText, olderThan } from '../../db/list-conditions.ts'
import type { Reader, Trx } from '../../db/open-database.ts'
import type { OrderProgressTable, OrdersTable } from './orders.table.ts'

export type OrderProgressRow = Selectable<OrderProgressTable>

function orders(db: Reader) {
  return db
    .selectFrom('orders')
    .innerJoin('companies', 'companies.id', 'orders.companyId')
    .innerJoin('quotes', 'quotes.id', 'orders.quoteId')
    .innerJoin('people', 'people.id', 'orders.contactId')
    .selectAll('orders')
    .select(['companies.name as companyName', 'companies.creditTerms', 'quotes.number as quoteNumber'])
    .select(['people.name as contactName', 'people.email as contactEmail'])
}
export type OrderRow = Awaited<ReturnType<ReturnType<typeof orders>['executeTakeFirstOrThrow']>>

export function findOrder(db: Reader, id: string): Promise<OrderRow | undefined> {
  return orders(db).where('orders.id', '=', id).executeTakeFirst()
}

export function findOrderOfQuote(db: Reader, quoteId: string): Promise<OrderRow | undefined> {
  return orders(db).where('orders.quoteId', '=', quoteId).executeTakeFirst()
}

export interface OrdersWanted {
  companyId: string | undefined
  status: OrderStatus | undefined
  text: string | undefined
  cursor: Cursor | undefined
  limit: number
}

export function findOrders(db: Reader, wanted: OrdersWanted): Promise<OrderRow[]> {
  const { companyId, status, text, cursor, limit } = wanted
  return orders(db)
    .$if(companyId !== undefined, (query) => query.where('orders.companyId', '=', companyId ?? ''))
    .$if(status !== undefined, (query) => query.where('orders.status', '=', status ?? 'released'))
    .$if(!!text, (query) =>
      query.where(containsText(text ?? '', 'orders.number', 'orders.title', 'companies.name')),
    )
    .$if(cursor !== undefined, (query) =>
      cursor ? query.where(olderThan('orders.acceptedAt', 'orders.id', cursor)) : query,
    )
    .orderBy('orders.acceptedAt', 'desc')
    .orderBy('orders.id', 'desc')
    .limit(limit)
    .execute()
}

export function progressOf(db: Reader, orderId: string): Promise<OrderProgressRow[]> {
  return db
    .selectFrom('orderProgress')
    .selectAll()
    .where('orderId', '=', orderId)
    .orderBy('at')
    .orderBy('id')
    .execute()
}

export async function insertOrder(trx: Trx, row: Insertable<OrdersTable>): Promise<void> {
  await trx.insertInto('orders').values(row).execute()
}

export async function insertProgress(trx: Trx, row: Insertable<OrderProgressTable>): Promise<void> {
  await trx.insertInto('orderProgress').values(row).execute()
}

export async function setOrderStatus(
  trx: Trx,
  id: string,
  change: { status: OrderStatus; releasedAt?: string },
): Promise<void> {
  await trx.updateTable('orders').set(change).where('id', '=', id).execute()
}
