import type { Money } from '../pricing/money.ts'
import type { PriceBook } from '../pricing/price-book.ts'
import type { Catalogue } from '../sections/catalogue.ts'
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
  const prepared = remembered(prepareColumn)
  const stocks = remembered((key: { families: ReturnType<typeof familiesFor>; grade: LineAsked['grade'] }) =>
    stockOf(catalogue.ofFamilies(key.families), key.grade),
  )
  return ({ asked, delivery }) => {
    const { mark } = asked
    try {
      const { limits: _, finish: __, base: ___, cap: ____, mark: _____, quantity: ______, ...column } = asked
      const stock = stocks({ families: familiesFor(asked, book), grade: asked.grade })
      return rowOf(asked, prepared(column), stock, { book, delivery })
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
