import { costLines, type ExactCostLine } from './cost-lines.ts'
import { addFinishMinimum } from './finish-minimum.ts'
import type { Nest } from './nesting.ts'
import type { PriceBook } from './price-book.ts'
import type { LineToPrice, RackBar, SteelPlan } from './priced-quote.ts'
import { shareSteel, steelJobs, type LineWithTakeOff } from './steel-cost.ts'
import { takeOff } from './take-off.ts'

/** Lines with their quantities: the common start of pricing and of what a solver is to cut. */
export function measured(lines: readonly LineToPrice[]): LineWithTakeOff[] {
  return lines.map((line) => ({ ...line, piece: takeOff(line.section, line.spec) }))
}

/** What the work of a quote costs: a sheet of cost lines for each line, and the bars that they are cut from. */
export function costWork(
  book: PriceBook,
  toPrice: readonly LineToPrice[],
  rack: readonly RackBar[],
  nest: Nest,
): { lines: LineWithTakeOff[]; sheets: ExactCostLine[][]; plans: SteelPlan[] } {
  const lines = measured(toPrice)
  const { shares, plans } = shareSteel(book, lines, steelJobs(book, lines, rack), nest)
  const sheets = lines.flatMap((line, index) => {
    const steel = shares[index]
    return steel ? [costLines(book, line, steel)] : []
  })
  return { lines, sheets: addFinishMinimum(book, sheets), plans }
}
