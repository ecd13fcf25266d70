import type { CandidatePrice } from '../pricing/candidate.ts'
import { moneyToDecimal, type Money } from '../pricing/money.ts'
import { limitsBroken, type Candidate } from './candidates.ts'
import { leastBy } from './least-by.ts'
import type { LineAsked } from './line-asked.ts'
import { priceOne } from './price-candidates.ts'
import type { PriceTerms } from './price-terms.ts'
import { percentText } from './words.ts'

export interface NextLighter {
  section: string
  reason: string
}

/** Undefined price: what was chosen by name cannot be made as it stands. */
type Chosen = Candidate & { price?: CandidatePrice }

/** The next lighter shape of the same family, and why it is not the one. */
export function nextLighter(
  asked: LineAsked,
  chosen: Chosen,
  screened: readonly Candidate[],
  terms: PriceTerms,
): NextLighter | null {
  const { family, mass } = chosen.section
  const lighter = screened.filter(({ section }) => section.family === family && section.mass < mass)
  const next = leastBy(lighter, ({ section }) => mass - section.mass)
  if (!next) return null
  const reason = whyNot(next, asked.limits) ?? whatItCosts(asked, chosen, next, terms)
  return { section: next.section.designation, reason }
}

/** The limit that it does not keep. */
function whyNot(next: Candidate, limits: LineAsked['limits']): string | undefined {
  const { section } = next
  const { utilisation, slenderness } = next.screening
  const [broken] = limitsBroken(next, limits)
  switch (broken) {
    case 'utilisation':
      return utilisation > 1
        ? `it works at ${percentText(utilisation)}: too weak`
        : `it works at ${percentText(utilisation)}, over the limit of ${percentText(limits.maxUtilisation)}`
    case 'slenderness':
      return `its Lc/r of ${slenderness.toFixed(0)} is over the limit of ${limits.maxSlenderness ?? ''}`
    case 'depth':
      return `it is ${section.depth.toFixed(0)} mm deep, over the limit`
    case 'width':
      return `it is ${section.width.toFixed(0)} mm wide, over the limit`
    case undefined:
      return undefined
  }
}

function whatItCosts(asked: LineAsked, { price }: Chosen, next: Candidate, terms: PriceTerms): string {
  const priced = priceOne(asked, next, terms)?.price
  if (!priced) return 'it holds, but the shop has no base plate or no bar for it'
  const each = `${inWords(priced.unitPrice)} each`
  if (!price) return `it holds too, at ${each}`
  return priced.delivered.amount < price.delivered.amount
    ? `it holds too, and costs less: ${each}`
    : `it holds too, and is no cheaper as delivered: ${each}`
}

function inWords(amount: Money): string {
  return `${amount.currency} ${moneyToDecimal(amount)}`
}
