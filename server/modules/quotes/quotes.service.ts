import type { AnswerOf, QueryOf } from '../../../shared/contracts/operations.ts'
import type { QuoteDto } from '../../../shared/contracts/quotes.ts'
import { isPublic } from '../../../shared/quoting/revisions.ts'
import { REVISION_STATUSES } from '../../../shared/quoting/statuses.ts'
import { pageFrom, readCursor } from '../../db/cursor.ts'
import type { Db, Reader } from '../../db/open-database.ts'
import { notFound } from '../../errors.ts'
import { isShop, personOf, type Principal } from '../../http/principal.ts'
import { orderOfQuote } from '../orders/orders.service.ts'
import { lettersOfQuote } from '../outbox/outbox.service.ts'
import { bookVersion } from '../price-books/price-books.service.ts'
import { quoteForCustomer, toQuote, toQuoteSummary, type QuoteParts } from './quotes.map.ts'
import { findQuote, findQuotes, revisionsOf } from './quotes.repo.ts'

/** Of a quote, what the caller may know: the shop all of it, its customer what was sent. Another's is not there. */
export async function visibleQuote(db: Reader, principal: Principal, id: string): Promise<QuoteParts> {
  const quote = await findQuote(db, id)
  if (!quote || !mayKnow(principal, quote)) return notFound('quote')
  const all = await revisionsOf(db, id)
  const revisions = isShop(principal) ? all : all.filter(({ status }) => isPublic(status))
  const current = revisions.at(-1)
  if (!current) return notFound('quote')
  const { holdsDays } = await bookVersion(db, current.priceBookVersion)
  return { quote, revisions, current, order: await orderOfQuote(db, id), holdsDays }
}

function mayKnow(principal: Principal, quote: { id: string; companyId: string }): boolean {
  if (principal.kind === 'link') return principal.quoteId === quote.id
  if (principal.kind === 'nobody') return false
  return isShop(principal) || principal.companyId === quote.companyId
}

/** The quote with its latest revision that the caller may see. */
export async function readQuote(db: Reader, principal: Principal, id: string): Promise<QuoteDto> {
  const quote = toQuote(await visibleQuote(db, principal, id))
  if (!isShop(principal)) return quoteForCustomer(quote)
  return { ...quote, letters: await lettersOfQuote(db, id) }
}

export async function listQuotes(
  db: Db,
  principal: Principal,
  { limit, cursor, q, status }: QueryOf<'listQuotes'>,
): Promise<AnswerOf<'listQuotes'>> {
  const { companyId } = personOf(principal)
  const rows = await findQuotes(db, {
    companyId: companyId ?? undefined,
    seen: companyId === null ? REVISION_STATUSES : REVISION_STATUSES.filter(isPublic),
    status,
    text: q,
    cursor: readCursor(cursor),
    limit: limit + 1,
  })
  return pageFrom(rows, limit, (row) => ({ at: row.createdAt, id: row.id }), toQuoteSummary)
}
