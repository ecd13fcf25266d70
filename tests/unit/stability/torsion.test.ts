import { describe, expect, it } from 'vitest'
import type { Brace, Column, Ends } from '../../../shared/stability/column.ts'
import { torsionLength } from '../../../shared/stability/torsion.ts'

const PINNED: Ends = { bottom: 'pinned', top: 'pinned' }
const CANTILEVER: Ends = { bottom: 'fixed', top: 'free' }

function column(ends: Ends, braces: Brace[]): Column {
  return { height: 6000, ends: { strong: ends, weak: ends }, braces, endFixity: 'recommended' }
}
function brace(height: number, stopsTwist: boolean): Brace {
  return { height, holds: 'weak', stopsTwist }
}

describe('the torsional length', () => {
  it('runs from end to end past braces that stop translation alone', () => {
    expect(torsionLength(column(PINNED, [brace(2000, false)])).used).toBe(6000)
  })

  it('is the largest part between points that stop twist', () => {
    const found = torsionLength(column(PINNED, [brace(2000, true), brace(3000, false)]))
    expect(found.used).toBe(4000)
    expect(found.segments).toEqual([
      { from: 0, to: 2000, length: 2000 },
      { from: 2000, to: 6000, length: 4000 },
    ])
  })

  it('is twice the height of a column whose top is free', () => {
    expect(torsionLength(column(CANTILEVER, [])).used).toBe(12_000)
    expect(torsionLength(column(CANTILEVER, [brace(2000, false)])).used).toBe(12_000)
  })

  it('counts a top that is free about one axis alone as free to turn', () => {
    const found = torsionLength({ ...column(PINNED, []), ends: { strong: PINNED, weak: CANTILEVER } })
    expect(found.used).toBe(12_000)
  })

  it('of a free part above a twist stop counts twice, or more where warping runs through', () => {
    const { used, segments } = torsionLength(column(CANTILEVER, [brace(3000, true)]))
    expect(segments.at(-1)).toEqual({ from: 3000, to: 6000, length: 6000 })
    // The equation is that of bending: braced at half height, K of the whole is 1.25505 with a rigid foot.
    expect(used / 6000).toBeCloseTo(1.25505, 3)
  })
})
