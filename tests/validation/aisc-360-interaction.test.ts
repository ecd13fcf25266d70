import { describe, expect, it } from 'vitest'
import { catalogue } from '../../seeds/reference/catalogue.ts'
import { E_AISC } from '../../shared/materials/steel.ts'
import { statedSteel } from '../../shared/materials/shape-steels.ts'
import type { BoxSection, ISection, RoundSection } from '../../shared/sections/section.ts'
import { effectiveFlange, flexureRound } from '../../shared/standards/aisc360/flexure-hss.ts'
import { lateralPlasticLength, strongFlexureI } from '../../shared/standards/aisc360/flexure-i.ts'
import { interaction } from '../../shared/standards/aisc360/interaction.ts'
import { checkColumn } from '../../shared/standards/check-column.ts'
import { prepareColumn } from '../../shared/standards/prepare-column.ts'

const KIP = 4448.2216152605
const KSI = KIP / 25.4 ** 2
const KIP_FT = KIP * 304.8

/*
 * ANSI/AISC 360-22 chapter F, Appendix 8 and H1 against a separate program written from the standard alone; K = 1, Cb = 1.
 * kip, in, ksi, or N, mm, MPa. Tolerance 0.1 %.
 */
const CASES = [
  {
    about: 'W10x49 12 ft, Pu=150 kip, one beam reaction 60 kip at e = d/2 + 3 in',
    section: 'W10X49',
    units: 'US',
    Fy: 50,
    method: 'LRFD',
    axial: 150,
    strong: 480.0,
    ratioStrong: 0,
    weak: 0,
    ratioWeak: 0,
    length: 144,
    Pc: 512.28723,
    Mcx: 2584.5,
    Mcy: 1273.5,
    B1x: 1.0,
    B1y: 1.0,
    equation: 'H1-1a',
    interaction: 0.45789122,
  },
  {
    about: 'HSS6x6x3/8 14 ft, Pu=90, biaxial',
    section: 'HSS6X6X3/8',
    units: 'US',
    Fy: 50,
    method: 'LRFD',
    axial: 90,
    strong: 120,
    ratioStrong: 0,
    weak: 60,
    ratioWeak: 0,
    length: 168,
    Pc: 229.33768,
    Mcx: 711.0,
    Mcy: 711.0,
    B1x: 1.0,
    B1y: 1.0,
    equation: 'H1-1a',
    interaction: 0.61746959,
  },
  {
    about: 'HSS7.000x0.250 12 ft, Pu=50',
    section: 'HSS7.000X0.250',
    units: 'US',
    Fy: 46,
    method: 'LRFD',
    axial: 50,
    strong: 90,
    ratioStrong: 0,
    weak: 0,
    ratioWeak: 0,
    length: 144,
    Pc: 160.5288,
    Mcx: 442.98,
    Mcy: 442.98,
    B1x: 1.0,
    B1y: 1.0,
    equation: 'H1-1a',
    interaction: 0.49206566,
  },
  {
    about: 'W8x31 ASD 12 ft, Pa=60, reverse curvature (M1/M2=+1): B1 floor of 1.0',
    section: 'W8X31',
    units: 'US',
    Fy: 50,
    method: 'ASD',
    axial: 60,
    strong: 200,
    ratioStrong: 1.0,
    weak: 0,
    ratioWeak: 0,
    length: 144,
    Pc: 188.51804,
    Mcx: 818.15903,
    Mcy: 421.56984,
    B1x: 1.0,
    B1y: 1.0,
    equation: 'H1-1a',
    interaction: 0.53556192,
  },
  {
    about: 'W250X73 SI, 4 m, Pu=700 kN, M2x=60 kN-m',
    section: 'W250X73',
    units: 'SI',
    Fy: 345,
    method: 'LRFD',
    axial: 700000.0,
    strong: 60000000.0,
    ratioStrong: 0,
    weak: 0,
    ratioWeak: 0,
    length: 4000.0,
    Pc: 2177164.2,
    Mcx: 286649330.0,
    Mcy: 144072000.0,
    B1x: 1.0,
    B1y: 1.0,
    equation: 'H1-1a',
    interaction: 0.50757692,
  },
] as const

