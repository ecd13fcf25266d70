import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { catalogue } from '../../../seeds/reference/catalogue.ts'
import { steelFor } from '../../../shared/materials/steel-for.ts'
import { EU_FAMILIES, US_FAMILIES } from '../../../shared/sections/catalogue.ts'
import type { Section } from '../../../shared/sections/section.ts'
import type { Brace, Ends } from '../../../shared/stability/column.ts'
import { checkColumn } from '../../../shared/standards/check-column.ts'
import type { ColumnRequest } from '../../../shared/standards/column-request.ts'
import { prepareColumn } from '../../../shared/standards/prepare-column.ts'
import { screenColumn } from '../../../shared/standards/screen-column.ts'
import { Refusal } from '../../../shared/units/refusal.ts'

/* What must hold for any column, whatever the numbers. */

const us = catalogue.ofFamilies(US_FAMILIES)
const eu = catalogue.ofFamilies(EU_FAMILIES)
const ENDS: fc.Arbitrary<Ends> = fc.constantFrom<Ends>(
  { bottom: 'pinned', top: 'pinned' },
  { bottom: 'fixed', top: 'pinned' },
  { bottom: 'fixed', top: 'fixed' },
  { bottom: 'fixed', top: 'free' },
)
const newtons = fc.integer({ min: 1000, max: 5_000_000 })
const request = fc.record({
  height: fc.integer({ min: 2000, max: 12_000 }),
  ends: fc.record({ strong: ENDS, weak: ENDS }),
  loads: fc.record({
    dead: newtons,
    live: newtons,
    wind: fc.record({ pushes: newtons, lifts: newtons }),
  }),
  method: fc.constantFrom('LRFD' as const, 'ASD' as const),
})
const section = (sections: readonly Section[]) => fc.constantFrom(...sections)

/** Undefined where a clause refuses the shape. */
function capacity(asked: ColumnRequest, one: Section) {
  try {
    return screenColumn(prepareColumn(asked), one, steelFor(undefined, one))
  } catch (error) {
    if (error instanceof Refusal) return undefined
    throw error
  }
}

const brace = (height: number, part: number): Brace => ({
  height: Math.round(height * part),
  holds: 'both',
  stopsTwist: true,
})

