import { describe, expect, it } from 'vitest'
import { basePlateScene } from '../../../shared/drawing/base-plate-scene.ts'
import { detailLabel, forceLabel, heightLabel, shapeLabel } from '../../../shared/drawing/labels.ts'
import type { Scene } from '../../../shared/drawing/scene.ts'
import { sectionScene } from '../../../shared/drawing/section-scene.ts'

const square: [number, number][] = [
  [-100, -150],
  [100, -150],
  [100, 150],
  [-100, 150],
]

function texts(scene: Scene): string[] {
  return scene.marks.flatMap((mark) => (mark.kind === 'text' ? [mark.text] : []))
}

describe('a section', () => {
  it('is drawn to scale, deep side up, with its dimensions', () => {
    const scene = sectionScene([square], 300, 200, 'SI')
    const rings = scene.marks.find((mark) => mark.kind === 'rings')
    const ring = rings?.kind === 'rings' ? (rings.rings[0] ?? []) : []
    const xs = ring.map(([x]) => x)
    const ys = ring.map(([, y]) => y)
    const ratio = (Math.max(...ys) - Math.min(...ys)) / (Math.max(...xs) - Math.min(...xs))
    expect(ratio).toBeCloseTo(1.5, 9)
    expect(texts(scene)).toEqual(expect.arrayContaining(['300 mm', '200 mm', 'x', 'y']))
  })
})

describe('a base plate', () => {
  const scene = basePlateScene({
    plate: { length: 500, width: 400, thickness: 25 },
    holes: { diameter: 40 },
    positions: [
      [-200, -150],
      [-200, 150],
      [200, -150],
      [200, 150],
    ],
    outline: [square],
    system: 'SI',
  })

  it('has its holes where the rods are, length standing and width lying', () => {
    const plate = scene.marks.find((mark) => mark.kind === 'polyline' && mark.meaning === 'plate')
    const corners = plate?.kind === 'polyline' ? plate.points : []
    const left = Math.min(...corners.map(([x]) => x))
    const across = Math.max(...corners.map(([x]) => x)) - left
    const top = Math.min(...corners.map(([, y]) => y))
    const down = Math.max(...corners.map(([, y]) => y)) - top
    expect(down / across).toBeCloseTo(500 / 400, 9)
    const holes = scene.marks.flatMap((mark) => (mark.kind === 'circle' ? [mark] : []))
    expect(holes).toHaveLength(4)
    for (const hole of holes) {
      expect((hole.radius * 2) / across).toBeCloseTo(40 / 400, 9)
      // 50 mm from either edge of 400 across, 50 mm from either edge of 500 along.
      const edge = Math.min(hole.centre[0] - left, left + across - hole.centre[0]) / across
      expect(edge).toBeCloseTo(50 / 400, 9)
      expect(Math.min(hole.centre[1] - top, top + down - hole.centre[1]) / down).toBeCloseTo(50 / 500, 9)
    }
  })

  it('is dimensioned: plate, spacing of the holes, thickness, bore', () => {
    expect(texts(scene)).toEqual(
      expect.arrayContaining(['500 mm', '400 mm', '300 mm', 'plate 25 mm · 4 holes Ø 40 mm']),
    )
    expect(texts(scene).filter((text) => text === '400 mm')).toHaveLength(2)
  })
})

describe('lengths on a drawing', () => {
  // 1 in = 25.4 mm and 1 lbf = 4.4482216152605 N by definition of the international units.
  it.each([
    [304.8, '1′-0″'],
    [1981.2, '6′-6″'],
    [3060.7, '10′-0 1/2″'],
    [4114.8 + 1.5875, '13′-6 1/16″'],
    [3657.5, '12′-0″'],
  ])('%f mm of height is %s', (mm, label) => expect(heightLabel(mm, 'US')).toBe(label))

  it.each([
    [4000, '4.00 m'],
    [3255, '3.255 m'],
    [3250, '3.25 m'],
  ])('%f mm of height is %s', (mm, label) => expect(heightLabel(mm, 'SI')).toBe(label))

  it('gives plates in sixteenths, shapes in decimals, forces in kN or kip', () => {
    expect(detailLabel(19.05, 'US')).toBe('3/4″')
    expect(detailLabel(406.4, 'US')).toBe('16″')
    expect(shapeLabel(253, 'US')).toBe('9.96″')
    expect(forceLabel(1_250_000, 'SI')).toBe('1\u00a0250\u00a0kN')
    expect(forceLabel(444_822.16, 'US')).toBe('100\u00a0kip')
  })
})
