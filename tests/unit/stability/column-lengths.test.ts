import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { columnLengths } from '../../../shared/stability/column-lengths.ts'
import type { Column, EndCondition, Ends } from '../../../shared/stability/column.ts'
import { solveLength } from '../../../shared/stability/effective-length.ts'
import { governedNote } from '../../../shared/stability/governed-note.ts'

const PINNED: Ends = { bottom: 'pinned', top: 'pinned' }
const HEIGHT = 6000

/** Brace heights at least 60 mm from the ends and each other, from cuts of the height. */
const braceHeights = fc
  .uniqueArray(fc.integer({ min: 1, max: 99 }), { maxLength: 6 })
  .map((cuts) => cuts.sort((a, b) => a - b).map((cut) => (cut * HEIGHT) / 100))
const fixity = fc.constantFrom('recommended' as const, 'theoretical' as const)
const held = fc.constantFrom<EndCondition>('pinned', 'fixed')

describe('the length that counts', () => {
  it('is never less than either method gives', () => {
    const tops = fc.constantFrom<EndCondition>('pinned', 'fixed', 'guided', 'free')
    fc.assert(
      fc.property(held, tops, braceHeights, fixity, (bottom, top, braces, endFixity) => {
        fc.pre(bottom === 'fixed' || top !== 'free' || braces.length > 0)
        const found = solveLength({ height: HEIGHT, ends: { bottom, top }, braceHeights: braces, endFixity })
        expect(found.used).toBeGreaterThanOrEqual(found.segment)
        expect(found.used).toBeGreaterThanOrEqual(found.eigenvalue)
        expect(found.used).toBe(Math.max(found.segment, found.eigenvalue))
      }),
    )
  })

  it('is that of the segments wherever no end is free', () => {
    const tops = fc.constantFrom<EndCondition>('pinned', 'fixed', 'guided')
    fc.assert(
      fc.property(held, tops, braceHeights, fixity, (bottom, top, braces, endFixity) => {
        const found = solveLength({ height: HEIGHT, ends: { bottom, top }, braceHeights: braces, endFixity })
        expect(found.governedBy).toBe('segment')
        expect(found.eigenvalue).toBeLessThanOrEqual(found.segment * (1 + 1e-6))
      }),
      { numRuns: 300 },
    )
  })

  it('is never raised by one brace more between pins', () => {
    fc.assert(
      fc.property(braceHeights, fc.integer({ min: 1, max: 99 }), (braces, cut) => {
        const input = { height: HEIGHT, ends: PINNED, endFixity: 'recommended' as const }
        const before = solveLength({ ...input, braceHeights: braces })
        const after = solveLength({ ...input, braceHeights: [...new Set([...braces, (cut * HEIGHT) / 100])] })
        expect(after.used).toBeLessThanOrEqual(before.used * (1 + 1e-9))
      }),
    )
  })

  // Rayleigh: a restraint more cannot lower an eigenvalue. The mesh moves with the brace, hence 0.1 %.
  it('by eigenvalue is never raised by one brace more, whatever the ends', () => {
    const ends = fc.constantFrom<EndCondition>('pinned', 'fixed', 'guided', 'free')
    fc.assert(
      fc.property(ends, braceHeights, fc.integer({ min: 1, max: 99 }), (top, braces, cut) => {
        const input = {
          height: HEIGHT,
          ends: { bottom: 'fixed' as const, top },
          endFixity: 'theoretical' as const,
        }
        const before = solveLength({ ...input, braceHeights: braces })
        const after = solveLength({ ...input, braceHeights: [...new Set([...braces, (cut * HEIGHT) / 100])] })
        expect(after.eigenvalue).toBeLessThanOrEqual(before.eigenvalue * 1.001)
      }),
    )
  })

  it('turned upside down is the same', () => {
    fc.assert(
      fc.property(
        held,
        fc.constantFrom<EndCondition>('pinned', 'fixed', 'guided'),
        braceHeights,
        (bottom, top, braces) => {
          const input = { height: HEIGHT, endFixity: 'recommended' as const }
          const upright = solveLength({ ...input, ends: { bottom, top }, braceHeights: braces })
          const turned = solveLength({
            ...input,
            ends: { bottom: top, top: bottom },
            braceHeights: braces.map((height) => HEIGHT - height),
          })
          expect(turned.used / upright.used).toBeCloseTo(1, 9)
          expect(turned.eigenvalue / upright.eigenvalue).toBeCloseTo(1, 6)
        },
      ),
    )
  })
})

describe('a buckled form', () => {
  it('has at least 21 points with every brace among them, peaks at 1 and stands still where held', () => {
    fc.assert(
      fc.property(braceHeights, (braces) => {
        const { shape } = solveLength({
          height: HEIGHT,
          ends: PINNED,
          braceHeights: braces,
          endFixity: 'recommended',
        })
        expect(shape.length).toBeGreaterThanOrEqual(21)
        expect(Math.max(...shape.map(([, deflection]) => deflection))).toBeCloseTo(1, 12)
        for (const at of [0, ...braces, HEIGHT]) {
          const point = shape.find(([height]) => height === at)
          expect(point, String(at)).toBeDefined()
          expect(Math.abs(point?.[1] ?? NaN)).toBeLessThan(1e-9)
        }
      }),
    )
  })
})

const freeTop: Column = {
  height: 4500,
  ends: { strong: PINNED, weak: { bottom: 'pinned', top: 'free' } },
  braces: [{ height: 3000, holds: 'weak', stopsTwist: true }],
  endFixity: 'recommended',
}

describe('a column', () => {
  it('has each axis by its own braces, and a free part above the top brace without a K of its own', () => {
    const { strong, weak } = columnLengths(freeTop, 2e13, 5e12)
    expect(strong.segments).toEqual([{ from: 0, to: 4500, k: 1, kl: 4500 }])
    expect(weak.segments).toEqual([
      { from: 0, to: 3000, k: 1, kl: 3000 },
      { from: 3000, to: 4500, k: null, kl: null },
    ])
    expect(weak.governedBy).toBe('eigenvalue')
    expect(weak.used).toBeGreaterThan(5000)
  })

  it('has critical loads that follow EI, and lengths that do not', () => {
    const one = columnLengths(freeTop, 2e13, 5e12)
    const twice = columnLengths(freeTop, 4e13, 1e13)
    expect(twice.weak.criticalLoad / one.weak.criticalLoad).toBeCloseTo(2, 12)
    expect(twice.weak.used).toBe(one.weak.used)
    expect(one.weak.criticalLoad).toBeCloseTo((Math.PI ** 2 * 5e12) / one.weak.eigenvalue ** 2, 3)
  })

  it('says in words which method governed', () => {
    const [strong, weak] = governedNote(columnLengths(freeTop, 2e13, 5e12))
    expect(strong).toBe('Strong axis: K of the segments governs; the eigenvalue of the whole column agrees.')
    expect(weak).toContain('is free and has no K of its own')
    expect(weak).toContain('74 % more than the longest braced part gives')
  })
})
