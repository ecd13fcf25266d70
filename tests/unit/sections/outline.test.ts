import { describe, expect, it } from 'vitest'
import { catalogue } from '../../../seeds/reference/catalogue.ts'
import { outlineOf, type Rings } from '../../../shared/sections/outline.ts'

type Ring = Rings[number]

function edges(ring: Ring): [[number, number], [number, number]][] {
  return ring.map((point, index) => [point, ring[(index + 1) % ring.length] ?? point])
}
function areaOf(ring: Ring): number {
  return Math.abs(edges(ring).reduce((sum, [[x1, y1], [x2, y2]]) => sum + x1 * y2 - x2 * y1, 0)) / 2
}
function around(ring: Ring): number {
  return edges(ring).reduce((sum, [[x1, y1], [x2, y2]]) => sum + Math.hypot(x2 - x1, y2 - y1), 0)
}
const span = (values: number[]): number => Math.max(...values) - Math.min(...values)

describe('an outline', () => {
  it('has the depth and width of every shape and lies about its centroid', () => {
    for (const section of catalogue.sections) {
      const [outside = []] = outlineOf(section)
      expect(span(outside.map(([x]) => x)), section.designation).toBeCloseTo(section.width, 6)
      expect(span(outside.map(([, y]) => y)), section.designation).toBeCloseTo(section.depth, 6)
      expect(Math.abs(outside.reduce((sum, [x, y]) => sum + x + y, 0)), section.designation).toBeLessThan(
        1e-6,
      )
    }
  })

  it('is as long as the perimeter to be painted, within the chords of its arcs (0.3 %)', () => {
    for (const section of catalogue.sections) {
      const [outside = []] = outlineOf(section)
      expect(Math.abs(around(outside) / section.perimeter - 1), section.designation).toBeLessThan(0.003)
    }
  })

  it('encloses the area of an I within 2 %, and has a hole only in hollow shapes', () => {
    for (const section of catalogue.sections) {
      const [outside = [], inside] = outlineOf(section)
      if (section.shape === 'I') {
        expect(inside).toBeUndefined()
        expect(Math.abs(areaOf(outside) / section.area - 1), section.designation).toBeLessThan(0.02)
      } else {
        expect(areaOf(outside) - areaOf(inside ?? []), section.designation).toBeGreaterThan(
          0.95 * section.area,
        )
      }
    }
  })
})
