import { describe, expect, it } from 'vitest'
import { DEFAULT_PRICE_BOOK } from '../../seeds/reference/price-book.ts'
import { priceQuote } from '../../shared/pricing/build-up.ts'
import { exact } from '../../shared/pricing/exact.ts'
import type { LineSpec } from '../../shared/pricing/line-spec.ts'
import { moneyToDecimal } from '../../shared/pricing/money.ts'
import type { LineToPrice } from '../../shared/pricing/priced-quote.ts'

/*
 * Source: a worked example priced by a separate program with the figures of the shop's first price book: two marks,
 * delivery over 85 km, tax 7.25 %. Its costs are printed to six places, its prices to the cent; both are held as
 * printed. Masses, areas and outlines are inputs of the example and rounded there, so they are given here again.
 */

function spec(over: Partial<LineSpec>): LineSpec {
  return {
    mark: 'A1',
    quantity: 1,
    section: 'W10X49',
    grade: 'A992',
    height: 5400,
    finish: 'prime',
    base: null,
    cap: null,
    rods: { count: 4, diameter: 19.05, grade: 'F1554-36' },
    welds: [],
    extras: [],
    overrides: [],
    ...over,
  }
}

const plate = (side: number, thickness: number, count: number) => ({
  length: side,
  width: side,
  thickness,
  holes: { count, diameter: 22 },
})
const fillets = (length: number) => [
  { where: 'base' as const, leg: 8, length },
  { where: 'cap' as const, leg: 6, length },
]

const A1: LineToPrice = {
  section: { designation: 'W10X49', family: 'W', mass: 72.9, area: 9290, perimeter: 1512 },
  spec: spec({ quantity: 4, base: plate(380, 25, 4), cap: plate(300, 16, 4), welds: fillets(1500) }),
}
const A2: LineToPrice = {
  section: { designation: 'HSS6X6X3/8', family: 'HSS_SQUARE', mass: 40.9, area: 4890, perimeter: 585 },
  spec: spec({
    mark: 'A2',
    quantity: 3,
    section: 'HSS6X6X3/8',
    grade: 'A500-C',
    height: 3800,
    base: plate(300, 20, 4),
    cap: plate(200, 12, 2),
    welds: fillets(580),
  }),
}

const PUBLISHED = [
  {
    mark: 'A1',
    pieceMass: 430.3136,
    bars: [{ stockLength: 12192, times: 2, cuts: [5359, 5359], left: 1458 }],
    costs: {
      shaftSteel: '3052.588356',
      plateSteel: '372.956640',
      rods: '184.000000',
      sawing: '112.015800',
      plateCutting: '40.768000',
      drilling: '100.880000',
      welding: '491.400000',
      fitting: '168.764461',
      finish: '500.470864',
      drawing: '95.000000',
    },
    lineCost: '5118.844121',
    unitPrice: '1591.84',
    linePrice: '6367.36',
  },
  {
    mark: 'A2',
    pieceMass: 172.0092,
    bars: [{ stockLength: 12192, times: 1, cuts: [3768, 3768, 3768], left: 869 }],
    costs: {
      shaftSteel: '1112.017012',
      plateSteel: '126.288288',
      rods: '138.000000',
      sawing: '54.085200',
      plateCutting: '19.843200',
      drilling: '53.040000',
      welding: '142.506000',
      fitting: '111.462538',
      finish: '108.657780',
      drawing: '95.000000',
    },
    lineCost: '1960.900018',
    unitPrice: '813.06',
    linePrice: '2439.18',
  },
]

describe('the worked example to the cent', () => {
  const priced = priceQuote({
    book: DEFAULT_PRICE_BOOK,
    lines: [A1, A2],
    delivery: { km: 85 },
    tax: { rate: '0.0725', exempt: false },
    discount: '0',
  })

  it.each(PUBLISHED.map((line, index) => ({ ...line, index })))('$mark', (published) => {
    const line = priced.lines[published.index]
    const plan = priced.steel[published.index]
    const costs = Object.fromEntries(
      line?.cost.lines.map(({ key, cost }) => [key, exact(cost).toFixed(6)]) ?? [],
    )
    expect(costs).toEqual(published.costs)
    expect(exact(line?.cost.lineCost ?? 0).toFixed(6)).toBe(published.lineCost)
    expect(line?.pieceMass).toBeCloseTo(published.pieceMass, 6)
    expect(line && moneyToDecimal(line.unitPrice)).toBe(published.unitPrice)
    expect(line && moneyToDecimal(line.linePrice)).toBe(published.linePrice)
    expect(
      plan?.nest.bars.map(({ stock, ...bar }) => ({ ...bar, stockLength: plan.stock[stock]?.length })),
    ).toEqual(published.bars)
  })

  it('painted areas of one piece', () => {
    const areas = priced.lines.map(({ quantity, cost }) => {
      const finish = cost.lines.find(({ key }) => key === 'finish')
      return exact(finish?.quantity ?? 0)
        .div(quantity)
        .toFixed(6)
    })
    expect(areas).toEqual(['8.628808', '2.497880'])
  })

  it('delivery, tax, total and deposit', () => {
    expect(moneyToDecimal(priced.subtotal)).toBe('8806.54')
    expect(priced.delivery).toMatchObject({ trucks: 1, cost: '344' })
    expect(moneyToDecimal(priced.delivery.price)).toBe('427.90')
    expect(moneyToDecimal(priced.tax.amount)).toBe('669.50')
    expect(moneyToDecimal(priced.total)).toBe('9903.94')
    expect(moneyToDecimal(priced.deposit)).toBe('2972.00')
  })
})
