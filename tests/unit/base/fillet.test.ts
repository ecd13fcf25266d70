import { describe, expect, it } from 'vitest'
import { filletAvailable, leastLeg } from '../../../shared/base/fillet.ts'

const KIP = 4448.2216152605
const IN = 25.4

describe('fillet welds', () => {
  /* ANSI/AISC 360-22 Table J2.4, metric: to 6 mm, to 13, to 19, over 19; exact at the edges. */
  it.each([
    [3, 3],
    [6, 3],
    [6.1, 5],
    [13, 5],
    [13.1, 6],
    [19, 6],
    [19.05, 8],
    [60, 8],
  ])('a thinner part of %d mm asks for a leg of %d mm', (thinner, leg) => {
    expect(leastLeg(thinner)).toBe(leg)
  })

  /* AISC Manual, Eq. 8-2: φRn = 1.392·D·l and Rn/Ω = 0.928·D·l, kip, D in sixteenths, E70; from memory. 0.1 %. */
  it.each([
    [3, 10],
    [4, 1],
    [5, 44.5],
  ])('%d/16 in over %d in carries what the Manual says', (sixteenths, length) => {
    const leg = (sixteenths / 16) * IN
    expect(filletAvailable(leg, length * IN, 'LRFD') / KIP / (1.392 * sixteenths * length)).toBeCloseTo(1, 3)
    expect(filletAvailable(leg, length * IN, 'ASD') / KIP / (0.928 * sixteenths * length)).toBeCloseTo(1, 3)
  })
})
