import { describe, expect, it } from 'vitest'
import { solveColumn } from '../../shared/stability/column-lengths.ts'
import type { EndCondition, Ends } from '../../shared/stability/column.ts'
import { criticalLoad } from '../../shared/stability/critical-load.ts'
import { effectiveLength, solveLength } from '../../shared/stability/effective-length.ts'
import { holdsRotation, holdsTranslation } from '../../shared/stability/restraint.ts'
import type { StrutEnd } from '../../shared/stability/strut.ts'
import { validateColumn } from '../../shared/stability/validate-column.ts'
import { BUCKLING_CASES, type BucklingCase } from './data/column-buckling.ts'

/*
 * Source: elastic critical loads of braced columns, computed by exact stability functions and again by two independent
 * finite element programs (beam elements; solid-expanded beams). Tolerance 0.5 %, the agreement of the two programs.
 */
const TOLERANCE = 0.005

function end(condition: EndCondition, springOverEI?: number): StrutEnd {
  return {
    holdsTranslation: holdsTranslation(condition),
    rotation: springOverEI ?? (holdsRotation(condition) ? Infinity : 0),
  }
}

function rigid(one: BucklingCase) {
  return criticalLoad({
    height: one.height,
    bottom: end(one.bottom, one.baseSpring === undefined ? undefined : one.baseSpring / one.EI),
    top: end(one.top),
    braceHeights: one.braces,
    loads: (one.loads ?? [[one.height, 1]]).map(([height, share]) => ({ height, share })),
  })
}

function near(found: number, expected: number): void {
  expect(Math.abs(found / expected - 1), `${found} against ${expected}`).toBeLessThan(TOLERANCE)
}

describe.each(BUCKLING_CASES)('$name', (one) => {
  it('has its critical load', () => {
    near((Math.PI ** 2 * one.EI) / rigid(one).length ** 2, one.Pcr)
  })

  it('buckles in its form, within 1 % of the peak', () => {
    const { shape } = rigid(one)
    const at = (share: number) =>
      shape.find(([height]) => Math.abs(height - share * one.height) < 1e-6)?.[1] ?? NaN
    const found = [at(0.25), at(0.5), at(0.75)]
    const turned = found.reduce((sum, value, index) => sum + value * (one.form[index] ?? 0), 0) < 0 ? -1 : 1
    for (const [index, value] of found.entries()) {
      expect(Math.abs(turned * value - (one.form[index] ?? NaN))).toBeLessThan(0.01)
    }
  })
})

describe.each(BUCKLING_CASES.filter((one) => one.segment))('$name by both methods', (one) => {
  const input = { height: one.height, ends: { bottom: one.bottom, top: one.top }, braceHeights: one.braces }

  it('has its K·L by segments, exactly', () => {
    const [theoretical, recommended] = one.segment ?? [NaN, NaN]
    expect(solveLength({ ...input, endFixity: 'theoretical' }).segment).toBeCloseTo(theoretical, 6)
    expect(solveLength({ ...input, endFixity: 'recommended' }).segment).toBeCloseTo(recommended, 6)
  })

  it('has its eigenvalue length with softened ends, and the longer of the two counts', () => {
    const found = effectiveLength({ ...input, endFixity: 'recommended', EI: one.EI })
    near(found.eigenvalue, one.softened)
    near(found.used, Math.max(one.softened, one.segment?.[1] ?? NaN))
    expect(found.governedBy).toBe(one.top === 'free' && one.braces.length > 0 ? 'eigenvalue' : 'segment')
  })

  it('has its critical load from theoretical fixity', () => {
    near(effectiveLength({ ...input, endFixity: 'theoretical', EI: one.EI }).criticalLoad, one.Pcr)
  })
})

/* Same source: one column about both axes; the weak axis governs in spite of its braces. r in mm. */
describe.each([
  {
    pair: 'A',
    strong: 'pair A strong axis',
    weak: 'pair A weak axis',
    r: [128.86022, 37.499629],
    KLr: 89.7619,
  },
  {
    pair: 'B',
    strong: 'pair B strong axis',
    weak: 'pair B weak axis',
    r: [176.379534, 52.84415],
    KLr: 54.88611,
  },
])('pair $pair', ({ strong, weak, r, KLr }) => {
  it('has its largest elastic slenderness about the weak axis', () => {
    const named = (name: string) => BUCKLING_CASES.find((one) => one.name === name)
    const [x, y] = [named(strong), named(weak)]
    const ends = (one: BucklingCase | undefined): Ends => ({
      bottom: one?.bottom ?? 'free',
      top: one?.top ?? 'free',
    })
    const solution = solveColumn({
      height: x?.height ?? 0,
      ends: { strong: ends(x), weak: ends(y) },
      braces: [
        ...(x?.braces ?? []).map((height) => ({ height, holds: 'strong' as const, stopsTwist: false })),
        ...(y?.braces ?? []).map((height) => ({ height, holds: 'weak' as const, stopsTwist: false })),
      ],
      endFixity: 'theoretical',
    })
    const slenderness = [solution.strong.eigenvalue / (r[0] ?? 1), solution.weak.eigenvalue / (r[1] ?? 1)]
    near(slenderness[1] ?? NaN, KLr)
    expect(slenderness[1]).toBeGreaterThan(slenderness[0] ?? NaN)
  })
})

/* Same source: three columns that carry nothing. */
describe.each([
  { name: 'pinned base, free top, no brace', bottom: 'pinned', top: 'free', braces: [] },
  { name: 'guided both ends', bottom: 'guided', top: 'guided', braces: [] },
  { name: 'pinned base, free top, brace at the base', bottom: 'pinned', top: 'free', braces: [0] },
] as const)('$name', ({ bottom, top, braces }) => {
  const ends = { bottom, top }

  it('is refused before either method runs', () => {
    const input = { height: 5000, ends, braceHeights: braces, endFixity: 'theoretical' as const }
    expect(() => solveLength(input)).toThrow(/can move without bending/)
    const issues = validateColumn({
      height: 5000,
      ends: { strong: { bottom: 'pinned', top: 'pinned' }, weak: ends },
      braces: braces.map((height) => ({ height, holds: 'weak' as const, stopsTwist: true })),
      endFixity: 'theoretical',
    })
    expect(issues.map((issue) => issue.path)).toEqual([
      braces.length > 0 ? 'braces.0.height' : 'ends.weak.top',
    ])
  })
})
