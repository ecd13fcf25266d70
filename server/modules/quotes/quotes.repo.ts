import type { Insertable, Selectable, Updateable } from 'kysely'
import type { RevisionStatus } from '../../../shared/quoting/statuses.ts'
import type { Cursor } from '../../db/cursor.ts'
import { containsText, olderThan } from '../../db/list-conditions.ts'
import type { Reader, Trx } from '../../db/open-database.ts'
import type { QuotesTable, RevisionsTable } from './quotes.table.ts'

export type RevisionRow = Selectable<RevisionsTable>

function quotes(db: Reader) {
  return db
    .selectFrom('quotes')
    .innerJoin('companies', 'companies.id', 'quotes.companyId')
    .innerJoin('requests', 'requests.id', 'quotes.requestId')
    .innerJoin('people', 'people.id', 'requests.contactId')
    .selectAll('quotes')
    .select(['companies.name as companyName', 'companies.taxCertificate'])
    .select(['requests.number as requestNumber', 'requests.title', 'requests.shipTo', 'requests.contactId'])
    .select(['people.name as contactName', 'people.email as contactEmail'])
}
export type QuoteRow = Awaited<ReturnType<ReturnType<typeof quotes>['executeTakeFirstOrThrow']>>

export function findQuote(db: Reader, id: string): Promise<QuoteRow | undefined> {
  return quotes(db).where('quotes.id', '=', id).executeTakeFirst()
}

/** First to last. */
export function revisionsOf(db: Reader, quoteId: string): Promise<RevisionRow[]> {
  return db.selectFrom('revisions').selectAll().where('quoteId', '=', quoteId).orderBy('position').execute()
}

export interface QuotesWanted {
  companyId: string | undefined
  /** Statuses in which the caller sees a revision at all. */
  seen: readonly RevisionStatus[]
  status: RevisionStatus | undefined
  text: string | undefined
  cursor: Cursor | undefined
  limit: number
}

/** Each quote with the latest of its revisions that the caller may see. */
export function findQuotes(db: Reader, wanted: QuotesWanted) {
  const { companyId, seen, status, text, cursor, limit } = wanted
  return quotes(db)
    .innerJoin('revisions', 'revisions.quoteId', 'quotes.id')
    .select(['revisions.letter', 'revisions.status', 'revisions.total', 'revisions.currency'])
    .select('revisions.validUntil')
    .where('revisions.position', '=', (outer) =>
      outer
        .selectFrom('revisions as latest')
        .select((is) => is.fn.max('latest.position').as('position'))
        .whereRef('latest.quoteId', '=', 'quotes.id')
        .where('latest.status', 'in', seen),
    )
    .$if(companyId !== undefined, (query) => query.where('quotes.companyId', '=', companyId ?? ''))
    .$if(status !== undefined, (query) => query.where('revisions.status', '=', status ?? 'draft'))
    .$if(!!text, (query) =>
      query.where(containsText(text ?? '', 'quotes.number', 'requests.title', 'companies.name')),
    )
    .$if(cursor !== undefined, (query) =>
      cursor ? query.where(olderThan('quotes.createdAt', 'quotes.id', cursor)) : query,
    )
    .orderBy('quotes.createdAt', 'desc')
    .orderBy('quotes.id', 'desc')
    .limit(limit)
    .execute()
}
export type QuoteListRow = Awaited<ReturnType<typeof findQuotes>>[number]

export async function insertQuote(trx: Trx, row: Insertable<QuotesTable>): Promise<void> {
  await trx.insertInto('quotes').values(row).execute()
}

export async function insertRevision(trx: Trx, row: Insertable<RevisionsTable>): Promise<void> {
  await trx.insertInto('revisions').values(row).execute()
}

export async function updateRevision(
  trx: Trx,
  id: string,
  change: Updateable<RevisionsTable>,
): Promise<void> {
  await trx.updateTable('revisions').set(change).where('id', '=', id).execute()
}

/** Sent, and past their day. */
export function staleRevisions(db: Reader, now: string) {
  return db
    .selectFrom('revisions')
    .innerJoin('quotes', 'quotes.id', 'revisions.quoteId')
    .selectAll('revisions')
    .select('quotes.number')
    .where('revisions.status', '=', 'sent')
    .where('revisions.validUntil', '<', now)
    .execute()
}
