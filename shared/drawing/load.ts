import type { ColumnDrawing } from './column-drawing.ts'
import type { ColumnLayout } from './column-layout.ts'
import { forceLabel } from './labels.ts'
import { line, polyline, words, type Mark, type Point } from './scene.ts'

function arrow(meaning: 'load' | 'uplift', from: Point, to: Point): Mark[] {
  const way = Math.sign(to[1] - from[1])
  return [
    line(meaning, from, [to[0], to[1] - way * 6]),
    polyline(meaning, [to, [to[0] - 3.5, to[1] - way * 8], [to[0] + 3.5, to[1] - way * 8]], true),
  ]
}

/** The compression that comes down on each view and, beside it, the net uplift. */
export function loadMarks(drawing: ColumnDrawing, layout: ColumnLayout): Mark[] {
  const marks: Mark[] = []
  for (const axis of ['strong', 'weak'] as const) {
    const { x } = layout.views[axis]
    const sign = drawing.ends[axis].top === 'guided' ? 14 : 2
    const tip = layout.head - sign
    marks.push(...arrow('load', [x, 20], [x, tip]))
    if (drawing.uplift) marks.push(...arrow('uplift', [x + 12, tip], [x + 12, 24]))
  }
  const { strong, weak } = layout.views
  if (drawing.compression) {
    marks.push(
      words('value', [strong.x - 7, 26], forceLabel(drawing.compression, drawing.system), { anchor: 'end' }),
    )
  }
  if (drawing.uplift) {
    const text = `${forceLabel(drawing.uplift, drawing.system)} up`
    marks.push(words('value', [weak.x + 20, 26], text))
  }
  return marks
}
