import { describe, expect, it } from 'vitest'
import type { ColumnDrawing } from '../../../shared/drawing/column-drawing.ts'
import { braceInWords, describeBasePlate, describeColumn } from '../../../shared/drawing/describe-column.ts'
import { columnCheck, HEIGHT } from '../../support/check-fixture.ts'

/** Numbers and units are bound by spaces that do not break; here they are only spaces. */
function readable(drawing: ColumnDrawing): string {
  return describeColumn(drawing).replaceAll('\u00a0', ' ')
}

describe('a column in words', () => {
  it('says what the drawing shows', () => {
    const { strong, weak } = columnCheck.lengths
    const text = readable({
      height: HEIGHT,
      ends: { strong: { bottom: 'fixed', top: 'guided' }, weak: { bottom: 'pinned', top: 'pinned' } },
      braces: [{ height: 2200, holds: 'weak', stopsTwist: false }],
      lengths: { strong, weak: { ...weak, governedBy: 'eigenvalue' } },
      compression: 1_250_000,
      uplift: 40_000,
      system: 'SI',
    })
    for (const said of [
      '6.40 m high',
      'Strong axis: foot fixed, head guided (it may move sideways but not turn). Weak axis: foot pinned, head pinned.',
      'Brace 1 at 2.20 m holds the weak axis only; twist is free.',
      '1 250 kN of compression',
      'lifted by 40 kN',
      'Strong axis: effective length 5.12 m, the segment method governs; 0.00 m to 6.40 m K 0.80, K·L 5.12 m.',
      'Weak axis: effective length 4.20 m, the eigenvalue method governs',
    ]) {
      expect(text).toContain(said)
    }
  })

  it('says so when there is no brace', () => {
    const ends = { bottom: 'pinned', top: 'pinned' } as const
    const text = describeColumn({
      height: 4000,
      ends: { strong: ends, weak: ends },
      braces: [],
      system: 'US',
    })
    expect(text).toBe(
      'Column 13′-1 1/2″ high, seen about both axes. Foot pinned and head pinned about both axes. ' +
        'No braces between the ends.',
    )
  })

  it('tells a brace that stops twist from one that does not', () => {
    expect(braceInWords({ height: 3200, holds: 'both', stopsTwist: true }, 1, 'SI')).toBe(
      'Brace 2 at 3.20 m holds both axes; it stops twist.',
    )
  })

  it('gives the place of every hole of a base plate', () => {
    const text = describeBasePlate({
      plate: { length: 400, width: 380, thickness: 25 },
      holes: { diameter: 27 },
      positions: [
        [-150, 0],
        [150, 0],
      ],
      outline: [],
      system: 'SI',
    })
    expect(text).toContain('2 holes of diameter 27 mm, from the centre: -150 mm along and 0 mm across')
  })
})
