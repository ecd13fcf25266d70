import { exact, type Exact } from './exact.ts'
import { barPriceOf, rodPriceOf, type PriceBook } from './price-book.ts'
import type { PricedLine, SteelPlan } from './priced-quote.ts'
import type { LineWithTakeOff } from './steel-cost.ts'
import { size } from './take-off.ts'

/** What an estimator must look at before the price is given: each in words. */
export function priceWarnings(
  book: PriceBook,
  lines: readonly LineWithTakeOff[],
  priced: readonly PricedLine[],
  plans: readonly SteelPlan[],
  margin: Exact,
): string[] {
  const floor = percent(exact(book.floorMargin))
  const warnings: string[] = []
  if (margin.lt(book.floorMargin)) {
    warnings.push(`the whole quote earns ${percent(margin)}, below the floor of ${floor}`)
  }
  for (const { mark, cost } of priced) {
    if (cost.belowFloor) {
      warnings.push(`${mark} earns ${percent(exact(cost.resultingMargin))}, below the floor of ${floor}`)
    }
  }
  for (const { section, nest } of plans) {
    for (const { length, quantity, reason } of nest.unplaced) {
      warnings.push(`${section}: ${quantity} of ${size(length)} mm are charged by mass only; ${reason}`)
    }
  }
  return [...warnings, ...lines.flatMap((line) => bookWarnings(book, line))]
}

/** Where the book has no price of its own and the nearest one stands in. */
function bookWarnings(book: PriceBook, { spec, section }: LineWithTakeOff): string[] {
  const warnings: string[] = []
  const bar = barPriceOf(book, section.family)
  if (bar && !bar.grades.includes(spec.grade)) {
    warnings.push(`${spec.mark}: no bar price for ${spec.grade}; priced as ${bar.grades.join(' or ')}`)
  }
  for (const plate of [spec.base, spec.cap]) {
    if (plate && !book.plate.thicknesses.some((t) => Math.abs(t - plate.thickness) < 0.05)) {
      warnings.push(`${spec.mark}: plate of ${size(plate.thickness)} mm is not a stocked thickness`)
    }
  }
  if (spec.rods) {
    const rod = rodPriceOf(book, spec.rods.diameter)
    if (rod && Math.abs(rod.diameter - spec.rods.diameter) > 0.1) {
      warnings.push(
        `${spec.mark}: rods of ${size(spec.rods.diameter)} mm are priced as ${size(rod.diameter)} mm`,
      )
    }
    if (!book.rods.grades.includes(spec.rods.grade)) {
      warnings.push(
        `${spec.mark}: no rod price for ${spec.rods.grade}; priced as ${book.rods.grades.join(' or ')}`,
      )
    }
  }
  return warnings
}

function percent(fraction: Exact): string {
  return `${fraction.times(100).toDecimalPlaces(1).toFixed()} %`
}
