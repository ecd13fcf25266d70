import { decimalText, exact, type Exact } from './exact.ts'
import type { LineSpec, Override } from './line-spec.ts'
import { compare, money, moneyToDecimal, moneyToExact, roundToMoney, times, type Money } from './money.ts'
import type { PriceBook } from './price-book.ts'
import type { LineCost, OverridableItem } from './priced-quote.ts'

export interface Sale {
  margin: Exact
  /** Unit price with none set by hand. */
  computed: Money
  unitPrice: Money
  linePrice: Money
}

/** Cost with contingency and margin: cost × (1 + contingency) ÷ (1 − margin). */
export function marked(book: PriceBook, cost: Exact, margin: Exact, pieces = 1): Exact {
  // One division at the end keeps a half cent a half cent.
  return cost.times(exact(book.contingency).plus(1)).div(exact(1).minus(margin).times(pieces))
}

/** 1 − cost × (1 + contingency) ÷ price, to four places; 0 where nothing is charged and nothing costs. */
export function resultingMargin(book: PriceBook, cost: Exact, price: Exact): Exact {
  if (price.isZero()) return exact(cost.isZero() ? 0 : -1)
  return exact(1)
    .minus(cost.times(exact(book.contingency).plus(1)).div(price))
    .toDecimalPlaces(4)
}

/**
 * The two places where a line is rounded, half up to the minor unit: unit price = line cost ÷ quantity ×
 * (1 + contingency) ÷ (1 − margin), and again after the discount. A unit price set by hand is the price: no discount
 * comes off it.
 */
export function sellLine(book: PriceBook, spec: LineSpec, cost: Exact, discount: Exact): Sale {
  const margin = exact(byHand(spec, 'margin')?.value ?? book.margin)
  const listed = roundToMoney(marked(book, cost, margin, spec.quantity), book.currency)
  const computed = discount.isZero()
    ? listed
    : roundToMoney(moneyToExact(listed).times(exact(1).minus(discount)), book.currency)
  const set = byHand(spec, 'unitPrice')
  const unitPrice = set ? roundToMoney(exact(set.value), book.currency) : computed
  return { margin, computed, unitPrice, linePrice: times(unitPrice, spec.quantity) }
}

/** How the price of a line came about, for the estimator: computed and set by hand side by side. */
export function saleSheet(
  book: PriceBook,
  spec: LineSpec,
  cost: Exact,
  { margin, computed, linePrice }: Sale,
): Omit<LineCost, 'lines' | 'lineCost'> {
  const marginSet = byHand(spec, 'margin')
  const priceSet = byHand(spec, 'unitPrice')
  const resulting = resultingMargin(book, cost, moneyToExact(linePrice))
  return {
    contingency: decimalText(exact(book.contingency)),
    margin: decimalText(margin),
    marginOverridden: marginSet
      ? { computed: decimalText(exact(book.margin)), reason: marginSet.reason }
      : null,
    computedUnitPrice: computed,
    unitPriceOverridden: priceSet ? { computed: moneyToDecimal(computed), reason: priceSet.reason } : null,
    resultingMargin: decimalText(resulting),
    belowFloor: resulting.lt(book.floorMargin),
  }
}

function byHand(spec: LineSpec, item: OverridableItem): Override | undefined {
  return spec.overrides.find((one) => one.item === item)
}

/** A fraction of the total, rounded up to a whole unit of currency, not below the floor and never above the total. */
export function depositOf(book: PriceBook, total: Money): Money {
  const part = moneyToExact(total).times(book.deposit.fraction).ceil()
  const floor = exact(book.deposit.floor)
  const due = roundToMoney(part.lt(floor) ? floor : part, book.currency)
  return compare(due, total) > 0 ? money(total.amount, total.currency) : due
}
