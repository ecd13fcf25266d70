import { isDeepStrictEqual } from 'node:util'
import { describe, expect, it } from 'vitest'
import { catalogue } from '../../../seeds/reference/catalogue.ts'
import type { BaseInput } from '../../../shared/base/base-design.ts'
import { designBase } from '../../../shared/base/design-base.ts'
import { quickBase } from '../../../shared/base/quick-base.ts'
import { EU_FAMILIES } from '../../../shared/sections/catalogue.ts'
import { STOCK } from '../../support/base-input.ts'

const CASES: Omit<BaseInput, 'section' | 'stock'>[] = [
  { method: 'LRFD', required: { compression: 300_000, uplift: 0 }, concrete: { strength: 28 } },
  { method: 'ASD', required: { compression: 2_000_000, uplift: 300_000 }, concrete: { strength: 20 } },
  {
    required: { compression: 900_000, uplift: 0 },
    concrete: { strength: 28, pier: { length: 330, width: 280 } },
  },
  {
    required: { compression: 10_000, uplift: 0 },
    concrete: { strength: 28 },
    rods: { count: 2 },
    weight: 900,
  },
]

describe('a base on numbers alone', () => {
  it.each(CASES)('is the base in full, or none where that does not hold: %o', (given) => {
    const found = catalogue.sections
      .filter((_, index) => index % 3 === 0)
      .map((section) => {
        const standard = EU_FAMILIES.includes(section.family) ? 'EN 1993-1-1' : 'AISC 360-22'
        const input: BaseInput = { ...given, standard, section, stock: STOCK }
        const { verdict, plate, rods, welds, holes } = designBase(input)
        const full = verdict === 'holds' ? { plate, rods, hole: holes.diameter, leg: welds.leg } : undefined
        return { name: section.designation, full, quick: quickBase(input) }
      })
    expect(found.filter(({ full, quick }) => !isDeepStrictEqual(full, quick))).toEqual([])
    expect(found.some(({ full }) => full !== undefined)).toBe(true)
  })
})
