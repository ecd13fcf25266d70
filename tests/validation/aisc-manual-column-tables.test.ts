import { describe, expect, it } from 'vitest'
import { catalogue } from '../../seeds/reference/catalogue.ts'
import { available, FACTORS } from '../../shared/standards/aisc360/resistance.ts'
import { eulerStress, nominalStress } from '../../shared/standards/aisc360/flexural-buckling.ts'
import { c2Of } from '../../shared/standards/aisc360/effective-width.ts'
import {
  bucklingModes,
  governingMode,
  nominalCompression,
} from '../../shared/standards/aisc360/compression.ts'
import type { ISection } from '../../shared/sections/section.ts'
import { E_AISC, G_AISC } from '../../shared/materials/steel.ts'

const KIP = 4448.2216152605
const KSI = KIP / 25.4 ** 2
const FOOT = 304.8

/** Critical stress at a slenderness, ksi. */
function critical(Fy: number, slenderness: number): number {
  return nominalStress(Fy * KSI, eulerStress(E_AISC, slenderness)) / KSI
}

describe('AISC Manual, 14th edition, Table 4-22 (15th: 4-14): available critical stress', () => {
  it.each([
    [50, 10, 29.7],
    [50, 20, 29.1],
    [50, 24, 28.7],
    [46, 20, 26.8],
    [46, 24, 26.5],
    [42, 24, 24.3],
    [36, 20, 21.1],
    [36, 24, 20.9],
    [35, 24, 20.3],
  ])('Fy = %s ksi, Lc/r = %s: Fcr/Ω = %s ksi', (Fy, slenderness, printed) => {
    expect(
      Math.abs(available(critical(Fy, slenderness), FACTORS.compression, 'ASD') - printed),
    ).toBeLessThanOrEqual(0.1)
  })
  it('Fy = 50 ksi, Lc/r = 200: φFcr = 5.65 ksi (from memory)', () => {
    expect(Math.abs(available(critical(50, 200), FACTORS.compression, 'LRFD') - 5.65)).toBeLessThanOrEqual(
      0.01,
    )
  })
})

describe('AISC LRFD Manual, 2nd edition, Table 3-36: the same curve with φ = 0.85, Fy = 36 ksi', () => {
  it.each([
    [1, 30.6],
    [100, 18.08],
    [140, 10.89],
    [199, 5.39],
  ])('Lc/r = %s: 0.85·Fcr = %s ksi', (slenderness, printed) => {
    expect(Math.abs(0.85 * critical(36, slenderness) - printed)).toBeLessThanOrEqual(0.0101)
  })
})

/** φPn of a W of 50 ksi steel with one effective length about every axis, kip. */
function strength(designation: string, feet: number, method: 'LRFD' | 'ASD'): number {
  const section = catalogue.find(designation)
  if (!section) throw new Error(`no ${designation}`)
  // A table starts at no length at all: as short as makes no difference.
  const length = Math.max(feet, 0.01) * FOOT
  const input = { E: E_AISC, G: G_AISC, Fy: 50 * KSI, strong: length, weak: length, torsion: length }
  const mode = governingMode(bucklingModes(section, input))
  return available(nominalCompression(section, mode, E_AISC, 50 * KSI), FACTORS.compression, method) / KIP
}

describe('AISC Manual, Table 4-1: W14X730, Fy = 50 ksi', () => {
  it.each([
    [0, 9670],
    [11, 9130],
    [20, 7990],
    [30, 6290],
    [40, 4500],
  ])('at %s ft: φPn = %s kip', (feet, printed) => {
    expect(Math.abs(strength('W14X730', feet, 'LRFD') - printed)).toBeLessThanOrEqual(10)
  })
})

describe('column load table in the Manual’s format, Fy = 50 ksi', () => {
  it.each([
    ['W14X873', 0, 11600, 100],
    ['W14X873', 20, 9700, 10],
    ['W14X873', 30, 7790, 10],
    ['W14X873', 40, 5730, 10],
    ['W14X873', 50, 3870, 10],
    ['W14X808', 20, 8940, 10],
    ['W14X808', 40, 5200, 10],
  ])('%s at %s ft: φPn = %s kip', (designation, feet, printed, tolerance) => {
    expect(Math.abs(strength(designation, feet, 'LRFD') - printed)).toBeLessThanOrEqual(tolerance)
  })
  it.each([
    ['LRFD', 20, 2360, 10],
    ['ASD', 40, 515, 1],
  ] as const)(
    'W21X275 with the 81 in² and 3.12 in of that table, %s at %s ft: %s kip',
    (method, feet, printed, tolerance) => {
      const stress = available(critical(50, (feet * 12) / 3.12), FACTORS.compression, method)
      expect(Math.abs(stress * 81 - printed)).toBeLessThanOrEqual(tolerance)
    },
  )
})

describe('Table 4-1 as textbooks quote it', () => {
  it('W14X74 at 20 ft: φPn = 494 kip', () => {
    expect(Math.abs(strength('W14X74', 20, 'LRFD') - 494)).toBeLessThanOrEqual(1)
  })
})

