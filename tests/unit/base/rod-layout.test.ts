import { describe, expect, it } from 'vitest'
import { catalogue } from '../../../seeds/reference/catalogue.ts'
import { layOutRods, leastPlate, upToModule } from '../../../shared/base/rod-layout.ts'
import { rodRoom } from '../../../shared/base/rods.ts'
import { outlineOf } from '../../../shared/sections/outline.ts'
import type { Section } from '../../../shared/sections/section.ts'
import { sectionCalled } from '../../support/base-input.ts'

const ROD = 19.05
const LEG = 5
type Place = readonly [number, number]

/** Distance from a place (along the depth, along the width) to the drawn outline, by its edges. */
function distance([along, across]: Place, section: Section): number {
  const ring = outlineOf(section)[0] ?? []
  return Math.min(
    ...ring.map(([x1, y1], index) => {
      const [x2, y2] = ring[(index + 1) % ring.length] ?? [x1, y1]
      const [dx, dy] = [x2 - x1, y2 - y1]
      const part = ((across - x1) * dx + (along - y1) * dy) / (dx * dx + dy * dy || 1)
      const at = Math.min(1, Math.max(0, part))
      return Math.hypot(across - x1 - at * dx, along - y1 - at * dy)
    }),
  )
}

/** Whether washers lie on the plate beside the weld, and holes within it. */
function hasRoom(section: Section, plate: { length: number; width: number }, places: readonly Place[] = []) {
  const { washer, hole } = rodRoom(ROD)
  const edge = Math.max(washer, hole) / 2 - 1e-6
  return places.every(
    ([along, across]) =>
      distance([along, across], section) >= washer / 2 + LEG &&
      plate.length / 2 - Math.abs(along) >= edge &&
      plate.width / 2 - Math.abs(across) >= edge,
  )
}

describe('rods in a plate', () => {
  it('have room for washer and wrench on the least plate of every shape', () => {
    for (const section of catalogue.sections) {
      const { length, width } = leastPlate(section, ROD, LEG, 2)
      const plate = { length: upToModule(length), width: upToModule(width) }
      const places = layOutRods(section, plate, { count: 4, diameter: ROD }, LEG)
      expect(places).toHaveLength(4)
      expect(hasRoom(section, plate, places), section.designation).toBe(true)
    }
  })

  it.each(['HSS6X6X3/8', 'PIPE6STD'])('stand at the corners of a square plate under %s', (name) => {
    const section = sectionCalled(name)
    const plate = { length: 11 * 25.4, width: 11 * 25.4 }
    const places = layOutRods(section, plate, { count: 4, diameter: ROD }, LEG)
    expect(new Set(places?.map(([along]) => Math.abs(along)))).toHaveLength(1)
    expect(places?.map(([along, across]) => [Math.sign(along), Math.sign(across)])).toEqual([
      [-1, -1],
      [-1, 1],
      [1, -1],
      [1, 1],
    ])
    expect(hasRoom(section, plate, places), section.designation).toBe(true)
  })

  it('stand between the flanges, beside the web, where a plate is hardly larger than an I', () => {
    const section = sectionCalled('W14X90')
    const plate = { length: 370, width: 380 }
    const places = layOutRods(section, plate, { count: 4, diameter: ROD }, LEG)
    expect(places).toHaveLength(4)
    for (const [along] of places ?? []) expect(Math.abs(along)).toBeLessThan(section.depth / 2)
    expect(hasRoom(section, plate, places), section.designation).toBe(true)
  })

  it.each([
    ['a hollow shape fills its plate', 'HSS6X6X3/8', { length: 200, width: 200 }, 4],
    ['they would stand on each other', 'W10X49', { length: 420, width: 260 }, 12],
    ['one row would stand on the web', 'W14X90', { length: 370, width: 380 }, 6],
  ])('have no room where %s', (_why, name, plate, count) => {
    expect(layOutRods(sectionCalled(name), plate, { count, diameter: ROD }, LEG)).toBeUndefined()
  })

  it.each([4, 5, 6, 8, 12])(
    'are as many as asked: %d, washers apart, on the plate made for them',
    (count) => {
      const section = sectionCalled('W12X65')
      const plate = leastPlate(section, ROD, LEG, Math.ceil(count / 2))
      const places = layOutRods(section, plate, { count, diameter: ROD }, LEG) ?? []
      expect(places).toHaveLength(count)
      const apart = places.flatMap(([x, y], i) =>
        places.slice(i + 1).map(([u, v]) => Math.hypot(x - u, y - v)),
      )
      expect(Math.min(...apart)).toBeGreaterThanOrEqual(rodRoom(ROD).washer)
    },
  )
})
