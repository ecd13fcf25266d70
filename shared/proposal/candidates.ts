import { steelFor } from '../materials/steel-for.ts'
import type { Steel } from '../materials/steel.ts'
import { barPriceOf, type PriceBook } from '../pricing/price-book.ts'
import { US_FAMILIES } from '../sections/catalogue.ts'
import type { Family, Section } from '../sections/section.ts'
import type { PreparedColumn } from '../standards/prepare-column.ts'
import { familiesOf } from '../standards/families.ts'
import { screenColumn, type Screening } from '../standards/screen-column.ts'
import { Refusal } from '../units/refusal.ts'
import type { Limits, LineAsked } from './line-asked.ts'

export interface Candidate extends Stocked {
  screening: Screening
}

export type LimitName = 'depth' | 'width' | 'utilisation' | 'slenderness'

/** Families that are asked for, that the standard is for, and that the shop buys. */
export function familiesFor(
  { limits, standard = 'AISC 360-22' }: Pick<LineAsked, 'limits' | 'standard'>,
  book: PriceBook,
): Family[] {
  const known = familiesOf(standard)
  const asked = limits.families && limits.families.length > 0 ? limits.families : known
  return asked.filter((family) => known.includes(family) && barPriceOf(book, family))
}

/** A shape with the steel that it would be of. */
export interface Stocked {
  section: Section
  steel: Steel
}

/** Shapes of these families, each in the steel that was asked. Refuses a grade that none of them is made of. */
export function stockOf(sections: readonly Section[], grade: LineAsked['grade']): Stocked[] {
  const stock: Stocked[] = []
  // US steels are a family's, European ones depend on thickness.
  const usual = new Map<Family, Steel>()
  // A steel that one shape of a family is not made of, none of it is.
  const faults = new Map<Family, Refusal>()
  for (const section of sections) {
    if (faults.has(section.family)) continue
    try {
      const steel = usual.get(section.family) ?? steelFor(grade, section)
      if (US_FAMILIES.includes(section.family)) usual.set(section.family, steel)
      stock.push({ section, steel })
    } catch (error) {
      if (!(error instanceof Refusal)) throw error
      if (error.issues.some(({ path }) => path.startsWith('grade'))) faults.set(section.family, error)
    }
  }
  const [fault] = faults.values()
  if (stock.length === 0 && fault) throw fault
  return stock
}

/** Every one of these on numbers alone, but those that a standard has no strength for. */
export function screenStock(prepared: PreparedColumn, stock: readonly Stocked[]): Candidate[] {
  const candidates: Candidate[] = []
  for (const { section, steel } of stock) {
    const screening = screeningOf(prepared, section, steel)
    if (screening) candidates.push({ section, steel, screening })
  }
  return candidates
}

/** Undefined where the clauses refuse the shape: too slender for them, or without a buckling curve. */
function screeningOf(prepared: PreparedColumn, section: Section, steel: Steel): Screening | undefined {
  try {
    return screenColumn(prepared, section, steel)
  } catch (error) {
    if (error instanceof Refusal && error.issues.every(({ path }) => path === 'section')) return undefined
    throw error
  }
}

/** The limits that a shape does not keep. */
export function limitsBroken({ section, screening }: Candidate, limits: Limits): LimitName[] {
  const broken: LimitName[] = []
  if (section.depth > (limits.maxDepth ?? Infinity)) broken.push('depth')
  if (section.width > (limits.maxWidth ?? Infinity)) broken.push('width')
  if (screening.utilisation > limits.maxUtilisation) broken.push('utilisation')
  if (screening.slenderness > (limits.maxSlenderness ?? Infinity)) broken.push('slenderness')
  return broken
}