describe('ANSI/AISC 360-22, Table E7.1', () => {
  it.each([
    [0.18, 1.31],
    [0.22, 1.49],
  ])('c1 = %s has c2 = %s', (c1, printed) => {
    expect(Math.abs(c2Of(c1) - printed)).toBeLessThanOrEqual(0.011)
  })
})

/** One mode by itself: φPn of a section with different lengths, kip. */
function strengthOf(designation: string, Fy: number, feet: { strong: number; weak: number }) {
  const section = catalogue.find(designation)
  if (!section) throw new Error(`no ${designation}`)
  const input = {
    ...{ E: E_AISC, G: G_AISC, Fy: Fy * KSI },
    ...{ strong: feet.strong * FOOT, weak: feet.weak * FOOT, torsion: feet.weak * FOOT },
  }
  const mode = governingMode(bucklingModes(section, input))
  return nominalCompression(section, mode, E_AISC, Fy * KSI) / KIP
}

describe('AISC Design Examples v15, chapter E (figures from memory; v14 where said)', () => {
  it('E.1A: W14X132, 30 ft, pinned: Pn/Ω = 594 kip', () => {
    const nominal = strengthOf('W14X132', 50, { strong: 30, weak: 30 })
    expect(Math.abs(available(nominal, FACTORS.compression, 'ASD') - 594)).toBeLessThanOrEqual(1.5)
  })
  it('E.1B: W14X90, 30 ft, weak axis and twist held at mid-height: Pn/Ω = 618 kip', () => {
    const nominal = strengthOf('W14X90', 50, { strong: 30, weak: 15 })
    expect(Math.abs(available(nominal, FACTORS.compression, 'ASD') - 618)).toBeLessThanOrEqual(2)
  })
  it('E.9 (v14): HSS12X10X3/8, Fy = 46 ksi, 16 ft: φPn = 518 kip', () => {
    const nominal = strengthOf('HSS12X10X3/8', 46, { strong: 16, weak: 16 })
    expect(Math.abs(available(nominal, FACTORS.compression, 'LRFD') - 518)).toBeLessThanOrEqual(2)
  })
  it('E.10: HSS12X8X3/16, Fy = 50 ksi, 24 ft, slender walls: φPn = 151 kip', () => {
    const nominal = strengthOf('HSS12X8X3/16', 50, { strong: 24, weak: 24 })
    expect(Math.abs(available(nominal, FACTORS.compression, 'LRFD') - 151)).toBeLessThanOrEqual(2)
  })
})

describe('OpenStax CNX m10711: W14X74, Fy = 36 ksi, 20 ft, φ = 0.85', () => {
  it('carries 408 kip', () => {
    expect(Math.abs(0.85 * strengthOf('W14X74', 36, { strong: 20, weak: 20 }) - 408)).toBeLessThanOrEqual(1)
  })
})

/** Three plates welded to an I: flanges b × tf and a web hw × tw, in inches; only what compression needs. */
function plates(b: number, tf: number, hw: number, tw: number): ISection {
  const ho = hw + tf
  const area = 2 * b * tf + hw * tw
  const Ix = (b * (hw + 2 * tf) ** 3 - (b - tw) * hw ** 3) / 12
  const Iy = (2 * tf * b ** 3 + hw * tw ** 3) / 12
  const J = (2 * b * tf ** 3 + hw * tw ** 3) / 3
  const inch = 25.4
  return {
    ...{ designation: 'welded', designationSI: 'welded', family: 'W', shape: 'I', builtUp: true },
    ...{ mass: area * inch ** 2 * 0.00785, area: area * inch ** 2, perimeter: 0, fillet: 0 },
    ...{ depth: (hw + 2 * tf) * inch, width: b * inch, tf: tf * inch, tw: tw * inch, ho: ho * inch },
    ...{ Ix: Ix * inch ** 4, rx: Math.sqrt(Ix / area) * inch, Iy: Iy * inch ** 4 },
    ...{ ry: Math.sqrt(Iy / area) * inch, J: J * inch ** 4, Cw: ((Iy * ho ** 2) / 4) * inch ** 6 },
    ...{ Sx: 0, Zx: 0, Sy: 0, Zy: 0, rts: 0, flangeRatio: b / (2 * tf), webRatio: hw / tw },
  }
}

describe('AISC Design Examples v15, E.2 (plates and figure from memory)', () => {
  it('flanges 1 × 8 in, web 1/4 × 15 in, slender, Fy = 50 ksi, 15 ft: φPn = 500 kip', () => {
    const length = 15 * FOOT
    const input = { E: E_AISC, G: G_AISC, Fy: 50 * KSI, strong: length, weak: length, torsion: length }
    const section = plates(8, 1, 15, 0.25)
    const nominal = nominalCompression(
      section,
      governingMode(bucklingModes(section, input)),
      E_AISC,
      50 * KSI,
    )
    expect(nominal).toBeLessThan(governingMode(bucklingModes(section, input)).Fn * section.area)
    expect(Math.abs(available(nominal, FACTORS.compression, 'LRFD') / KIP - 500)).toBeLessThanOrEqual(4)
  })
})
