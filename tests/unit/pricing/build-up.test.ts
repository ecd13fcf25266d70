import { describe, expect, it } from 'vitest'
import { DEFAULT_PRICE_BOOK as book } from '../../../seeds/reference/price-book.ts'
import { priceQuote } from '../../../shared/pricing/build-up.ts'
import { priceCandidate } from '../../../shared/pricing/candidate.ts'
import type { LineSpec } from '../../../shared/pricing/line-spec.ts'
import { moneyToDecimal } from '../../../shared/pricing/money.ts'
import type { PricedQuote } from '../../../shared/pricing/priced-quote.ts'
import { lineToPrice, quoteToPrice, W10X49 } from '../../support/priced-line.ts'

const only = (priced: PricedQuote) => {
  const [line] = priced.lines
  if (!line) throw new Error('a line was priced')
  return line
}
const price = (spec: Partial<LineSpec> = {}, terms: Parameters<typeof quoteToPrice>[1] = {}) =>
  priceQuote(quoteToPrice([lineToPrice(spec)], terms))
const cost = (priced: PricedQuote, key: string) => only(priced).cost.lines.find((line) => line.key === key)

/* Rules of the shop, each worked by hand from the figures of its first price book. */
describe('the finish of an order', () => {
  const small = { quantity: 1, height: 1000, base: null, cap: null }

  it('is charged at least 180.00, the rest as a cost line of its own', () => {
    const priced = price(small)
    // 1.512 m² × 14.50 = 21.924
    expect(cost(priced, 'finish')?.cost).toBe('21.924')
    expect(cost(priced, 'finishMinimum')?.cost).toBe('158.076')
  })

  it('shares what is short over the finished lines by their finish', () => {
    const lines = [
      lineToPrice(small),
      lineToPrice({ ...small, mark: 'A2', height: 3000 }),
      lineToPrice({ ...small, mark: 'A3', finish: 'none' }),
    ]
    const shares = priceQuote(quoteToPrice(lines)).lines.map(({ cost: sheet }) =>
      Number(sheet.lines.find(({ key }) => key === 'finishMinimum')?.cost ?? 0),
    )
    // 180 − 4 × 21.924 = 92.304, one part to three.
    expect(shares[0]).toBeCloseTo(23.076, 9)
    expect(shares[1]).toBeCloseTo(69.228, 9)
    expect(shares[2]).toBe(0)
  })

  it('is by mass when galvanised and nothing when none is asked', () => {
    expect(cost(price({ ...small, finish: 'galvanise', height: 4000 }), 'finish')).toMatchObject({
      quantity: '291.6',
      unit: 'kg',
      cost: '335.34',
    })
    expect(cost(price({ finish: 'none' }), 'finish')).toBeUndefined()
    expect(cost(price({ finish: 'none' }), 'finishMinimum')).toBeUndefined()
  })
})

describe('delivery', () => {
  const heavy = { ...W10X49, mass: 1000 }
  const trucks = (lines: Parameters<typeof quoteToPrice>[0]) =>
    priceQuote(quoteToPrice(lines)).delivery.trucks
  const bare = { base: null, cap: null, height: 4000 }

  it.each([
    [5, 1],
    [6, 2],
    [10, 2],
    [11, 3],
  ])('of %d pieces of 4 t takes %d trucks of 20 t', (quantity, count) => {
    expect(trucks([lineToPrice({ ...bare, quantity }, heavy)])).toBe(count)
  })

  it('puts no two pieces of more than half a payload on one truck', () => {
    expect(trucks([lineToPrice({ ...bare, height: 11_000, quantity: 5 }, heavy)])).toBe(5)
  })

  it('warns of a piece too long or too heavy for a truck', () => {
    expect(price({ height: 14_000 }).warnings.join()).toContain('A1 is 14000 mm long, a truck takes 13500 mm')
    const giant = priceQuote(
      quoteToPrice([lineToPrice({ ...bare, height: 13_000 }, { ...W10X49, mass: 1600 })]),
    )
    expect(giant.warnings.join()).toContain('A1 weighs 20800 kg, a truck carries 20000 kg')
  })

  it('costs nothing when the customer collects', () => {
    const priced = price({}, { delivery: null })
    expect(priced.delivery).toMatchObject({ trucks: 0, cost: '0', price: { amount: 0 } })
    expect(price({}, { delivery: { km: 0 } }).delivery.cost).toBe('140')
  })
})

