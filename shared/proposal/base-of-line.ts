import type { BaseDesign, BaseInput } from '../base/base-design.ts'
import { designBase } from '../base/design-base.ts'
import type { PriceBook } from '../pricing/price-book.ts'
import type { Section } from '../sections/section.ts'
import { selfWeight } from '../standards/asce7/self-weight.ts'
import type { Method } from '../standards/aisc360/resistance.ts'
import type { LineAsked } from './line-asked.ts'

/** What the foot of a column passes on, N. */
export interface FootLoads {
  compression: number
  uplift: number
}

type Given = Pick<BaseInput, 'plate' | 'rods'>

/** What a base of this line must do; what is given of it is checked, the rest found from what the shop stocks. */
export function baseInput(
  asked: Pick<LineAsked, 'base' | 'standard' | 'method' | 'height'>,
  book: PriceBook,
  section: Section,
  { compression, uplift }: FootLoads,
  given: Given = {},
): BaseInput {
  const method: Method = asked.method ?? 'LRFD'
  return {
    standard: asked.standard,
    method,
    section,
    required: { compression, uplift },
    concrete: asked.base.concrete,
    stock: {
      thicknesses: book.plate.thicknesses,
      rodDiameters: book.rods.prices.map(({ diameter }) => diameter),
    },
    weight: selfWeight(section.mass, asked.height ?? 0),
    ...given,
  }
}

/** The base of a line, designed in full. */
export function baseOfLine(...of: Parameters<typeof baseInput>): BaseDesign {
  return designBase(baseInput(...of))
}