function near(value: unknown, expected: number, tolerance = 1e-3): void {
  expect(Math.abs(Number(value) / expected - 1)).toBeLessThanOrEqual(tolerance)
}

function sectionOf(name: string) {
  const section = catalogue.find(name)
  if (!section) throw new Error(`no ${name}`)
  return section
}

describe('axial force and flexure together', () => {
  it.each(CASES)('$about', (one) => {
    const [length, force, stress] = one.units === 'US' ? [25.4, KIP, KSI] : [1, 1, 1]
    const Lc = one.length * length
    const prepared = prepareColumn({
      method: one.method,
      lengths: { strong: Lc, weak: Lc, torsion: Lc },
      required: {
        axial: one.axial * force,
        momentStrong: one.strong * force * length,
        momentRatioStrong: one.ratioStrong,
        momentWeak: one.weak * force * length,
        momentRatioWeak: one.ratioWeak,
      },
    })
    const Fy = one.Fy * stress
    const { values, checks } = checkColumn(prepared, sectionOf(one.section), statedSteel(Fy, Fy * 1.3))
    near(values.available, one.Pc * force)
    near(values.momentAvailableStrong, one.Mcx * force * length)
    near(values.momentAvailableWeak, one.Mcy * force * length)
    near(values.amplifierStrong, one.B1x)
    near(values.amplifierWeak, one.B1y)
    near(values.interaction, one.interaction)
    expect(checks.find(({ clause }) => clause === 'H1')?.steps[0]?.symbol).toBe(one.equation)
  })
})

describe('AISC Design Examples v15 (from memory)', () => {
  it('F.1-2B: W18X50, Lb = 11.7 ft, Cb = 1.01: φMn = 305 kip-ft', () => {
    const { nominal } = strongFlexureI(sectionOf('W18X50') as ISection, E_AISC, 50 * KSI, 11.7 * 304.8, 1.01)
    expect(Math.abs((0.9 * nominal) / KIP_FT - 305)).toBeLessThanOrEqual(1)
  })
  it('F.1-1B: W18X50, continuously braced: φMn = 379 kip-ft; Table 3-2: Lp = 5.83 ft', () => {
    const section = sectionOf('W18X50') as ISection
    const { nominal } = strongFlexureI(section, E_AISC, 50 * KSI, 1)
    expect(Math.abs((0.9 * nominal) / KIP_FT - 379)).toBeLessThanOrEqual(1)
    expect(Math.abs(lateralPlasticLength(section.ry, E_AISC, 50 * KSI) / 304.8 - 5.83)).toBeLessThanOrEqual(
      0.01,
    )
  })
  it('F.3: W21X48, noncompact flange: φMn = 398 kip-ft', () => {
    const { nominal } = strongFlexureI(sectionOf('W21X48') as ISection, E_AISC, 50 * KSI, 1)
    expect(Math.abs((0.9 * nominal) / KIP_FT - 398)).toBeLessThanOrEqual(1)
  })
  it('F.8B: HSS8X8X3/16, slender flange: be = 6.33 in', () => {
    const { widthRatio, designWall } = sectionOf('HSS8X8X3/16') as BoxSection
    const be = effectiveFlange(widthRatio * designWall, designWall, E_AISC, 50 * KSI)
    expect(Math.abs(be / 25.4 - 6.33)).toBeLessThanOrEqual(0.01)
  })
  it('F.9: Pipe 8 x-strong, Fy = 35 ksi: φMn = 81.4 kip-ft', () => {
    const { nominal } = flexureRound(sectionOf('PIPE8XS') as RoundSection, E_AISC, 35 * KSI)
    expect(Math.abs((0.9 * nominal) / KIP_FT - 81.4)).toBeLessThanOrEqual(0.1)
  })
  it('H.1: W14X99, Lb = 14 ft: φMnx = 642 kip-ft; Pu = 400 kip with 250 and 80 kip-ft: 0.928', () => {
    const { nominal } = strongFlexureI(sectionOf('W14X99') as ISection, E_AISC, 50 * KSI, 14 * 304.8)
    expect(Math.abs((0.9 * nominal) / KIP_FT - 642)).toBeLessThanOrEqual(2)
    expect(Math.abs(interaction(400 / 1130, 250 / 642, 80 / 311) - 0.928)).toBeLessThanOrEqual(0.001)
  })
})
