import { describe, expect, it } from 'vitest'
import { catalogue } from '../../seeds/reference/catalogue.ts'
import type { ISection } from '../../shared/sections/section.ts'
import { geometryOfI, spread, torsionOfI, warpingOfI, withDerived } from '../support/section-geometry.ts'

/*
 * Sources: EN 10365:2017 (HEA, HEB, HEM, IPE) and the Steel Construction Institute handbook tables (UC, UB). Every row is
 * recomputed from its dimensions. Tolerances: median 0.3 %, worst 0.6 % (three printed figures); torsion constants 5 %
 * (handbook tables round them to two figures for light shapes, and two rules for the junctions are in use).
 */
const shapes = catalogue.sections.filter(
  (section): section is ISection => section.shape === 'I' && section.family !== 'W',
)

describe.each(['HEA', 'HEB', 'HEM', 'IPE', 'UC', 'UB'] as const)('%s', (family) => {
  const rows = shapes.filter((shape) => shape.family === family)

  it.each(['area', 'Ix', 'Sx', 'rx', 'Zx', 'Iy', 'Sy', 'ry', 'Zy'] as const)('%s', (property) => {
    const found = spread(
      rows.map((shape) => ({
        name: shape.designation,
        published: shape[property],
        computed: withDerived(shape, geometryOfI(shape))[property],
      })),
    )
    expect(found.median).toBeLessThan(0.003)
    expect(found.largest, found.worst).toBeLessThan(0.006)
  })

  it('Cw within 1 %, J within 5 %', () => {
    for (const shape of rows) {
      expect(Math.abs(shape.Cw / warpingOfI(shape) - 1), shape.designation).toBeLessThan(0.01)
      expect(Math.abs(shape.J / torsionOfI(shape) - 1), shape.designation).toBeLessThan(0.05)
    }
  })

  it('weighs 7850 kg/m³, within 0.5 %', () => {
    for (const shape of rows) {
      expect(Math.abs(shape.mass / (shape.area * 7850e-6) - 1), shape.designation).toBeLessThan(0.005)
    }
  })
})

/*
 * From memory: A cm² and Iz cm⁴ of the older Euronorm 53-62 tables, which have four figures. Tolerance: half a unit of the
 * last figure of our own table.
 */
describe('Euronorm 53-62, from memory', () => {
  it.each([
    ['HEA 200', 53.83, 1336],
    ['HEB 200', 78.08, 2003],
    ['HEA 300', 112.5, 6310],
    ['HEB 300', 149.1, 8563],
    ['HEB 160', 54.25, 889.2],
  ])('%s', (designation, area, Iz) => {
    const shape = catalogue.find(designation)
    expect(Math.abs((shape?.area ?? 0) / 100 - area)).toBeLessThanOrEqual(0.06)
    expect(Math.abs((shape?.Iy ?? 0) / 1e4 / Iz - 1)).toBeLessThanOrEqual(0.0006)
  })
})

/* Steel Buildings in Europe, MSB04, worked example A.5: HE 300 B has 149 cm². */
describe('HE 300 B from its dimensions', () => {
  it('has 149 cm², to 0.5', () => {
    const shape = shapes.find((one) => one.designation === 'HEB 300')
    expect(shape).toBeDefined()
    if (shape) expect(Math.abs(geometryOfI(shape).area / 100 - 149)).toBeLessThan(0.5)
  })
})