describe('any column', () => {
  it('never carries more for being taller', () => {
    fc.assert(
      fc.property(request, section(us), (asked, one) => {
        const [now, taller] = [capacity(asked, one), capacity({ ...asked, height: asked.height + 250 }, one)]
        if (now && taller) expect(taller.capacity).toBeLessThanOrEqual(now.capacity * (1 + 1e-9))
      }),
      { numRuns: 150 },
    )
  })

  it('never works less hard under more load', () => {
    fc.assert(
      fc.property(request, section(us), (asked, one) => {
        const more = { ...asked, loads: { ...asked.loads, live: asked.loads.live * 1.1 } }
        const [now, then] = [capacity(asked, one), capacity(more, one)]
        if (now && then) expect(then.utilisation).toBeGreaterThanOrEqual(now.utilisation * (1 - 1e-9))
      }),
      { numRuns: 150 },
    )
  })

  it('never carries less for a brace at mid-height of a pinned column, nor more for one taken away', () => {
    const pinned = { bottom: 'pinned', top: 'pinned' } as const
    fc.assert(
      fc.property(
        request,
        section(us),
        fc.double({ min: 0.2, max: 0.8, noNaN: true }),
        (asked, one, part) => {
          const bare = { ...asked, ends: { strong: pinned, weak: pinned } }
          const [now, braced] = [
            capacity(bare, one),
            capacity({ ...bare, braces: [brace(asked.height, part)] }, one),
          ]
          if (now && braced) expect(braced.capacity).toBeGreaterThanOrEqual(now.capacity * (1 - 1e-9))
        },
      ),
      { numRuns: 150 },
    )
  })

  it('has ASD and LRFD in the ratio of their factors: 0.9 × 1.67', () => {
    fc.assert(
      fc.property(request, section(us), (asked, one) => {
        const [lrfd, asd] = [
          capacity({ ...asked, method: 'LRFD' }, one),
          capacity({ ...asked, method: 'ASD' }, one),
        ]
        if (lrfd && asd) expect(lrfd.capacity / asd.capacity).toBeCloseTo(0.9 * 1.67, 9)
      }),
      { numRuns: 100 },
    )
  })

  it('is screened and checked to the same number, and nothing in the answer is NaN or infinite', () => {
    const offset = fc.integer({ min: 0, max: 400 })
    fc.assert(
      fc.property(request, offset, offset, section(us), (asked, strong, weak, one) => {
        const bent = { ...asked, offset: { strong, weak } }
        const quick = capacity(bent, one)
        if (!quick) return
        const full = checkColumn(prepareColumn(bent), one, steelFor(undefined, one))
        expect(full.utilisation).toBe(quick.utilisation)
        expect(full.values.available).toBe(quick.capacity)
        // JSON has neither: they would come back as null.
        expect(JSON.stringify(full)).not.toContain('null,"segments"')
        expect(allNumbers(full).every(Number.isFinite)).toBe(true)
      }),
      { numRuns: 120 },
    )
  })

  it('by EN 1993-1-1 likewise', () => {
    fc.assert(
      fc.property(request, section(eu), (asked, one) => {
        const european: ColumnRequest = { ...asked, standard: 'EN 1993-1-1', method: undefined }
        const [now, taller] = [
          capacity(european, one),
          capacity({ ...european, height: asked.height + 250 }, one),
        ]
        if (!now || !taller) return
        expect(taller.capacity).toBeLessThanOrEqual(now.capacity * (1 + 1e-9))
        const full = checkColumn(prepareColumn(european), one, steelFor(undefined, one))
        expect(full.utilisation).toBe(now.utilisation)
        expect(allNumbers(full).every(Number.isFinite)).toBe(true)
      }),
      { numRuns: 120 },
    )
  })
})

function allNumbers(value: unknown): number[] {
  if (typeof value === 'number') return [value]
  if (value === null || typeof value !== 'object') return []
  return Object.values(value).flatMap(allNumbers)
}

describe('what cannot be taken', () => {
  const pinned = { bottom: 'pinned', top: 'pinned' } as const
  const good: ColumnRequest = { height: 4000, ends: { strong: pinned, weak: pinned }, loads: { dead: 1000 } }
  it.each([
    ['height', { ...good, height: 0 }],
    ['height', { ...good, height: 31_000 }],
    ['height', { ...good, height: NaN }],
    ['braces.0.height', { ...good, braces: [{ height: 20, holds: 'weak', stopsTwist: true }] }],
    ['ends.strong', { ...good, ends: { strong: { bottom: 'free', top: 'free' }, weak: pinned } }],
    ['loads', { ...good, loads: { dead: 0 } }],
    ['loads.dead', { ...good, loads: { dead: Infinity } }],
    ['loads.wind.pushes', { ...good, loads: { dead: 1, wind: { pushes: -1 } } }],
    ['required', { ...good, required: { axial: 1 } }],
    ['required.axial', { ...good, loads: undefined, required: { axial: 0 } }],
    ['offset.strong', { ...good, offset: { strong: 5000 } }],
    ['lengths.weak', { loads: good.loads, lengths: { strong: 1, weak: -1, torsion: 1 } }],
    ['combinations', { ...good, combinations: 'EN 1990 6.10' }],
    ['offset.strong', { ...good, standard: 'EN 1993-1-1', offset: { strong: 10 } }],
    ['loads.rain', { ...good, standard: 'EN 1993-1-1', loads: { dead: 1, rain: 1 } }],
  ] satisfies [string, ColumnRequest][])('is refused at %s', (path, asked) => {
    try {
      prepareColumn(asked)
    } catch (error) {
      if (!(error instanceof Refusal)) throw error
      const paths = error.issues.map((issue) => issue.path)
      expect(paths.some((one) => one.startsWith(path))).toBe(true)
      return
    }
    throw new Error('it was taken')
  })
})
