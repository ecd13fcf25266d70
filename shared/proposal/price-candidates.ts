import { baseOfLine, baseInput } from './base-of-line.ts'
import type { BaseDesign } from '../base/base-design.ts'
import { quickBase } from '../base/quick-base.ts'
import { priceCandidate, type CandidatePrice } from '../pricing/candidate.ts'
import type { LineSpec } from '../pricing/line-spec.ts'
import { minorUnits } from '../pricing/money.ts'
import type { PriceBook } from '../pricing/price-book.ts'
import { lineSpecOf, type ChosenBase } from '../quoting/defaults.ts'
import type { Candidate } from './candidates.ts'
import { leastByShape, leastByWork } from './least-price.ts'
import type { LineAsked } from './line-asked.ts'
import type { PriceTerms } from './price-terms.ts'

export interface PricedCandidate extends Candidate {
  spec: LineSpec
  price: CandidatePrice
}

/** How a candidate would be made; undefined where no base of it holds. */
function makeOf(asked: LineAsked, candidate: Candidate, book: PriceBook): LineSpec | undefined {
  if (!asked.base.plate) return specOf(asked, candidate, null)
  const parts = quickBase(baseInput(asked, book, candidate.section, candidate.screening))
  if (!parts) return undefined
  const { plate, rods, hole, leg } = parts
  const holes = { count: rods.count, diameter: hole }
  return specOf(asked, candidate, { plate, rods, holes, welds: { leg, length: candidate.section.perimeter } })
}

export function specOf(asked: LineAsked, { section, steel }: Candidate, base: ChosenBase | null): LineSpec {
  const { mark, quantity, finish, height = 0 } = asked
  return lineSpecOf({
    ...{ mark, quantity, section, grade: steel.name, height, finish, base },
    withRods: asked.base.rods,
    withCap: asked.cap.plate,
  })
}

/** What a candidate would cost; undefined where it has no base that holds, or no price. */
export function priceOne(
  asked: LineAsked,
  candidate: Candidate,
  terms: PriceTerms,
): PricedCandidate | undefined {
  const spec = makeOf(asked, candidate, terms.book)
  return spec && priceMade(candidate, spec, terms)
}

function priceMade(
  candidate: Candidate,
  spec: LineSpec,
  { book, delivery }: PriceTerms,
): PricedCandidate | undefined {
  const price = priceCandidate(book, candidate.section, spec, { delivery })
  return price && { ...candidate, spec, price }
}

/** The base of a candidate in full, with its steps. */
export function baseOf(
  asked: LineAsked,
  { section, screening }: Candidate,
  book: PriceBook,
): BaseDesign | null {
  return asked.base.plate ? baseOfLine(asked, book, section, screening) : null
}

const delivered = ({ price }: PricedCandidate) => price.delivered.amount

/**
 * The `count` cheapest as delivered, cheapest first: the same as pricing every candidate, but what cannot be cheaper than
 * those found already is left out, by two bounds.
 */
export function cheapest(
  asked: LineAsked,
  candidates: readonly Candidate[],
  terms: PriceTerms,
  count: number,
): PricedCandidate[] {
  const minor = minorUnits(terms.book.currency)
  const leastOf = leastByShape(terms, asked)
  const ordered = candidates
    .map((candidate) => ({ candidate, least: leastOf(candidate.section) }))
    .sort((a, b) => a.least - b.least)
  let best: PricedCandidate[] = []
  // Each piece is rounded to the cent, and so is delivery: a bound may be above a price by that much.
  const slack = (asked.quantity + 1) / minor
  for (const { candidate, least } of ordered) {
    const worst = best.length === count ? best.at(-1) : undefined
    const limit = worst ? delivered(worst) / minor + slack : Infinity
    if (least > limit) break
    const spec = makeOf(asked, candidate, terms.book)
    if (!spec || leastByWork(terms, spec, candidate.section) > limit) continue
    const priced = priceMade(candidate, spec, terms)
    if (priced) best = [...best, priced].sort((a, b) => delivered(a) - delivered(b)).slice(0, count)
  }
  return best
}

/** The one with the least measure of those that can be made and priced. */
export function leastPriced(
  asked: LineAsked,
  candidates: readonly Candidate[],
  terms: PriceTerms,
  measure: (candidate: Candidate) => number,
): PricedCandidate | undefined {
  for (const candidate of candidates.toSorted((a, b) => measure(a) - measure(b))) {
    const priced = priceOne(asked, candidate, terms)
    if (priced) return priced
  }
  return undefined
}
