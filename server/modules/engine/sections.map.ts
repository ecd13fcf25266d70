import type { AnswerOf } from '../../../shared/contracts/operations.ts'
import { barPriceOf, type PriceBook } from '../../../shared/pricing/price-book.ts'
import { outlineOf } from '../../../shared/sections/outline.ts'
import type { Section } from '../../../shared/sections/section.ts'

/** `offered`: the shop buys its family. */
export function toSectionSummary(
  section: Section,
  book: PriceBook,
): AnswerOf<'listSections'>['items'][number] {
  const { designation, designationSI, family, mass, depth, width } = section
  return {
    designation,
    designationSI,
    family,
    mass,
    depth,
    width,
    offered: barPriceOf(book, family) !== undefined,
  }
}

/** With every number of the table that it comes from. */
export function toSectionDetail(section: Section, book: PriceBook): AnswerOf<'readSection'> {
  const numbers = Object.entries(section).filter(([, value]) => typeof value === 'number')
  return {
    ...toSectionSummary(section, book),
    properties: Object.fromEntries(numbers) as Record<string, number>,
    outline: outlineOf(section),
  }
}
