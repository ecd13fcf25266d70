import { moneyToDecimal } from '../pricing/money.ts'
import { limitsBroken, type Candidate } from './candidates.ts'
import type { LineAsked } from './line-asked.ts'
import type { PricedCandidate } from './price-candidates.ts'
import { percentText } from './words.ts'

export interface NextLighter {
  section: string
  reason: string
}

/** The next lighter shape of the same family, and why it is not the one. */
export function nextLighter(
  { limits }: LineAsked,
  chosen: Candidate,
  screened: readonly Candidate[],
  ranked: readonly PricedCandidate[],
): NextLighter | null {
  const { family, mass } = chosen.section
  let next: Candidate | undefined
  for (const one of screened) {
    if (one.section.family !== family || one.section.mass >= mass) continue
    if (!next || one.section.mass > next.section.mass) next = one
  }
  if (!next) return null
  return { section: next.section.designation, reason: reasonOf(next, limits, ranked) }
}

function reasonOf(next: Candidate, limits: LineAsked['limits'], ranked: readonly PricedCandidate[]): string {
  const { utilisation, slenderness } = next.screening
  const [broken] = limitsBroken(next, limits)
  const { section } = next
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
    default: {
      const priced = ranked.find((one) => one.section === section)
      const at = priced
        ? ` at ${priced.price.unitPrice.currency} ${moneyToDecimal(priced.price.unitPrice)}`
        : ''
      return `it holds too, and is no cheaper as delivered${at}`
    }
  }
}
