import { exact, share, sum, ZERO } from './exact.ts'
import type { ExactCostLine } from './cost-lines.ts'
import type { PriceBook } from './price-book.ts'

/**
 * Finishing has a least charge for each order. What the finish of all lines falls short of it is charged as a cost
 * line of its own in each finished line, shared by what their finish costs, so that cost lines still add up.
 */
export function addFinishMinimum(book: PriceBook, lines: readonly ExactCostLine[][]): ExactCostLine[][] {
  const finishes = lines.map((costs) => costs.find(({ key }) => key === 'finish')?.cost ?? ZERO)
  const finished = finishes.flatMap((cost, index) => (cost.isZero() ? [] : [index]))
  const minimum = exact(book.finish.minimumPerOrder)
  const short = minimum.minus(sum(finishes))
  if (finished.length === 0 || short.lte(0)) return [...lines]
  const shares = share(
    short,
    finished.map((index) => finishes[index] ?? ZERO),
  )
  return lines.map((costs, index) => {
    const cost = shares[finished.indexOf(index)]
    if (!cost) return costs
    const place = costs.findIndex(({ key }) => key === 'finish') + 1
    const row: ExactCostLine = {
      key: 'finishMinimum',
      label: () => 'Finish, least charge of the order',
      quantity: exact(1),
      unit: 'share',
      rate: cost,
      rateUnit: 'share',
      cost,
      basis: () => `share of what the order's finishing falls short of ${minimum.toFixed(2)}, by finish cost`,
      overridden: null,
    }
    return [...costs.slice(0, place), row, ...costs.slice(place)]
  })
}
