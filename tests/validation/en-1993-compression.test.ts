import { describe, expect, it } from 'vitest'
import { catalogue } from '../../seeds/reference/catalogue.ts'
import { steelFor } from '../../shared/materials/steel-for.ts'
import { E_EN, G_EN } from '../../shared/materials/european-steels.ts'
import type { Section } from '../../shared/sections/section.ts'
import { checkColumn } from '../../shared/standards/check-column.ts'
import {
  bucklingReduction,
  elasticLoadEn,
  halfPhi,
  relativeSlenderness,
} from '../../shared/standards/en1993/buckling.ts'
import { modesEn } from '../../shared/standards/en1993/compression.ts'
import { combineEn } from '../../shared/standards/en1990/combinations.ts'
import { completeLoads } from '../../shared/standards/asce7/loads.ts'
import { extremes } from '../../shared/standards/asce7/combine.ts'
import { prepareColumn } from '../../shared/standards/prepare-column.ts'
import { screenColumn } from '../../shared/standards/screen-column.ts'
import { EN_COLUMN_CASES } from './data/en-columns.ts'

function sectionOf(name: string): Section {
  const section = catalogue.find(name)
  if (!section) throw new Error(`no ${name}`)
  return section
}

function near(value: unknown, expected: number, tolerance = 1e-3): void {
  expect(Math.abs(Number(value) / expected - 1)).toBeLessThanOrEqual(tolerance)
}

/*
 * EN 1993-1-1:2005 5.5, 6.3.1 and EN 1993-1-5, γM1 = 1.0, against a separate program written from the standard alone,
 * with that program's section properties (computed from dimensions). Tolerance 0.1 %.
 */
describe('EN 1993-1-1, members in compression', () => {
  it.each(EN_COLUMN_CASES)('$about', (one) => {
    const { area, Ix, Iy, J, Cw } = one
    const known = sectionOf(one.section)
    const section = { ...known, area, Ix, Iy, J, ...(known.shape === 'I' ? { Cw } : {}) } as Section
    const prepared = prepareColumn({
      standard: 'EN 1993-1-1',
      lengths: { strong: one.strong, weak: one.weak, torsion: one.torsion },
      required: { axial: 1000 },
    })
    const steel = steelFor(one.grade, section)
    expect(steel.Fy).toBe(one.fy)
    const { values, governing } = checkColumn(prepared, section, steel)
    expect(values.class).toBe(one.sectionClass)
    near(values.effectiveArea, one.Aeff)
    expect([values.curveStrong, values.curveWeak]).toEqual([one.curveStrong, one.curveWeak])
    near(values.lambdaBarStrong, one.lambdaStrong)
    near(values.lambdaBarWeak, one.lambdaWeak)
    near(values.chiStrong, one.chiStrong)
    near(values.chiWeak, one.chiWeak)
    near(values.available, one.NbRd)
    if (one.lambdaTorsion > 0) {
      near(values.lambdaBarTorsion, one.lambdaTorsion)
      near(values.resistanceTorsion, one.NbTorsion)
    }
    if (one.strong !== one.weak || Ix !== Iy) expect(governing.axis).toBe(one.governing)
    expect(screenColumn(prepared, section, steel).capacity).toBe(values.available)
  })
})

/* UK handbook of section properties and resistances, EN 1993-1-1 with the UK annex; three-figure radii: 1 %. kN there. */
describe('handbook resistances of UC', () => {
  it.each([
    ['UC 203x203x46', 'S355', 'strong', 2000, 2010000],
    ['UC 203x203x46', 'S355', 'torsion', 2000, 1770000],
    ['UC 203x203x46', 'S355', 'weak', 3000, 1420000],
    ['UC 203x203x46', 'S355', 'strong', 4000, 1750000],
    ['UC 203x203x46', 'S355', 'torsion', 4000, 1420000],
    ['UC 203x203x46', 'S355', 'weak', 6000, 635000],
    ['UC 254x254x73', 'S275', 'strong', 3000, 2460000],
    ['UC 254x254x73', 'S275', 'torsion', 3000, 2170000],
    ['UC 254x254x73', 'S275', 'weak', 5000, 1550000],
    ['UC 254x254x73', 'S275', 'strong', 8000, 1810000],
    ['UC 254x254x73', 'S275', 'torsion', 8000, 1680000],
    ['UC 305x305x97', 'S355', 'weak', 4000, 3220000],
    ['UC 305x305x97', 'S355', 'strong', 6000, 3680000],
    ['UC 305x305x97', 'S355', 'torsion', 6000, 2900000],
    ['UC 305x305x97', 'S355', 'weak', 10000, 1120000],
  ] as const)('%s %s, %s, %s mm: %s N', (name, grade, axis, length, printed) => {
    const section = sectionOf(name)
    const { Fy } = steelFor(grade, section)
    const mode = modesEn(section, Fy, { strong: length, weak: length, torsion: length }).find(
      (one) => one.name === axis,
    )
    near(mode?.resistance, printed, 0.01)
  })
})

/* ECCS buckling curves as printed in ENV 1993-1-1 Table 5.5.2; from memory. */
describe('buckling reduction', () => {
  it.each([
    ['a', 0.5, 0.9243, 0.0001],
    ['c', 0.5, 0.843, 0.001],
    ['a', 1.0, 0.6656, 0.0001],
    ['c', 1.0, 0.5399, 0.0001],
    ['a', 1.5, 0.3724, 0.0001],
    ['c', 1.5, 0.3145, 0.0001],
    ['a', 2.0, 0.2229, 0.0001],
    ['c', 2.0, 0.1962, 0.0001],
    ['a', 3.0, 0.1036, 0.0001],
    ['c', 3.0, 0.0951, 0.0001],
  ] as const)('curve %s at %s is %s', (curve, lambda, printed, tolerance) => {
    expect(Math.abs(bucklingReduction(lambda, curve) - printed)).toBeLessThanOrEqual(tolerance)
  })
})

describe('Steel Buildings in Europe, part 4, worked example A.5: HE 300 B, S235', () => {
  it('gives Ncr,y, λ̄ and Φ as printed (A = 149 cm², Iy = 25 170 cm⁴, 8 m, curve b)', () => {
    const Ncr = elasticLoadEn(E_EN * 25_170e4, 8000)
    expect(Math.abs(Ncr / 1000 - 8151.2)).toBeLessThanOrEqual(1)
    const lambda = relativeSlenderness(14_900, 235, Ncr)
    expect(Math.abs(lambda - 0.655)).toBeLessThanOrEqual(0.001)
    expect(Math.abs(halfPhi(lambda, 'b') - 0.792)).toBeLessThanOrEqual(0.001)
    expect(G_EN).toBe(81_000)
  })
})

/* EN 1990 Eq. 6.10, Table A1.1 and A1.2(B), against a separate program written from the standard alone. kN. */
describe('EN 1990, an office column', () => {
  const loads = { dead: 400, live: 300, snow: 60, wind: { pushes: 40 } }
  const [first, ...rest] = combineEn(completeLoads(loads), 'EN 1990 6.10', 'B')
  it('is 1071 kN by 1.35G + 1.5Q + 0.75S + 0.9W, no uplift', () => {
    if (!first) throw new Error('no combination')
    const { compression, compressionBy, uplift } = extremes([first, ...rest])
    expect(compression).toBeCloseTo(1071, 6)
    expect(compressionBy.name).toBe('1.35G+1.5Q+0.75S+0.9W')
    expect(uplift).toBe(0)
  })
})
