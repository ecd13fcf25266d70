import { barPriceOf, type PriceBook } from '../pricing/price-book.ts'
import type { Section } from '../sections/section.ts'
import type { LineAsked } from './line-asked.ts'

/** Both plates together are never thicker, mm: what the shaft loses to them at the most. */
const THICKEST_PLATES = 150

/**
 * What a line of this shape costs delivered at the least, in units of currency: the shaft's steel and finish, drawing,
 * fitting, and one truck, as sold. Every term stands in the price with at least this much, so no price is below it.
 */
export function leastPrice(
  { book, delivery }: { book: PriceBook; delivery: { km: number } | null },
  asked: LineAsked,
  section: Section,
): number {
  const length = Math.max(0, (asked.height ?? 0) - THICKEST_PLATES) / 1000
  const piece =
    length * section.mass * Number(barPriceOf(book, section.family)?.pricePerKg ?? 0) +
    leastFinish(book, asked, section, length) +
    leastFitting(book, asked)
  const cost = piece * asked.quantity + Number(book.drawingPerMark)
  const carried = delivery ? Number(book.delivery.base) + Number(book.delivery.perKm) * delivery.km : 0
  return ((cost + carried) * (1 + Number(book.contingency))) / (1 - Number(book.margin))
}

function leastFinish(book: PriceBook, { finish }: LineAsked, section: Section, length: number): number {
  if (finish === 'none') return 0
  const { per, rate } = book.finish.rates[finish]
  const measure = per === 'kg' ? section.mass : section.perimeter / 1000
  return Number(rate) * measure * length
}

function leastFitting({ minutes, shopRatePerHour }: PriceBook, { base, cap }: LineAsked): number {
  const plates = Number(base.plate) + Number(cap.plate)
  const { perPiece, perPlate } = minutes.fitting
  return ((Number(perPiece) + plates * Number(perPlate)) / 60) * Number(shopRatePerHour)
}
