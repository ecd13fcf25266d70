import { describe, expect, it } from 'vitest'
import { catalogue } from '../../seeds/reference/catalogue.ts'
import type { BoxSection, RoundSection } from '../../shared/sections/section.ts'
import { geometryOfBox, geometryOfRing, spread, withDerived } from '../support/section-geometry.ts'

/*
 * Sources: EN 10210-2 (hot finished: corners 1.5t outside, 1.0t inside) and EN 10219-2 (cold formed: corners by wall);
 * Steel Construction Institute handbook tables. Every row is recomputed. Tolerances: median 0.3 %, worst 0.6 %.
 */
const boxes = catalogue.sections.filter(
  (section): section is BoxSection => section.family === 'SHS' || section.family === 'RHS',
)
const rounds = catalogue.sections.filter((section): section is RoundSection => section.family === 'CHS')

function ofBox(box: BoxSection) {
  const inside = box.process === 'hot finished' ? box.wall : box.corner - box.wall
  return withDerived(box, geometryOfBox(box, box.corner, inside))
}

describe.each(['hot finished', 'cold formed'] as const)('%s', (process) => {
  it.each(['area', 'Ix', 'Sx', 'rx', 'Zx', 'Iy', 'Sy', 'ry', 'Zy'] as const)(
    '%s of SHS and RHS',
    (property) => {
      const rows = boxes.filter((box) => box.process === process)
      expect(rows).toHaveLength(process === 'hot finished' ? 510 : 233)
      const found = spread(
        rows.map((box) => ({
          name: box.designation,
          published: box[property],
          computed: ofBox(box)[property],
        })),
      )
      expect(found.median).toBeLessThan(0.003)
      expect(found.largest, found.worst).toBeLessThan(0.006)
    },
  )

  it.each(['area', 'Ix', 'Sx', 'rx', 'Zx'] as const)('%s of CHS', (property) => {
    const found = spread(
      rounds
        .filter((round) => round.process === process)
        .map((round) => ({
          name: round.designation,
          published: round[property],
          computed: withDerived(round, geometryOfRing(round))[property],
        })),
    )
    expect(found.median).toBeLessThan(0.003)
    expect(found.largest, found.worst).toBeLessThan(0.006)
  })
})

/* From memory: EN 10210-2, SHS 150 x 8 has 44.8 cm² and SHS 200 x 10 has I 4470 cm⁴; printed to three figures. */
describe('EN 10210-2, from memory', () => {
  it('SHS 150x150x8 and SHS 200x200x10', () => {
    expect(Math.abs((catalogue.find('SHS 150x150x8.0 HF')?.area ?? 0) / 100 - 44.8)).toBeLessThanOrEqual(0.1)
    expect(Math.abs((catalogue.find('SHS 200x200x10.0 HF')?.Ix ?? 0) / 1e4 - 4470)).toBeLessThanOrEqual(10)
  })
})
