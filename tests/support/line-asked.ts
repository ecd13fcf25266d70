import { catalogue } from '../../seeds/reference/catalogue.ts'
import { DEFAULT_PRICE_BOOK } from '../../seeds/reference/price-book.ts'
import type { LineAsked } from '../../shared/proposal/line-asked.ts'
import { propose, type Proposal, type ProposalInput } from '../../shared/proposal/propose.ts'

const PINNED = { bottom: 'pinned', top: 'pinned' } as const

/** Four columns of 4.8 m, pinned, primed, on base plates with rods: 180 kN dead, 240 kN live. */
export function lineAsked(change: Partial<LineAsked> = {}): LineAsked {
  return {
    mark: 'A1',
    quantity: 4,
    standard: 'AISC 360-22',
    method: 'LRFD',
    height: 4800,
    ends: { strong: PINNED, weak: PINNED },
    braces: [],
    loads: { dead: 180_000, live: 240_000 },
    limits: { maxUtilisation: 1 },
    finish: 'prime',
    base: { plate: true, rods: true, concrete: { strength: 28 } },
    cap: { plate: true },
    ...change,
  }
}

/** From the whole catalogue at the default prices, 60 km away. */
export function proposeLine(change: Partial<LineAsked> = {}, more: Partial<ProposalInput> = {}) {
  return propose({
    ...{ asked: lineAsked(change), catalogue, book: DEFAULT_PRICE_BOOK, delivery: { km: 60 } },
    ...more,
  })
}

export function found(answer: ReturnType<typeof propose>): Proposal {
  if (!answer.found) throw new Error(answer.reason)
  return answer
}