describe('tax, discount and deposit', () => {
  it('no tax is charged to an exempt customer', () => {
    const exempt = price({}, { tax: { rate: '0.0725', exempt: true } })
    expect(exempt.tax).toEqual({ rate: '0.0725', exempt: true, amount: { amount: 0, currency: 'USD' } })
    expect(exempt.total.amount).toBe(exempt.subtotal.amount + exempt.delivery.price.amount)
  })

  it('a discount comes off the unit price, which is rounded again', () => {
    const [full, off] = [only(price()), only(price({}, { discount: '0.05' }))]
    expect(off.unitPrice.amount).toBe(Math.round(full.unitPrice.amount * 0.95))
    expect(off.linePrice.amount).toBe(off.unitPrice.amount * 4)
    expect(off.cost.lineCost).toBe(full.cost.lineCost)
  })

  it('the deposit is 30 % up to the next whole unit, not below 250 and not above the total', () => {
    const priced = price()
    expect(priced.deposit.amount % 100).toBe(0)
    expect(priced.deposit.amount - priced.total.amount * 0.3).toBeGreaterThanOrEqual(0)
    expect(priced.deposit.amount - priced.total.amount * 0.3).toBeLessThan(100)
    const tiny: Partial<LineSpec> = {
      quantity: 1,
      height: 500,
      base: null,
      cap: null,
      welds: [],
      rods: null,
      finish: 'none',
    }
    const small = price(tiny, { delivery: null })
    expect(small.total.amount * 0.3).toBeLessThan(25_000)
    expect(small.deposit.amount).toBe(25_000)
    const override = { item: 'unitPrice', value: '100.00', reason: 'a sample' } as const
    expect(moneyToDecimal(price({ ...tiny, overrides: [override] }, { delivery: null }).deposit)).toBe(
      '107.25',
    )
  })
})

describe('what the estimator sets by hand', () => {
  it('minutes replace the computed ones, which stay beside them', () => {
    const before = cost(price(), 'welding')
    const welding = cost(
      price({ overrides: [{ item: 'minutes.welding', value: '120', reason: 'robot welded' }] }),
      'welding',
    )
    // 120 min ÷ 60 × 78.00
    expect(welding).toMatchObject({ quantity: '120', cost: '156', basis: 'set by hand: robot welded' })
    expect(welding?.overridden).toEqual({ computed: before?.quantity, reason: 'robot welded' })
    expect(before?.overridden).toBeNull()
  })

  it('no minutes at all are shown too', () => {
    const drilling = cost(
      price({ overrides: [{ item: 'minutes.drilling', value: '0', reason: 'holes burnt' }] }),
      'drilling',
    )
    expect(drilling).toMatchObject({ cost: '0', quantity: '0' })
  })

  it('a margin below the floor is warned of, for the line and for the whole', () => {
    const thin = price(
      { overrides: [{ item: 'margin', value: '0.05', reason: 'fills the week' }] },
      { delivery: null },
    )
    const { cost: sheet } = only(thin)
    expect(sheet).toMatchObject({ margin: '0.05', resultingMargin: '0.05', belowFloor: true })
    expect(sheet.marginOverridden).toEqual({ computed: '0.18', reason: 'fills the week' })
    expect(thin.resultingMargin).toBe('0.05')
    expect(thin.warnings).toEqual([
      'the whole quote earns 5 %, below the floor of 10 %',
      'A1 earns 5 %, below the floor of 10 %',
    ])
    const least = price({ overrides: [{ item: 'margin', value: '0.10', reason: 'old friend' }] })
    expect(only(least).cost.belowFloor).toBe(false)
  })

  it('a unit price is the price, with the computed one beside it', () => {
    const set = { item: 'unitPrice', value: '1500.00', reason: 'agreed by telephone' } as const
    const [free, fixed] = [only(price()), only(price({ overrides: [set] }, { discount: '0.05' }))]
    expect(moneyToDecimal(fixed.unitPrice)).toBe('1500.00')
    expect(fixed.cost.unitPriceOverridden?.reason).toBe('agreed by telephone')
    expect(fixed.cost.computedUnitPrice.amount).toBe(Math.round(free.unitPrice.amount * 0.95))
    expect(Number(fixed.cost.resultingMargin)).toBeCloseTo(1 - (Number(fixed.cost.lineCost) * 1.02) / 6000, 4)
  })

  it('extras are for the whole line', () => {
    const extra = { description: 'Brace tabs', quantity: 8, unitCost: '12.50' }
    expect(cost(price({ extras: [extra] }), 'extra.1')).toMatchObject({ label: 'Brace tabs', cost: '100' })
  })
})

