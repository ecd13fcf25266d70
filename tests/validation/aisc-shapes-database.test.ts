import { describe, expect, it } from 'vitest'
import { catalogue } from '../../seeds/reference/catalogue.ts'
import type { BoxSection, ISection, RoundSection } from '../../shared/sections/section.ts'
import { KG_M_PER_LB_FT, MM_PER_INCH } from '../../shared/units/convert.ts'
import {
  geometryOfBox,
  geometryOfI,
  geometryOfRing,
  spread,
  torsionOfI,
  warpingOfI,
  withDerived,
} from '../support/section-geometry.ts'

/*
 * Source: AISC Shapes Database v16.0 (ASTM A6, A500), US columns. Every row is recomputed from its own dimensions.
 * Tolerances: published values have three figures (0.5 %) and dimensions two or three, so the median must lie within 0.3 %
 * and the worst within 2 %. J of a W shape is published to a rule of its own for the junctions: 8 %.
 */
const wide = catalogue.sections.filter((section): section is ISection => section.family === 'W')
const boxes = catalogue.sections.filter(
  (section): section is BoxSection => section.shape === 'box' && section.process === 'A500',
)
const rounds = catalogue.sections.filter((section): section is RoundSection => section.family === 'HSS_ROUND')

const PROPERTIES = ['area', 'Ix', 'Sx', 'rx', 'Zx', 'Iy', 'Sy', 'ry', 'Zy'] as const

/** A500 tables take corners of 2t outside and 1t inside, t being the design wall. */
function ofBox(box: BoxSection) {
  return withDerived(box, geometryOfBox(box, 2 * box.designWall, box.designWall))
}

/** kg/m of steel, 7850 kg/m³, from mm². */
const KG_M_PER_MM2 = 7850e-6

describe('W shapes', () => {
  it('are the 184 of W4 to W24', () => {
    expect(wide).toHaveLength(184)
  })

  it.each(PROPERTIES)('%s follows from the dimensions and root fillets', (property) => {
    const found = spread(
      wide.map((section) => ({
        name: section.designation,
        published: section[property],
        computed: withDerived(section, geometryOfI(section))[property],
      })),
    )
    expect(found.median).toBeLessThan(0.003)
    expect(found.largest, found.worst).toBeLessThan(0.02)
  })

  it('Cw, J, ho, rts and the flange ratio follow from the dimensions', () => {
    const of = (published: (s: ISection) => number, computed: (s: ISection) => number) =>
      spread(wide.map((s) => ({ name: s.designation, published: published(s), computed: computed(s) })))
    expect(of((s) => s.Cw, warpingOfI).largest).toBeLessThan(0.02)
    expect(of((s) => s.J, torsionOfI).median).toBeLessThan(0.015)
    expect(of((s) => s.J, torsionOfI).largest).toBeLessThan(0.08)
    expect(
      of(
        (s) => s.ho,
        (s) => s.depth - s.tf,
      ).largest,
    ).toBeLessThan(0.005)
    expect(
      of(
        (s) => s.flangeRatio,
        (s) => s.width / 2 / s.tf,
      ).largest,
    ).toBeLessThan(0.01)
    expect(
      of(
        (s) => s.rts,
        (s) => Math.sqrt(Math.sqrt(s.Iy * s.Cw) / s.Sx),
      ).largest,
    ).toBeLessThan(0.005)
  })

  it('weigh what their name says in lb/ft, which is within 1.5 % of their area', () => {
    for (const section of wide) {
      const named = Number(section.designation.split('X')[1])
      expect(section.mass / KG_M_PER_LB_FT, section.designation).toBeCloseTo(named, 9)
      expect(Math.abs(section.mass / (section.area * KG_M_PER_MM2) - 1), section.designation).toBeLessThan(
        0.015,
      )
    }
  })

  it('W10X49 is kept in its US figures: A 14.4 in², d 10.0 in, Ix 272 in⁴, Cw 2070 in⁶', () => {
    const section = wide.find((one) => one.designation === 'W10X49')
    expect(section?.area).toBeCloseTo(14.4 * MM_PER_INCH ** 2, 6)
    expect(section?.depth).toBeCloseTo(254, 9)
    expect(section?.Ix).toBeCloseTo(272 * MM_PER_INCH ** 4, 3)
    expect((section?.Cw ?? 0) / (2070 * MM_PER_INCH ** 6)).toBeCloseTo(1, 12)
  })
})

describe('square and rectangular HSS', () => {
  it('are 126 square and 408 rectangular', () => {
    expect(boxes.filter((box) => box.family === 'HSS_SQUARE')).toHaveLength(126)
    expect(boxes.filter((box) => box.family === 'HSS_RECT')).toHaveLength(408)
  })

  it.each(PROPERTIES)('%s follows from the design wall and its corners', (property) => {
    const found = spread(
      boxes.map((box) => ({
        name: box.designation,
        published: box[property],
        computed: ofBox(box)[property],
      })),
    )
    expect(found.median).toBeLessThan(0.003)
    expect(found.largest, found.worst).toBeLessThan(0.02)
  })

  it('have a design wall of 0.93 of the nominal one, to its last printed figure', () => {
    for (const { designation, wall, designWall } of [...boxes, ...rounds]) {
      expect(Math.abs(designWall - 0.93 * wall) / MM_PER_INCH, designation).toBeLessThan(0.00075)
    }
  })

  it('have flat widths of b − 3t over the design wall, within 1 %', () => {
    for (const box of boxes) {
      expect(Math.abs(box.widthRatio / (box.width / box.designWall - 3) - 1), box.designation).toBeLessThan(
        0.01,
      )
      expect(Math.abs(box.depthRatio / (box.depth / box.designWall - 3) - 1), box.designation).toBeLessThan(
        0.01,
      )
    }
  })

  it('weigh by the nominal wall, within 0.5 %', () => {
    for (const box of boxes) {
      const nominal = geometryOfBox({ ...box, designWall: box.wall }, 2 * box.wall, box.wall)
      expect(Math.abs(box.mass / (nominal.area * KG_M_PER_MM2) - 1), box.designation).toBeLessThan(0.005)
    }
  })
})

describe('round HSS', () => {
  it.each(['area', 'Ix', 'Sx', 'rx', 'Zx'] as const)(
    '%s follows from diameter and design wall',
    (property) => {
      expect(rounds).toHaveLength(192)
      const found = spread(
        rounds.map((round) => ({
          name: round.designation,
          published: round[property],
          computed: withDerived(round, geometryOfRing(round))[property],
        })),
      )
      expect(found.median).toBeLessThan(0.003)
      expect(found.largest, found.worst).toBeLessThan(0.02)
    },
  )

  it('J is twice I, and D/t is by the design wall, within 1 %', () => {
    for (const round of rounds) {
      expect(Math.abs(round.J / (2 * round.Ix) - 1), round.designation).toBeLessThan(0.01)
      expect(Math.abs(round.diameterRatio / (round.depth / round.designWall) - 1)).toBeLessThan(0.01)
    }
  })
})
