import { readable, type ExactCostLine } from './cost-lines.ts'
import { costWork } from './cost-work.ts'
import { deliveryWarnings, priceDelivery } from './delivery.ts'
import { decimalText, exact, sum, type Exact } from './exact.ts'
import { add, money, moneyToExact, roundToMoney, type Money } from './money.ts'
import type { Nest } from './nesting.ts'
import { nestGreedy } from './nesting-greedy.ts'
import type { PriceBook } from './price-book.ts'
import type { LineToPrice, PricedLine, PricedQuote, RackBar } from './priced-quote.ts'
import { depositOf, resultingMargin, saleSheet, sellLine } from './selling.ts'
import type { LineWithTakeOff } from './steel-cost.ts'
import { validatePricing, type Terms } from './validate-pricing.ts'
import { priceWarnings } from './warnings.ts'

export interface QuoteToPrice extends Terms {
  book: PriceBook
  lines: readonly LineToPrice[]
  /** Remnants in the shop, to be cut from before bars are bought where that is cheaper. */
  rack?: readonly RackBar[]
  /** How bars are cut; the rule of thumb unless a solver's answers are at hand. */
  nest?: Nest
}

/**
 * The price of a quote. Costs are exact decimals; money is rounded half up to the minor unit at the unit price, at
 * the discount off it, at the delivery price and at the tax. `delivery` null: collected by the customer. Refuses
 * with every field that has no price.
 */
export function priceQuote(quote: QuoteToPrice): PricedQuote {
  const { book, delivery, discount, tax, rack = [], nest = nestGreedy } = quote
  validatePricing(book, quote.lines, { delivery, tax, discount })
  const { lines, sheets, plans } = costWork(book, quote.lines, rack, nest)
  const priced = lines.map((line, index) => priceLine(book, line, sheets[index] ?? [], exact(discount)))
  const carried = priceDelivery(book, lines, delivery)
  const subtotal = add(money(0, book.currency), ...priced.map(({ linePrice }) => linePrice))
  const beforeTax = add(subtotal, carried.price)
  const taxed = tax.exempt ? money(0, book.currency) : taxOn(beforeTax, tax.rate)
  const total = add(beforeTax, taxed)
  const costs = sum([...priced.map(({ cost }) => exact(cost.lineCost)), carried.cost])
  const margin = resultingMargin(book, costs, moneyToExact(beforeTax))
  return {
    lines: priced,
    delivery: { ...carried, cost: decimalText(carried.cost) },
    subtotal,
    tax: { rate: decimalText(exact(tax.rate)), exempt: tax.exempt, amount: taxed },
    total,
    deposit: depositOf(book, total),
    mass: sum(lines.map(({ piece, spec }) => piece.pieceMass.times(spec.quantity))).toNumber(),
    priceBookVersion: book.version,
    resultingMargin: decimalText(margin),
    warnings: [
      ...priceWarnings(book, lines, priced, plans, margin),
      ...(delivery ? deliveryWarnings(book, lines) : []),
    ],
    steel: plans,
  }
}

function priceLine(
  book: PriceBook,
  { spec, section, piece }: LineWithTakeOff,
  costs: readonly ExactCostLine[],
  discount: Exact,
): PricedLine {
  const lineCost = sum(costs.map(({ cost }) => cost))
  const sale = sellLine(book, spec, lineCost, discount)
  return {
    mark: spec.mark,
    quantity: spec.quantity,
    section: section.designation,
    pieceMass: piece.pieceMass.toNumber(),
    unitPrice: sale.unitPrice,
    linePrice: sale.linePrice,
    cost: {
      lines: costs.map(readable),
      lineCost: decimalText(lineCost),
      ...saleSheet(book, spec, lineCost, sale),
    },
  }
}

function taxOn(amount: Money, rate: string): Money {
  return roundToMoney(moneyToExact(amount).times(rate), amount.currency)
}
