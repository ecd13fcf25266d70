import type { Segment } from '../stability/column.ts'
import type { ColumnLayout } from './column-layout.ts'
import { line, polyline, type Mark, type Point } from './scene.ts'

/** Half the gap that a break leaves in the shaft. */
const GAP = 4

interface ShaftView {
  x: number
  halfShaft: number
}

/** The zigzag of a break across the shaft. */
function breakLine({ x, halfShaft }: ShaftView, y: number): Mark {
  const half = halfShaft + 4
  const points: Point[] = [
    [x - half, y + 1.5],
    [x - 2.5, y + 0.5],
    [x - 1, y - 3.5],
    [x + 1, y + 3.5],
    [x + 2.5, y - 0.5],
    [x + half, y - 1.5],
  ]
  return polyline('break', points)
}

/** Sheet heights at which the shaft is broken: the middle of the longest part between supports and braces. */
export function breakHeight(segments: readonly Pick<Segment, 'from' | 'to'>[]): number {
  const [first, ...rest] = segments
  if (!first) return 0
  const longest = rest.reduce(
    (best, part) => (part.to - part.from > best.to - best.from ? part : best),
    first,
  )
  // Off the middle, where the dimension's text and the largest bow of the buckled form are.
  return longest.from + (longest.to - longest.from) * 0.28
}

/** The two edges of the shaft, with break lines where it is too slender to be drawn to one scale. */
export function shaftMarks(layout: ColumnLayout, view: ShaftView, brokenAt: number): Mark[] {
  const { x, halfShaft } = view
  const { foot, head } = layout
  const [left, right] = [x - halfShaft, x + halfShaft]
  if (!layout.broken) {
    return [
      polyline(
        'shaft',
        [
          [left, foot],
          [left, head],
          [right, head],
          [right, foot],
        ],
        true,
      ),
    ]
  }
  const y = foot - brokenAt * layout.scale
  const part = (from: number, to: number, end: number) => [
    line('shaft', [left, from], [left, to]),
    line('shaft', [right, from], [right, to]),
    line('shaft', [left, end], [right, end]),
  ]
  return [
    ...part(foot, y + GAP, foot),
    ...part(y - GAP, head, head),
    breakLine(view, y + GAP),
    breakLine(view, y - GAP),
  ]
}
