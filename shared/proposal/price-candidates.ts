import type { BaseDesign } from '../base/base-design.ts'
import { priceCandidate, type CandidatePrice } from '../pricing/candidate.ts'
import { exact } from '../pricing/exact.ts'
import type { LineSpec } from '../pricing/line-spec.ts'
import { moneyToExact } from '../pricing/money.ts'
import type { PriceBook } from '../pricing/price-book.ts'
import { lineSpecOf } from '../quoting/defaults.ts'
import { Refusal } from '../units/refusal.ts'
import { baseOfLine } from './base-of-line.ts'
import type { Candidate } from './candidates.ts'
import { leastPrice } from './least-price.ts'
import type { LineAsked } from './line-asked.ts'

export interface PricedCandidate extends Candidate {
  base: BaseDesign | null
  spec: LineSpec
  price: CandidatePrice
}

export interface PriceTerms {
  book: PriceBook
  delivery: { km: number } | null
}

/** How a candidate would be made and what it would cost; undefined where it has no base that holds, or no price. */
export function priceOne(
  asked: LineAsked,
  candidate: Candidate,
  { book, delivery }: PriceTerms,
): PricedCandidate | undefined {
  const base = asked.base.plate ? tryBase(asked, candidate, book) : null
  if (base === undefined) return undefined
  const spec = specOf(asked, candidate, base)
  const price = priceCandidate(book, candidate.section, spec, { delivery })
  return price && { ...candidate, base, spec, price }
}

export function specOf(asked: LineAsked, { section, steel }: Candidate, base: BaseDesign | null): LineSpec {
  const { mark, quantity, finish, height = 0 } = asked
  return lineSpecOf({
    ...{ mark, quantity, section, grade: steel.name, height, finish, base },
    withRods: asked.base.rods,
    withCap: asked.cap.plate,
  })
}

function tryBase(
  asked: LineAsked,
  { section, screening }: Candidate,
  book: PriceBook,
): BaseDesign | undefined {
  try {
    const base = baseOfLine(asked, book, section, screening)
    return base.verdict === 'holds' ? base : undefined
  } catch (error) {
    // A pier smaller than the shape: another shape may stand on it.
    if (error instanceof Refusal) return undefined
    throw error
  }
}

const delivered = ({ price }: PricedCandidate) => price.delivered.amount

/**
 * The `count` cheapest as delivered, cheapest first: the same as pricing every candidate, but shapes whose steel alone
 * costs more than what is found already are left out.
 */
export function cheapest(
  asked: LineAsked,
  candidates: readonly Candidate[],
  terms: PriceTerms,
  count: number,
): PricedCandidate[] {
  const ordered = candidates
    .map((candidate) => ({ candidate, least: leastPrice(terms, asked, candidate.section) }))
    .sort((a, b) => a.least - b.least)
  let best: PricedCandidate[] = []
  for (const { candidate, least } of ordered) {
    const worst = best.length === count ? best.at(-1) : undefined
    // Each piece is rounded to the cent.
    if (worst && exact(least).minus(asked.quantity).gt(moneyToExact(worst.price.delivered))) break
    const priced = priceOne(asked, candidate, terms)
    if (priced) best = [...best, priced].sort((a, b) => delivered(a) - delivered(b)).slice(0, count)
  }
  return best
}
