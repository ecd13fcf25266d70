import { z } from 'zod'
import type { AnswerOf } from '../../../shared/contracts/operations.ts'
import { pricedQuote } from '../../../shared/contracts/pricing.ts'
import {
  quoteLine,
  type QuoteDto,
  type QuoteLineDto,
  type RevisionDto,
} from '../../../shared/contracts/quotes.ts'
import { shipTo } from '../../../shared/contracts/requests.ts'
import { money } from '../../../shared/pricing/money.ts'
import { basisStatements, CAUTIONS, EXCLUSIONS } from '../../../shared/quoting/cautions.ts'
import { priceForCustomer } from '../price-books/customer-price.service.ts'
import type { OrderForPayment } from '../orders/orders.service.ts'
import type { QuoteListRow, QuoteRow, RevisionRow } from './quotes.repo.ts'

function lineForCustomer({ alternatives: _, ...line }: QuoteLineDto): QuoteLineDto {
  const { overrides: __, extras, ...spec } = line.spec
  const shown = extras.map(({ description, quantity }) => ({ description, quantity }))
  return { ...line, spec: { ...spec, extras: shown } }
}

const keptLines = z.array(quoteLine)
const keptBlockers = z.array(z.string())

export function linesOf(row: Pick<RevisionRow, 'lines'>): QuoteLineDto[] {
  return keptLines.parse(JSON.parse(row.lines))
}

function toRevision(row: RevisionRow): RevisionDto {
  const { letter, status, version, discount, note, approvedBy, approvedAt, sentAt, validUntil } = row
  const { answeredBy, answeredAt, answerReason } = row
  return {
    ...{ letter, status, version, discount, note, approvedBy, approvedAt, sentAt, validUntil },
    ...{ answeredBy, answeredAt, answerReason },
    lines: linesOf(row),
    price: pricedQuote.parse(JSON.parse(row.price)),
    blockers: keptBlockers.parse(JSON.parse(row.blockers)),
  }
}

function revisionForCustomer({ blockers: _, ...revision }: RevisionDto): RevisionDto {
  return {
    ...revision,
    lines: revision.lines.map(lineForCustomer),
    price: priceForCustomer(revision.price),
    approvedBy: null,
    approvedAt: null,
  }
}

export interface QuoteParts {
  quote: QuoteRow
  /** Those that the caller may see, first to last. */
  revisions: readonly RevisionRow[]
  current: RevisionRow
  order: OrderForPayment | undefined
  holdsDays: number
}

/** A quote as the shop sees it, but for its letters. */
export function toQuote({ quote, revisions, current, order, holdsDays }: QuoteParts): QuoteDto {
  const { id, number, companyId, companyName, contactName, contactEmail } = quote
  const to = shipTo.parse(JSON.parse(quote.shipTo))
  const revision = toRevision(current)
  return {
    ...{ id, number },
    request: { id: quote.requestId, number: quote.requestNumber, title: quote.title },
    company: { id: companyId, name: companyName },
    contact: { name: contactName, email: contactEmail },
    shipTo: to,
    revisions: revisions.map(({ letter, status, total, currency, sentAt }) => ({
      ...{ letter, status, sentAt },
      total: money(total, currency),
    })),
    current: revision,
    order: order ? { id: order.id, number: order.number, status: order.status } : null,
    basis: basisStatements({
      standards: standardsOf(revision.lines),
      deliveryKm: to.km > 0 ? to.km : null,
      holdsDays,
      taxExempt: revision.price.tax.exempt,
    }),
    exclusions: EXCLUSIONS.map(({ text }) => text),
    cautions: CAUTIONS.map(({ text }) => text),
  }
}

export function quoteForCustomer(quote: QuoteDto): QuoteDto {
  const { letters: _, ...rest } = quote
  return { ...rest, current: revisionForCustomer(quote.current) }
}

function standardsOf(lines: readonly QuoteLineDto[]): string[] {
  const all = lines.map(({ requirement: { standard, method } }) =>
    standard === 'EN 1993-1-1' ? standard : `${standard}, ${method ?? 'LRFD'}`,
  )
  return [...new Set(all)]
}

export function toQuoteSummary(row: QuoteListRow): AnswerOf<'listQuotes'>['items'][number] {
  const { id, number, letter, status, title, validUntil, createdAt } = row
  return {
    ...{ id, number, letter, status, title, validUntil, createdAt },
    company: { id: row.companyId, name: row.companyName },
    total: money(row.total, row.currency),
  }
}
