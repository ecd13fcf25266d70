import { catalogue } from '../../seeds/reference/catalogue.ts'
import { DEFAULT_PRICE_BOOK } from '../../seeds/reference/price-book.ts'
import type { BaseInput } from '../../shared/base/base-design.ts'
import type { Section } from '../../shared/sections/section.ts'

export function sectionCalled(designation: string): Section {
  const section = catalogue.find(designation)
  if (!section) throw new Error(`${designation} is not in the catalogue`)
  return section
}

/** Plates and rods of the default price book. */
export const STOCK: BaseInput['stock'] = {
  thicknesses: DEFAULT_PRICE_BOOK.plate.thicknesses,
  rodDiameters: DEFAULT_PRICE_BOOK.rods.prices.map(({ diameter }) => diameter),
}

/** A base of which everything is to be found: 900 kN on concrete of 28 MPa. */
export function baseInput(designation: string, change: Partial<BaseInput> = {}): BaseInput {
  return {
    method: 'LRFD',
    section: sectionCalled(designation),
    required: { compression: 900_000, uplift: 0 },
    concrete: { strength: 28 },
    stock: STOCK,
    ...change,
  }
}
