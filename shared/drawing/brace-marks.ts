import type { Axis, Brace } from '../stability/column.ts'
import { holdsAxis, type ColumnDrawing } from './column-drawing.ts'
import type { ColumnLayout } from './column-layout.ts'
import { heightLabel } from './labels.ts'
import { circle, line, words, type Mark } from './scene.ts'

/** How far a tick reaches out of the shaft. */
export const REACH = 15
const DOUBLE = 2
/** Where labels end, so that a handle on the tick does not cover them. */
const LABEL = 10
/** Height of one line of a label, and of both. */
const LINE = 12
const BOTH_LINES = 27

/** The braces that hold an axis, in its view. */
export function braceMarks(axis: Axis, drawing: ColumnDrawing, layout: ColumnLayout): Mark[] {
  const view = layout.views[axis]
  const y = (brace: Brace) => layout.foot - brace.height * layout.scale
  const shown = drawing.braces
    .map((brace, index) => ({ brace, y: y(brace), name: `brace ${index + 1}` }))
    .filter(({ brace }) => holdsAxis(brace, axis))
    .toSorted((a, b) => b.y - a.y)
  const end = view.x - view.halfShaft - REACH - LABEL
  let last = Infinity
  const labels = shown.flatMap((at, index): Mark[] => {
    const alone = [shown[index - 1], shown[index + 1]].every(
      (other) => !other || Math.abs(other.y - at.y) > BOTH_LINES,
    )
    const value = heightLabel(at.brace.height, drawing.system)
    if (alone && !layout.compact) {
      last = at.y - LINE / 2
      return [
        words('value', [end, at.y - 7], value, { anchor: 'end' }),
        words('note', [end, at.y + 6], at.name, { anchor: 'end', size: 10 }),
      ]
    }
    // Braces close to each other keep one line each, moved up as far as needed to be read.
    last = Math.min(at.y, last - LINE)
    return [words('value', [end, last], value, { anchor: 'end', size: layout.compact ? 10 : 11 })]
  })
  return [...shown.flatMap((at) => tick(at.brace, at.y, view)), ...labels]
}

/** A tick from the left into the shaft, ending on a pin; a double tick also stops twist. */
function tick(brace: Brace, y: number, { x, halfShaft }: { x: number; halfShaft: number }): Mark[] {
  const out = x - halfShaft - REACH
  const strokes = brace.stopsTwist ? [y - DOUBLE, y + DOUBLE] : [y]
  return [
    ...strokes.map((at) => line('brace', [out, at], [x, at])),
    line('brace', [out, y - 6], [out, y + 6]),
    circle('brace', [x, y], 2.5),
  ]
}
