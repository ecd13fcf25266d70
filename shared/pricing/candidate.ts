import { priceQuote, type QuoteToPrice } from './build-up.ts'
import type { LineSpec } from './line-spec.ts'
import { add, type Money } from './money.ts'
import type { PriceBook } from './price-book.ts'
import type { PricedSection } from './take-off.ts'

export interface CandidatePrice {
  unitPrice: Money
  linePrice: Money
  /** Line and its delivery, before tax: what alternatives are ranked by. */
  delivered: Money
  /** kg */
  pieceMass: number
}

/**
 * The price of one line alone, for comparing many alternatives. The same functions as the quote, so the same cents.
 * Undefined when a piece is longer than every bar: such a shape cannot be offered without a splice.
 */
export function priceCandidate(
  book: PriceBook,
  section: PricedSection,
  spec: LineSpec,
  terms: Partial<Pick<QuoteToPrice, 'delivery' | 'discount' | 'rack' | 'nest'>> = {},
): CandidatePrice | undefined {
  const priced = priceQuote({
    book,
    lines: [{ spec, section }],
    delivery: null,
    discount: '0',
    tax: { rate: '0', exempt: true },
    ...terms,
  })
  const line = priced.lines[0]
  if (!line || priced.steel.some(({ nest }) => nest.unplaced.length > 0)) return undefined
  return {
    unitPrice: line.unitPrice,
    linePrice: line.linePrice,
    delivered: add(line.linePrice, priced.delivery.price),
    pieceMass: line.pieceMass,
  }
}
