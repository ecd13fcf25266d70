import { DEFAULT_PRICE_BOOK } from '../../seeds/reference/price-book.ts'
import type { QuoteToPrice } from '../../shared/pricing/build-up.ts'
import type { LineSpec } from '../../shared/pricing/line-spec.ts'
import type { LineToPrice } from '../../shared/pricing/priced-quote.ts'
import type { PricedSection } from '../../shared/pricing/take-off.ts'

/** W10X49 with the rounded figures of its metric table. */
export const W10X49: PricedSection = {
  designation: 'W10X49',
  family: 'W',
  mass: 72.9,
  area: 9290,
  perimeter: 1512,
}

/** A column with plates, rods and welds; the parts of the spec that matter to a test are given. */
export function lineToPrice(spec: Partial<LineSpec> = {}, section: PricedSection = W10X49): LineToPrice {
  const plate = (side: number, thickness: number) => ({
    length: side,
    width: side,
    thickness,
    holes: { count: 4, diameter: 22 },
  })
  return {
    section,
    spec: {
      mark: 'A1',
      quantity: 4,
      section: section.designation,
      grade: 'A992',
      height: 5400,
      finish: 'prime',
      base: plate(380, 25),
      cap: plate(300, 16),
      rods: { count: 4, diameter: 19.05, grade: 'F1554-36' },
      welds: [{ where: 'base', leg: 8, length: 1500 }],
      extras: [],
      overrides: [],
      ...spec,
    },
  }
}

/** A quote by the first price book, delivered over 85 km, taxed at 7.25 %. */
export function quoteToPrice(lines: LineToPrice[], terms: Partial<QuoteToPrice> = {}): QuoteToPrice {
  return {
    book: DEFAULT_PRICE_BOOK,
    lines,
    delivery: { km: 85 },
    tax: { rate: '0.0725', exempt: false },
    discount: '0',
    ...terms,
  }
}
