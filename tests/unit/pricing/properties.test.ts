import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { DEFAULT_PRICE_BOOK as book } from '../../../seeds/reference/price-book.ts'
import { pricedQuote } from '../../../shared/contracts/pricing.ts'
import { priceQuote } from '../../../shared/pricing/build-up.ts'
import { priceCandidate } from '../../../shared/pricing/candidate.ts'
import { exact, sum } from '../../../shared/pricing/exact.ts'
import { FINISHES } from '../../../shared/pricing/line-spec.ts'
import type { LineToPrice } from '../../../shared/pricing/priced-quote.ts'
import { lineToPrice, quoteToPrice, W10X49 } from '../../support/priced-line.ts'

const sections = [
  W10X49,
  { ...W10X49, designation: 'W8X31', mass: 46.13, area: 5890, perimeter: 1207 },
  { designation: 'HSS6X6X3/8', family: 'HSS_SQUARE' as const, mass: 40.9, area: 4890, perimeter: 585 },
]
const line = fc
  .record({
    section: fc.constantFrom(...sections),
    quantity: fc.integer({ min: 1, max: 40 }),
    height: fc.integer({ min: 500, max: 12_000 }),
    finish: fc.constantFrom(...FINISHES),
    grade: fc.constantFrom('A992', 'A500-C'),
    unitCost: fc.integer({ min: 0, max: 100_000 }),
  })
  .map(({ section, unitCost, ...spec }): LineToPrice =>
    lineToPrice(
      {
        ...spec,
        extras: [{ description: 'Tabs', quantity: 3, unitCost: (unitCost / 100).toFixed(2) }],
      },
      section,
    ),
  )
const lines = fc.array(line, { minLength: 1, maxLength: 6 })
const terms = fc.record({
  delivery: fc.option(fc.record({ km: fc.integer({ min: 0, max: 900 }) })),
  discount: fc.constantFrom('0', '0.05', '0.125'),
  tax: fc.record({ rate: fc.constantFrom('0', '0.0725', '0.19'), exempt: fc.boolean() }),
})

describe('every quote', () => {
  it('adds up: lines, delivery and tax are the total', () => {
    fc.assert(
      fc.property(lines, terms, (work, asked) => {
        const {
          lines: priced,
          subtotal,
          delivery,
          tax,
          total,
          deposit,
        } = priceQuote(quoteToPrice(work, asked))
        const sold = priced.reduce((all, { linePrice }) => all + linePrice.amount, 0)
        expect(subtotal.amount).toBe(sold)
        expect(sold + delivery.price.amount + tax.amount.amount).toBe(total.amount)
        for (const one of priced) expect(one.linePrice.amount).toBe(one.unitPrice.amount * one.quantity)
        expect(deposit.amount).toBeGreaterThan(0)
        expect(deposit.amount).toBeLessThanOrEqual(total.amount)
      }),
    )
  })

  it('shows cost lines that sum to the line cost to the last digit, and steel that sums to its bars', () => {
    fc.assert(
      fc.property(lines, (work) => {
        const priced = priceQuote(quoteToPrice(work))
        for (const { cost } of priced.lines) {
          const shown = sum(cost.lines.map((row) => exact(row.cost)))
          expect(shown.toFixed()).toBe(cost.lineCost)
        }
        const shafts = priced.lines.flatMap(({ cost }) =>
          cost.lines.filter(({ key }) => key === 'shaftSteel'),
        )
        const bars = sum(priced.steel.map(({ netCost }) => exact(netCost)))
        expect(sum(shafts.map((row) => exact(row.cost))).eq(bars)).toBe(true)
      }),
    )
  })

  it('charges at least the order minimum for finishing, once', () => {
    fc.assert(
      fc.property(lines, (work) => {
        const rows = priceQuote(quoteToPrice(work)).lines.flatMap(({ cost }) => cost.lines)
        const finish = sum(rows.filter(({ key }) => key === 'finish').map((row) => exact(row.cost)))
        const added = sum(rows.filter(({ key }) => key === 'finishMinimum').map((row) => exact(row.cost)))
        const least = finish.isZero() ? 0 : Math.max(180, finish.toNumber())
        expect(finish.plus(added).toNumber()).toBeCloseTo(least, 9)
      }),
    )
  })

  it('comes out the same when priced again', () => {
    fc.assert(
      fc.property(lines, terms, (work, asked) => {
        expect(priceQuote(quoteToPrice(work, asked))).toEqual(priceQuote(quoteToPrice(work, asked)))
      }),
      { numRuns: 30 },
    )
  })

  it('fits the contract that carries it', () => {
    fc.assert(
      fc.property(lines, terms, (work, asked) => {
        const priced = priceQuote(quoteToPrice(work, asked))
        const carried = pricedQuote.parse(priced)
        expect(carried.total).toEqual(priced.total)
        expect(carried.lines.map(({ cost }) => cost?.lines.length)).toEqual(
          priced.lines.map(({ cost }) => cost.lines.length),
        )
      }),
      { numRuns: 30 },
    )
  })

  it('is screened at the cents that it is sold at', () => {
    fc.assert(
      fc.property(line, terms, (one, { delivery, discount }) => {
        const sold = priceQuote(quoteToPrice([one], { delivery, discount }))
        const screened = priceCandidate(book, one.section, one.spec, { delivery, discount })
        expect(screened?.unitPrice).toEqual(sold.lines[0]?.unitPrice)
        expect(screened?.delivered.amount).toBe(sold.subtotal.amount + sold.delivery.price.amount)
      }),
    )
  })
})

/*
 * What holds exactly: the price of a line alone, before the discount and with its bars solved exactly (one length,
 * bars without limit), does not fall when its quantity, height or mass per metre grows and all else stays, up to the
 * longest bar. The unit price may well fall with the quantity, as bars fill up and the drawing is shared.
 */
describe('the price of a line alone', () => {
  const total = (one: LineToPrice) => priceQuote(quoteToPrice([one])).total.amount
  const height = fc.integer({ min: 500, max: 18_000 })
  const quantity = fc.integer({ min: 1, max: 300 })
  const more = fc.integer({ min: 1, max: 60 })

  it('rises with the quantity', () => {
    fc.assert(
      fc.property(quantity, more, height, (few, added, tall) => {
        const before = total(lineToPrice({ quantity: few, height: tall }))
        expect(total(lineToPrice({ quantity: few + added, height: tall }))).toBeGreaterThan(before)
      }),
    )
  })

  it('does not fall with the length, and rises with a metre of it', () => {
    fc.assert(
      fc.property(quantity, more, height, (count, added, tall) => {
        const before = total(lineToPrice({ quantity: count, height: tall }))
        expect(total(lineToPrice({ quantity: count, height: tall + added }))).toBeGreaterThanOrEqual(before)
        if (tall > 17_000) return
        expect(total(lineToPrice({ quantity: count, height: tall + 1000 }))).toBeGreaterThan(before)
      }),
    )
  })

  it('rises with the mass', () => {
    fc.assert(
      fc.property(quantity, more, height, (count, added, tall) => {
        const at = (mass: number) =>
          total(lineToPrice({ quantity: count, height: tall }, { ...W10X49, mass }))
        expect(at(40 + added)).toBeGreaterThan(at(40))
      }),
    )
  })

  it('each may fall as more are made', () => {
    const unit = (count: number) =>
      priceQuote(quoteToPrice([lineToPrice({ quantity: count })])).lines[0]?.unitPrice.amount ?? 0
    expect(unit(2)).toBeLessThan(unit(1))
  })
})
