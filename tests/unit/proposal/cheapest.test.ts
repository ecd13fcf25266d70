import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { catalogue } from '../../../seeds/reference/catalogue.ts'
import { DEFAULT_PRICE_BOOK } from '../../../seeds/reference/price-book.ts'
import { familiesFor, limitsBroken, screenStock, stockOf } from '../../../shared/proposal/candidates.ts'
import type { LineAsked } from '../../../shared/proposal/line-asked.ts'
import { cheapest, priceOne } from '../../../shared/proposal/price-candidates.ts'
import { scheduler } from '../../../shared/proposal/propose-schedule.ts'
import { propose } from '../../../shared/proposal/propose.ts'
import { prepareColumn } from '../../../shared/standards/prepare-column.ts'

const pinned = { bottom: 'pinned', top: 'pinned' } as const
const asked: fc.Arbitrary<LineAsked> = fc.record({
  mark: fc.constant('A1'),
  quantity: fc.integer({ min: 1, max: 60 }),
  limits: fc.constant({ maxUtilisation: 1 }),
  finish: fc.constantFrom('none' as const, 'prime' as const, 'paint' as const, 'galvanise' as const),
  base: fc.record({
    plate: fc.boolean(),
    rods: fc.boolean(),
    concrete: fc.constantFrom({ strength: 28 }, { strength: 21, pier: { length: 500, width: 450 } }),
  }),
  cap: fc.record({ plate: fc.boolean() }),
  height: fc.integer({ min: 2500, max: 15_000 }),
  ends: fc.constant({ strong: pinned, weak: pinned }),
  loads: fc.record({
    dead: fc.integer({ min: 20_000, max: 900_000 }),
    live: fc.integer({ min: 0, max: 900_000 }),
  }),
})

describe('the cheapest as delivered', () => {
  it('are those that pricing every shape finds', () => {
    fc.assert(
      fc.property(asked, fc.constantFrom(null, { km: 120 }), (line, delivery) => {
        const terms = { book: DEFAULT_PRICE_BOOK, delivery }
        const stock = stockOf(catalogue.ofFamilies(familiesFor(line, DEFAULT_PRICE_BOOK)), undefined)
        const holding = screenStock(prepareColumn(line), stock).filter(
          (candidate) => limitsBroken(candidate, line.limits).length === 0,
        )
        const all = holding.flatMap((candidate) => priceOne(line, candidate, terms) ?? [])
        const prices = all.map(({ price }) => price.delivered.amount).sort((a, b) => a - b)
        const found = cheapest(line, holding, terms, 6).map(({ price }) => price.delivered.amount)
        expect(found).toEqual(prices.slice(0, 6))
      }),
      { numRuns: 12 },
    )
  }, 60_000)

  it('is what a schedule offers for the same line', () => {
    const offer = scheduler(catalogue, DEFAULT_PRICE_BOOK)
    fc.assert(
      fc.property(asked, (line) => {
        const one = propose({ asked: line, catalogue, book: DEFAULT_PRICE_BOOK, delivery: null })
        const row = offer({ asked: line, delivery: null })
        if (one.found) expect(row.offered?.unitPrice).toEqual(one.price.lines[0]?.unitPrice)
        else expect(row).toMatchObject({ offered: null, reason: one.reason })
      }),
      { numRuns: 12 },
    )
  }, 60_000)
})
