import type { Axis } from '../stability/column.ts'
import { REACH } from './brace-marks.ts'
import type { ColumnDrawing } from './column-drawing.ts'
import type { ColumnLayout } from './column-layout.ts'

/** A place on the drawing, percent of its width from the left and of its height from the top. */
export interface Anchor {
  x: number
  y: number
}

export interface ColumnAnchors {
  height: Anchor
  load: Anchor
  bottom: Record<Axis, Anchor>
  top: Record<Axis, Anchor>
  /** In the order of the braces; a brace has a place in each view whose axis it holds. */
  braces: Partial<Record<Axis, Anchor>>[]
}

export function columnAnchors({ height, braces }: ColumnDrawing, layout: ColumnLayout): ColumnAnchors {
  const { views, foot, head, scale } = layout
  const place = (x: number, y: number): Anchor => ({
    x: (x / layout.width) * 100,
    y: (y / layout.height) * 100,
  })
  const inViews = (y: number) => ({ strong: place(views.strong.x, y), weak: place(views.weak.x, y) })
  return {
    height: place(layout.overall, foot - (height / 2) * scale),
    load: place((views.strong.x + views.weak.x) / 2, 22),
    bottom: inViews(foot),
    top: inViews(head),
    braces: braces.map((brace) => {
      const at = (axis: Axis) =>
        place(views[axis].x - views[axis].halfShaft - REACH, foot - brace.height * scale)
      if (brace.holds === 'both') return { strong: at('strong'), weak: at('weak') }
      return { [brace.holds]: at(brace.holds) }
    }),
  }
}
