import type { BaseDesign } from '../base/base-design.ts'
import { steelFor } from '../materials/steel-for.ts'
import type { LineSpec } from '../pricing/line-spec.ts'
import type { PriceBook } from '../pricing/price-book.ts'
import type { Section } from '../sections/section.ts'
import { checkColumn, type ColumnCheck } from '../standards/check-column.ts'
import { demandOf, prepareColumn } from '../standards/prepare-column.ts'
import { baseOfLine } from './base-of-line.ts'
import type { LineAsked } from './line-asked.ts'

/**
 * A line as the estimator has it: its shape and steel checked for what was asked, at the height that is made, and its
 * base plate and rods as they are given. Refuses by field, as in the line's spec.
 */
export function workOutLine(
  asked: LineAsked,
  spec: LineSpec,
  section: Section,
  book: PriceBook,
): { check: ColumnCheck; base: BaseDesign | null } {
  const prepared = prepareColumn({ ...asked, height: spec.height })
  const check = checkColumn(prepared, section, steelFor(spec.grade, section))
  const { compression, uplift } = demandOf(prepared, section.mass)
  const { base: plate, rods } = spec
  if (!plate) return { check, base: null }
  const { length, width, thickness, holes } = plate
  const base = baseOfLine(
    { ...asked, height: spec.height },
    book,
    section,
    { compression, uplift },
    {
      plate: { length, width, thickness },
      rods: rods ?? (holes.count > 0 ? { count: holes.count } : undefined),
    },
  )
  return { check, base }
}
