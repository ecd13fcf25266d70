import type { QuoteToPrice } from './build-up.ts'
import { costWork } from './cost-work.ts'
import { priceDelivery } from './delivery.ts'
import { exact, sum } from './exact.ts'
import type { LineSpec } from './line-spec.ts'
import { add, type Money } from './money.ts'
import { nestGreedy } from './nesting-greedy.ts'
import { barPriceOf, rodPriceOf, type PriceBook } from './price-book.ts'
import { sellLine } from './selling.ts'
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
 * The price of one line alone, for comparing many alternatives: the functions of the quote without its words, so the
 * same cents. Undefined where the quote would refuse or warn of a splice: a family or rod that the shop does not buy,
 * plates thicker than the column is high, a piece longer than every bar.
 */
export function priceCandidate(
  book: PriceBook,
  section: PricedSection,
  spec: LineSpec,
  terms: Partial<Pick<QuoteToPrice, 'delivery' | 'discount' | 'rack' | 'nest'>> = {},
): CandidatePrice | undefined {
  const { delivery = null, discount = '0', rack = [], nest = nestGreedy } = terms
  const plates = (spec.base?.thickness ?? 0) + (spec.cap?.thickness ?? 0)
  if (!barPriceOf(book, section.family) || plates >= spec.height) return undefined
  if (spec.rods && !rodPriceOf(book, spec.rods.diameter)) return undefined
  const { lines, sheets, plans } = costWork(book, [{ spec, section }], rack, nest)
  if (plans.some((plan) => plan.nest.unplaced.length > 0)) return undefined
  const cost = sum((sheets[0] ?? []).map((line) => line.cost))
  const { unitPrice, linePrice } = sellLine(book, spec, cost, exact(discount))
  const carried = priceDelivery(book, lines, delivery)
  return {
    unitPrice,
    linePrice,
    delivered: add(linePrice, carried.price),
    pieceMass: lines[0]?.piece.pieceMass.toNumber() ?? 0,
  }
}
