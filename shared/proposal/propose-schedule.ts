import type { Money } from '../pricing/money.ts'
import type { PriceBook } from '../pricing/price-book.ts'
import type { Catalogue } from '../sections/catalogue.ts'
import { scaleSolution, solveColumn, type ColumnSolution } from '../stability/column-lengths.ts'
import type { Column } from '../stability/column.ts'
import { prepareColumn, type PreparedColumn } from '../standards/prepare-column.ts'
import { Refusal } from '../units/refusal.ts'
import { familiesFor, limitsBroken, screenStock, stockOf, type Stocked } from './candidates.ts'
import type { LineAsked } from './line-asked.ts'
import { nothingFits } from './nothing-fits.ts'
import { cheapest } from './price-candidates.ts'

export interface ScheduleLine {
  asked: LineAsked
  delivery: { km: number } | null
}

export interface ScheduleRow {
  mark: string
  offered: { section: string; utilisation: number; unitPrice: Money; linePrice: Money } | null
  reason: string | null
}

/**
 * The cheapest shape of each line of a schedule, on numbers alone. What lines have in common, a geometry with its loads
 * or a list of shapes in one steel, is worked out once. A line that cannot be taken says why, and stops no other.
 */
export function scheduler(catalogue: Catalogue, book: PriceBook): (line: ScheduleLine) => ScheduleRow {
  const solve = solver()
  const stocks = remembered((key: { families: ReturnType<typeof familiesFor>; grade: LineAsked['grade'] }) =>
    stockOf(catalogue.ofFamilies(key.families), key.grade),
  )
  return ({ asked, delivery }) => {
    const { mark } = asked
    try {
      const stock = stocks({ families: familiesFor(asked, book), grade: asked.grade })
      return rowOf(asked, prepareColumn(asked, solve), stock, { book, delivery })
    } catch (error) {
      if (!(error instanceof Refusal)) throw error
      return { mark, offered: null, reason: error.message }
    }
  }
}

function rowOf(
  asked: LineAsked,
  prepared: PreparedColumn,
  stock: readonly Stocked[],
  terms: { book: PriceBook; delivery: { km: number } | null },
): ScheduleRow {
  const { mark } = asked
  const screened = screenStock(prepared, stock)
  const holding = screened.filter((candidate) => limitsBroken(candidate, asked.limits).length === 0)
  const [best] = cheapest(asked, holding, terms, 1)
  if (!best) return { mark, offered: null, reason: nothingFits(asked, screened, holding, terms.book).reason }
  const { unitPrice, linePrice } = best.price
  const { utilisation } = best.screening
  return {
    mark,
    offered: { section: best.section.designation, utilisation, unitPrice, linePrice },
    reason: null,
  }
}

/** Lengths of columns of one form, whatever their height, solved once. */
function solver(): (column: Column) => ColumnSolution {
  const known = new Map<string, { height: number; solution: ColumnSolution }>()
  return (column) => {
    const { height, ends, braces, endFixity } = column
    const form = braces.map((brace) => ({ ...brace, height: brace.height / height }))
    const key = JSON.stringify([ends, form, endFixity])
    const before = known.get(key)
    if (before) return scaleSolution(before.solution, height / before.height)
    const solution = solveColumn(column)
    known.set(key, { height, solution })
    return solution
  }
}

/** The same answer for the same input, worked out once. */
function remembered<Input, Answer>(work: (input: Input) => Answer): (input: Input) => Answer {
  const known = new Map<string, Answer>()
  return (input) => {
    const key = JSON.stringify(input)
    const before = known.get(key)
    if (before !== undefined) return before
    const answer = work(input)
    known.set(key, answer)
    return answer
  }
}
