import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { criticalLoad } from '../../shared/stability/critical-load.ts'

/*
 * Source: slope–deflection with stability functions (Livesley and Chandler; Timoshenko and Gere, chapter 2): the rotational
 * stiffness of a part under axial force whose far end is pinned, over EI/l, with u = l·√(P/EI). Exact, so it checks the beam
 * elements for any position of a brace. Tolerance 0.1 % of the length.
 */
const pinnedFar = (u: number): number => (u ** 2 * Math.sin(u)) / (Math.sin(u) - u * Math.cos(u))
/** First pole of `pinnedFar`: tan u = u. */
const POLE = 4.493409457909064

/** Root of a falling function. */
function root(of: (k: number) => number, low: number, high: number): number {
  for (let turn = 0; turn < 200; turn++) {
    const middle = (low + high) / 2
    if (of(middle) > 0) low = middle
    else high = middle
  }
  return low
}

const pin = { holdsTranslation: true, rotation: 0 }
const free = { holdsTranslation: false, rotation: 0 }
const height = fc.double({ min: 1500, max: 30_000, noNaN: true })
const share = fc.double({ min: 0.02, max: 0.98, noNaN: true })

describe('a brace anywhere', () => {
  it('between two pins', () => {
    fc.assert(
      fc.property(height, share, (H, at) => {
        const [a, b] = [H * at, H * (1 - at)]
        const long = Math.max(a, b)
        const k = root(
          (k) => pinnedFar(k * a) / a + pinnedFar(k * b) / b,
          Math.PI / long,
          Math.min((POLE - 1e-9) / long, Math.PI / Math.min(a, b)),
        )
        const { length } = criticalLoad({ height: H, bottom: pin, top: pin, braceHeights: [a] })
        expect(Math.abs(length / (Math.PI / k) - 1)).toBeLessThan(0.001)
      }),
    )
  })

  it('below a free top: the part above turns the part below over', () => {
    fc.assert(
      fc.property(height, share, (H, at) => {
        const [a, b] = [H * at, H * (1 - at)]
        const k = root(
          (k) => pinnedFar(k * a) / a - k * Math.tan(k * b),
          1e-9,
          Math.min(Math.PI / a, (Math.PI / 2 - 1e-9) / b),
        )
        const { length } = criticalLoad({ height: H, bottom: pin, top: free, braceHeights: [a] })
        expect(Math.abs(length / (Math.PI / k) - 1)).toBeLessThan(0.001)
      }),
    )
  })

  it('on a base that turns on a spring: tan u = u / (1 + u²/c)', () => {
    fc.assert(
      fc.property(height, fc.double({ min: 0.01, max: 1000, noNaN: true }), (H, c) => {
        const u = root((u) => pinnedFar(u) + c, Math.PI, POLE - 1e-12)
        const bottom = { holdsTranslation: true, rotation: c / H }
        const { length } = criticalLoad({ height: H, bottom, top: pin, braceHeights: [] })
        expect(Math.abs((length * u) / (Math.PI * H) - 1)).toBeLessThan(0.001)
      }),
    )
  })
})
