import { describe, expect, it } from 'vitest'
import { erectionMoment, POST_WEIGHT, rodRoom } from '../../../shared/base/rods.ts'

describe('anchor rods', () => {
  /* AISC Steel Construction Manual, 14th edition, Table 14-2: holes and least washers, inches; from memory. */
  it.each([
    [0.75, 1 + 5 / 16, 2],
    [0.875, 1 + 9 / 16, 2.5],
    [1, 1 + 13 / 16, 3],
    [1.25, 2 + 1 / 16, 3],
    [1.5, 2 + 5 / 16, 3.5],
    [1.75, 2.75, 4],
    [2, 3.25, 5],
    [2.5, 3.75, 5.5],
  ])('of %d in stand in a hole of %d in under a washer of %d in', (rod, hole, washer) => {
    const room = rodRoom(rod * 25.4)
    expect(room.hole).toBeCloseTo(hole * 25.4, 6)
    expect(room.washer).toBeCloseTo(washer * 25.4, 6)
  })

  it('between sizes take the room of the next larger one', () => {
    expect(rodRoom(20)).toEqual(rodRoom(0.875 * 25.4))
    expect(rodRoom(70).hole).toBeGreaterThan(70)
  })

  /* 29 CFR 1926.755(a)(2): 300 pounds, 18 inches from the extreme outer face. 1 lbf = 4.4482216152605 N. */
  it('are held against 300 lb at 18 in from the face', () => {
    expect(erectionMoment(0)).toBeCloseTo(300 * 4.4482216152605 * 18 * 25.4, 3)
    expect(erectionMoment(400) - erectionMoment(0)).toBeCloseTo(300 * 4.4482216152605 * 200, 3)
  })

  /* 29 CFR 1926.751, definition of a post: 300 pounds or less. */
  it('of a post: 300 lb', () => {
    expect(POST_WEIGHT).toBeCloseTo(300 * 4.4482216152605, 6)
  })
})