describe('steel', () => {
  it('of one section and grade is cut together and shared by cut length', () => {
    const lines = [
      lineToPrice({ quantity: 1, height: 8041 }),
      lineToPrice({ mark: 'A2', quantity: 1, height: 4041 }),
      lineToPrice({ mark: 'A3', quantity: 1, height: 4041, grade: 'A36' }),
    ]
    const priced = priceQuote(quoteToPrice(lines))
    expect(priced.steel.map(({ grade, nest }) => [grade, nest.bars.map(({ cuts }) => cuts)])).toEqual([
      ['A992', [[8000, 4000]]],
      ['A36', [[4000]]],
    ])
    const [first, second] = priced.lines.map(({ cost: sheet }) => Number(sheet.lines[0]?.cost))
    expect(first).toBeCloseTo(2 * (second ?? 0), 9)
    // One trim cut for the bar, two parts to one.
    expect(priced.lines[0]?.cost.lines.find(({ key }) => key === 'sawing')?.basis).toContain(
      '0.667 trim cuts',
    )
    expect(priced.warnings).toContain('A3: no bar price for A36; priced as A992')
  })

  it('comes from the rack where that is cheaper', () => {
    const rack = [{ section: 'W10X49', grade: 'A992', length: 5500, bookValue: '300.00', count: 1 }]
    const priced = price({ quantity: 1 }, { rack })
    // 300.00 less 128 mm of scrap: 0.128 × 72.9 × 0.28 = 2.612736
    expect(cost(priced, 'shaftSteel')?.cost).toBe('297.387264')
    const other = price(
      { quantity: 1 },
      { rack: [{ section: 'W10X49', grade: 'A36', length: 5500, bookValue: '1', count: 1 }] },
    )
    expect(cost(other, 'shaftSteel')?.cost).toBe(cost(price({ quantity: 1 }), 'shaftSteel')?.cost)
  })

  it('longer than every bar is charged by mass, with a warning, and is no candidate', () => {
    const line = lineToPrice({ quantity: 2, height: 20_041 })
    const priced = priceQuote(quoteToPrice([line]))
    // 2 × 20.000 m × 72.9 kg/m × 1.85
    expect(cost(priced, 'shaftSteel')?.cost).toBe('5394.6')
    expect(priced.warnings.join()).toContain('2 of 20000 mm are charged by mass only')
    expect(priceCandidate(book, line.section, line.spec)).toBeUndefined()
  })
})

describe('where the book has no price of its own', () => {
  it('the next larger rod stands in, with a warning', () => {
    const priced = price({ rods: { count: 4, diameter: 22.2, grade: 'F1554-55' } })
    expect(cost(priced, 'rods')?.rate).toBe('19')
    expect(priced.warnings).toEqual([
      'A1: rods of 22.2 mm are priced as 25.4 mm',
      'A1: no rod price for F1554-55; priced as F1554-36',
    ])
  })

  it('a plate that is not stocked is named', () => {
    const cap = { length: 300, width: 300, thickness: 17, holes: { count: 0, diameter: 0 } }
    expect(price({ cap }).warnings).toEqual(['A1: plate of 17 mm is not a stocked thickness'])
  })
})

describe('what has no price', () => {
  it.each<[Partial<LineSpec>, string]>([
    [{ quantity: 0 }, 'lines.0.quantity: a whole number'],
    [{ quantity: 1.5 }, 'lines.0.quantity'],
    [{ height: 41 }, 'lines.0.height: more than its plates are thick'],
    [{ height: NaN }, 'lines.0.height'],
    [{ rods: { count: 4, diameter: 50, grade: 'F1554-36' } }, 'lines.0.rods.diameter: at most 38.1'],
    [{ extras: [{ description: 'Gift', quantity: 1, unitCost: '-5' }] }, 'lines.0.extras.0.unitCost'],
    [{ extras: [{ description: 'Lugs', quantity: 1, unitCost: '1e3' }] }, 'lines.0.extras.0.unitCost'],
    [
      { overrides: [{ item: 'margin', value: '1', reason: 'greed' }] },
      'lines.0.overrides.0.value: a fraction',
    ],
    [{ overrides: [{ item: 'unitPrice', value: '0', reason: 'gift' }] }, 'lines.0.overrides.0.value'],
    [{ overrides: [{ item: 'minutes.sawing', value: '-1', reason: 'saw' }] }, 'lines.0.overrides.0.value'],
    [{ overrides: [{ item: 'margin', value: '0.2', reason: ' ' }] }, 'lines.0.overrides.0.reason'],
    [
      {
        overrides: [
          { item: 'margin', value: '0.2', reason: 'one' },
          { item: 'margin', value: '0.3', reason: 'two' },
        ],
      },
      'lines.0.overrides.1.item: margin is set twice',
    ],
  ])('%j is refused by name', (spec, message) => {
    expect(() => price(spec)).toThrow(message)
  })

  it('names every field at once, and what is outside the lines too', () => {
    const wrong = () =>
      price({ quantity: 0 }, { discount: '0.9', tax: { rate: '7.25', exempt: false }, delivery: { km: -1 } })
    for (const field of ['lines.0.quantity', 'discount', 'tax.rate', 'delivery.km'])
      expect(wrong).toThrow(field)
    expect(() => priceQuote(quoteToPrice([]))).toThrow('lines: at least one line')
  })

  it('is a family that the shop does not buy', () => {
    const beam = lineToPrice({}, { ...W10X49, family: 'IPE', designation: 'IPE300' })
    expect(() => priceQuote(quoteToPrice([beam]))).toThrow(
      'lines.0.section: IPE300 is not among what the shop buys',
    )
    expect(priceCandidate(book, beam.section, beam.spec)).toBeUndefined()
  })
})
