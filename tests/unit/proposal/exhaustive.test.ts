import { describe, expect, it } from 'vitest'
import { catalogue } from '../../../seeds/reference/catalogue.ts'
import { DEFAULT_PRICE_BOOK as book } from '../../../seeds/reference/price-book.ts'
import { steelFor } from '../../../shared/materials/steel-for.ts'
import { priceCandidate } from '../../../shared/pricing/candidate.ts'
import { barPriceOf } from '../../../shared/pricing/price-book.ts'
import { baseOfLine } from '../../../shared/proposal/base-of-line.ts'
import type { LineAsked } from '../../../shared/proposal/line-asked.ts'
import { lineSpecOf } from '../../../shared/quoting/defaults.ts'
import { familiesOf } from '../../../shared/standards/families.ts'
import { prepareColumn } from '../../../shared/standards/prepare-column.ts'
import { screenColumn } from '../../../shared/standards/screen-column.ts'
import { Refusal } from '../../../shared/units/refusal.ts'
import { found, lineAsked, proposeLine } from '../../support/line-asked.ts'

interface Priced {
  name: string
  delivered: number
  mass: number
  plan: number
}

/** Every shape that holds and keeps the limits, its base designed with every step: nothing is left out to be quick. */
function exhaustive(asked: LineAsked, delivery: { km: number } | null): Priced[] {
  const prepared = prepareColumn(asked)
  const { limits, mark, quantity, height = 0, finish } = asked
  const families = limits.families ?? familiesOf(asked.standard ?? 'AISC 360-22')
  return catalogue.ofFamilies(families).flatMap((section): Priced[] => {
    if (!barPriceOf(book, section.family)) return []
    const steel = steelFor(asked.grade, section)
    try {
      const screening = screenColumn(prepared, section, steel)
      if (screening.utilisation > limits.maxUtilisation) return []
      if (screening.slenderness > (limits.maxSlenderness ?? Infinity)) return []
      if (section.depth > (limits.maxDepth ?? Infinity)) return []
      const base = asked.base.plate ? baseOfLine(asked, book, section, screening) : null
      if (base?.verdict === 'fails') return []
      const made = { mark, quantity, section, grade: steel.name, height, finish, base }
      const spec = lineSpecOf({ ...made, withRods: asked.base.rods, withCap: asked.cap.plate })
      const price = priceCandidate(book, section, spec, { delivery })
      const { designation: name, mass, depth, width } = section
      return price ? [{ name, delivered: price.delivered.amount, mass, plan: depth * width }] : []
    } catch (error) {
      if (error instanceof Refusal) return []
      throw error
    }
  })
}

const upliftOnPier: Partial<LineAsked> = {
  loads: { dead: 300_000, live: 300_000, wind: { pushes: 0, lifts: 500_000 } },
  base: { plate: true, rods: true, concrete: { strength: 20, pier: { length: 380, width: 330 } } },
}
const bare: Partial<LineAsked> = {
  limits: { maxUtilisation: 0.9, maxDepth: 260, maxSlenderness: 120, families: ['W', 'PIPE'] },
  base: { plate: false, rods: false, concrete: { strength: 28 } },
  cap: { plate: false },
  finish: 'none',
}
const stout: Partial<LineAsked> = {
  ...{ standard: 'EN 1993-1-1', method: undefined, quantity: 2, height: 2620, finish: 'paint' },
  loads: { dead: 41_600, live: 1_950_000 },
  limits: { maxUtilisation: 0.9, families: ['HEA', 'HEB', 'SHS', 'CHS', 'RHS'] },
  base: { plate: true, rods: true, concrete: { strength: 20 } },
}
const CASES: [string, Partial<LineAsked>, { km: number } | null][] = [
  ['a common column', {}, { km: 60 }],
  ['fifty slender ones by ASD', { method: 'ASD', height: 11_500, quantity: 50, finish: 'paint' }, { km: 5 }],
  ['uplift on a small pier', upliftOnPier, { km: 60 }],
  ['off its axis, galvanised', { offset: { strong: 80, weak: 0 }, finish: 'galvanise' }, { km: 200 }],
  ['no plates, within limits', bare, null],
  ['by EN', { standard: 'EN 1993-1-1', method: undefined, quantity: 2 }, { km: 60 }],
  ['where the slimmest shape has no base', stout, null],
]

describe('what is proposed is what designing and pricing every shape would give', () => {
  it.each(CASES)(
    '%s',
    (_name, change, delivery) => {
      const all = exhaustive(lineAsked(change), delivery).sort((a, b) => a.delivered - b.delivered)
      const { section, alternatives } = found(proposeLine(change, { delivery }))
      const price = (name: string) => all.find((one) => one.name === name)?.delivered ?? NaN
      const shown = alternatives.map((one) => price(one.section))
      expect(all.length).toBeGreaterThan(10)
      expect(price(section)).toBe(all[0]?.delivered)
      expect(shown).toEqual(shown.toSorted((a, b) => a - b))
      for (const { delivered } of all.slice(0, 6)) expect(shown).toContain(delivered)
      const because = (why: 'cheapest' | 'lightest' | 'slimmest') =>
        alternatives.find((one) => one.because.includes(why))
      expect(because('cheapest')?.section).toBe(section)
      expect(because('lightest')?.mass).toBe(Math.min(...all.map(({ mass }) => mass)))
      const slimmest = because('slimmest')
      expect((slimmest?.depth ?? 0) * (slimmest?.width ?? 0)).toBe(Math.min(...all.map(({ plan }) => plan)))
    },
    20_000,
  )
})
