import type { Insertable, Updateable } from 'kysely'
import type { RequestStatus } from '../../../shared/quoting/statuses.ts'
import type { Cursor } from '../../db/cursor.ts'
import { containsText, olderThan } from '../../db/list-conditions.ts'
import type { Reader, Trx } from '../../db/open-database.ts'
import type { RequestsTable } from './requests.table.ts'

function requests(db: Reader) {
  return db
    .selectFrom('requests')
    .innerJoin('companies', 'companies.id', 'requests.companyId')
    .innerJoin('people', 'people.id', 'requests.contactId')
    .leftJoin('quotes', 'quotes.requestId', 'requests.id')
    .selectAll('requests')
    .select(['companies.name as companyName', 'people.name as contactName'])
    .select(['quotes.id as quoteId', 'quotes.number as quoteNumber'])
}
export type RequestRow = Awaited<ReturnType<ReturnType<typeof requests>['executeTakeFirstOrThrow']>>

export function findRequest(db: Reader, id: string): Promise<RequestRow | undefined> {
  return requests(db).where('requests.id', '=', id).executeTakeFirst()
}

export interface RequestsWanted {
  /** A contractor's own; undefined for the shop, which sees no drafts. */
  companyId: string | undefined
  status: RequestStatus | undefined
  text: string | undefined
  cursor: Cursor | undefined
  limit: number
}

export function findRequests(db: Reader, wanted: RequestsWanted): Promise<RequestRow[]> {
  const { companyId, status, text, cursor, limit } = wanted
  return requests(db)
    .$if(companyId !== undefined, (query) => query.where('requests.companyId', '=', companyId ?? ''))
    .$if(companyId === undefined, (query) => query.where('requests.status', '!=', 'draft'))
    .$if(status !== undefined, (query) => query.where('requests.status', '=', status ?? 'draft'))
    .$if(!!text, (query) =>
      query.where(containsText(text ?? '', 'requests.number', 'requests.title', 'companies.name')),
    )
    .$if(cursor !== undefined, (query) =>
      cursor ? query.where(olderThan('requests.createdAt', 'requests.id', cursor)) : query,
    )
    .orderBy('requests.createdAt', 'desc')
    .orderBy('requests.id', 'desc')
    .limit(limit)
    .execute()
}

export async function insertRequest(trx: Trx, row: Insertable<RequestsTable>): Promise<void> {
  await trx.insertInto('requests').values(row).execute()
}

export async function updateRequest(trx: Trx, id: string, change: Updateable<RequestsTable>): Promise<void> {
  await trx.updateTable('requests').set(change).where('id', '=', id).execute()
}
