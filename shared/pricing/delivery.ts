import { exact, settled, sum, ZERO, type Exact } from './exact.ts'
import { money, roundToMoney, type Money } from './money.ts'
import type { PriceBook } from './price-book.ts'
import { marked } from './selling.ts'
import type { LineWithTakeOff } from './steel-cost.ts'
import { size } from './take-off.ts'

/**
 * Truckloads: the mass by the payload, and never fewer than there are pieces too heavy to share a truck (more than
 * half a payload each). A piece over the payload or the longest length is for the caller to warn of.
 */
export function truckloads(book: PriceBook, lines: readonly LineWithTakeOff[]): number {
  const payload = exact(book.delivery.payload)
  const mass = sum(lines.map(({ piece, spec }) => piece.pieceMass.times(spec.quantity)))
  const alone = lines
    .filter(({ piece }) => piece.pieceMass.times(2).gt(payload))
    .reduce((count, { spec }) => count + spec.quantity, 0)
  return Math.max(1, alone, mass.div(payload).ceil().toNumber())
}

/** Zone base and kilometres for each truck, currency units. */
function deliveryCost(book: PriceBook, km: number, trucks: number): Exact {
  return exact(book.delivery.perKm).times(km).plus(book.delivery.base).times(trucks)
}

/** `terms` null: the customer collects, and nothing is charged. */
export function priceDelivery(
  book: PriceBook,
  lines: readonly LineWithTakeOff[],
  terms: { km: number } | null,
): { km: number; trucks: number; price: Money; cost: Exact } {
  if (!terms) return { km: 0, trucks: 0, price: money(0, book.currency), cost: ZERO }
  const trucks = truckloads(book, lines)
  const cost = settled(deliveryCost(book, terms.km, trucks))
  const price = roundToMoney(marked(book, cost, exact(book.margin)), book.currency)
  return { km: terms.km, trucks, price, cost }
}

export function deliveryWarnings(book: PriceBook, lines: readonly LineWithTakeOff[]): string[] {
  const { payload, longestPiece } = book.delivery
  return lines.flatMap(({ spec, piece }) => {
    const warnings: string[] = []
    if (spec.height > longestPiece) {
      warnings.push(
        `${spec.mark} is ${size(spec.height)} mm long, a truck takes ${size(longestPiece)} mm: agree its transport apart`,
      )
    }
    if (piece.pieceMass.gt(payload)) {
      warnings.push(
        `${spec.mark} weighs ${piece.pieceMass.toFixed(0)} kg, a truck carries ${payload} kg: agree its transport apart`,
      )
    }
    return warnings
  })
}
