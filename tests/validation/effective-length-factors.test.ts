import { describe, expect, it } from 'vitest'
import { criticalLoad } from '../../shared/stability/critical-load.ts'
import { strutEnds } from '../../shared/stability/end-fixity.ts'
import { K_TABLE, kFactor } from '../../shared/stability/k-table.ts'

/*
 * Source: ANSI/AISC 360-22 Commentary, Table C-A-7.1. Recommended 0.65 (fixed–fixed), 1.2 (fixed–guided) and 2.1
 * (fixed–free) were read in a public document; the other rows are common knowledge of the trade.
 */
describe('AISC 360-22 Table C-A-7.1', () => {
  it.each([
    ['fixed', 'fixed', 0.5, 0.65],
    ['fixed', 'pinned', 0.7, 0.8],
    ['pinned', 'pinned', 1, 1],
    ['fixed', 'guided', 1, 1.2],
    ['fixed', 'free', 2, 2.1],
    ['pinned', 'guided', 2, 2],
  ] as const)(
    '%s–%s: %s theoretical, %s recommended, either way up',
    (one, other, theoretical, recommended) => {
      for (const [a, b] of [
        [one, other],
        [other, one],
      ] as const) {
        expect(kFactor(a, b, 'theoretical')).toBe(theoretical)
        expect(kFactor(a, b, 'recommended')).toBe(recommended)
      }
    },
  )

  it('has no K for pairs that are mechanisms', () => {
    for (const [a, b] of [
      ['pinned', 'free'],
      ['guided', 'guided'],
      ['guided', 'free'],
      ['free', 'free'],
    ] as const) {
      expect(kFactor(a, b, 'recommended')).toBeNull()
    }
  })
})

/*
 * Source: closed forms of the elastic column (Timoshenko and Gere, Theory of Elastic Stability, chapter 2). Fixed–pinned is
 * the root of tan u = u, K = π/4.493409458 = 0.699156. Tolerance 0.1 %, on the unsafe side of which no mesh may lie further.
 */
describe('closed forms', () => {
  it.each([
    ['pinned', 'pinned', 1],
    ['fixed', 'fixed', 0.5],
    ['fixed', 'pinned', Math.PI / 4.493409458],
    ['fixed', 'free', 2],
    ['fixed', 'guided', 1],
    ['pinned', 'guided', 2],
  ] as const)('%s–%s', (bottom, top, k) => {
    const height = 5000
    const ends = strutEnds(height, { bottom, top }, [], 'theoretical')
    const { length } = criticalLoad({ height, ...ends, braceHeights: [] })
    expect(Math.abs(length / (k * height) - 1)).toBeLessThan(0.001)
  })

  it('tabulated theoretical K are these, to the figures printed', () => {
    for (const { ends, theoretical } of K_TABLE) {
      const { length } = criticalLoad({
        height: 1000,
        ...strutEnds(1000, { bottom: ends[0], top: ends[1] }, [], 'theoretical'),
        braceHeights: [],
      })
      expect(Math.abs(length / 1000 - theoretical)).toBeLessThan(0.0015)
    }
  })
})

/*
 * The springs with which a column has just its recommended K. Source: the characteristic equations of the same chapter for
 * elastically restrained ends; 5.27 and 5.46 EI/L and 20 EI/L to the three or two figures in which they are quoted.
 */
describe('springs that recommended K imply', () => {
  it.each([
    [{ bottom: 'fixed', top: 'pinned' }, 5.27, 0.01],
    [{ bottom: 'fixed', top: 'fixed' }, 5.46, 0.01],
    [{ bottom: 'fixed', top: 'free' }, 20, 0.05],
  ] as const)('%o', (ends, quoted, tolerance) => {
    const { bottom } = strutEnds(4000, ends, [], 'recommended')
    expect(Math.abs(bottom.rotation * 4000 - quoted)).toBeLessThan(tolerance)
  })

  it('a fixed end of a braced column has that of its first part', () => {
    const { bottom, top } = strutEnds(9000, { bottom: 'fixed', top: 'fixed' }, [2600, 5200], 'recommended')
    expect(Math.abs(bottom.rotation * 2600 - 5.27)).toBeLessThan(0.01)
    expect(Math.abs(top.rotation * 3800 - 5.27)).toBeLessThan(0.01)
  })

  it('every unbraced pair has its recommended K by the eigenvalue too, within 0.1 %', () => {
    for (const { ends, recommended } of K_TABLE) {
      const strut = strutEnds(4000, { bottom: ends[0], top: ends[1] }, [], 'recommended')
      const { length } = criticalLoad({ height: 4000, ...strut, braceHeights: [] })
      expect(Math.abs(length / 4000 / recommended - 1)).toBeLessThan(0.001)
    }
  })
})
