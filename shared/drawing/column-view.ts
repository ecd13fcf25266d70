import type { Axis, EffectiveLength, Segment } from '../stability/column.ts'
import { braceMarks } from './brace-marks.ts'
import { holdsAxis, type ColumnDrawing } from './column-drawing.ts'
import type { ColumnLayout } from './column-layout.ts'
import { standingLine } from './dimension.ts'
import { computedLengthLabel } from './labels.ts'
import { circle, line, polyline, words, type Mark } from './scene.ts'
import { breakHeight, shaftMarks } from './shaft.ts'
import { footSign, headSign } from './supports.ts'

/** Largest bow of the buckled form; it shows the mode, not a movement. */
const BOW = 0.11
/** Room that the two lines of a segment's text, or one, need. */
const TWO_LINES = 30
const ONE_LINE = 13

/** One axis of the column: plumb line, shaft, ends, braces, buckled form, lengths and title. */
export function viewMarks(axis: Axis, drawing: ColumnDrawing, layout: ColumnLayout): Mark[] {
  const view = layout.views[axis]
  const ends = drawing.ends[axis]
  const lengths = drawing.lengths?.[axis]
  const parts = lengths?.segments ?? partsOf(axis, drawing)
  return [
    ...plumbLine(view.x, layout),
    ...(lengths && lengths.shape.length > 1 ? [buckledForm(lengths, view.x, layout)] : []),
    ...shaftMarks(layout, view, breakHeight(parts)),
    ...footSign(ends.bottom, [view.x, layout.foot], view.halfShaft),
    ...headSign(ends.top, [view.x, layout.head], view.halfShaft),
    ...braceMarks(axis, drawing, layout),
    ...(lengths ? segmentLengths(lengths, view, layout, drawing) : []),
    ...titles(axis, drawing, layout),
  ]
}

/** The parts between ends and braces when nothing has been computed yet. */
function partsOf(axis: Axis, { height, braces }: ColumnDrawing): Pick<Segment, 'from' | 'to'>[] {
  const heights = braces.filter((brace) => holdsAxis(brace, axis)).map((brace) => brace.height)
  const levels = [0, ...heights.toSorted((a, b) => a - b), height]
  return levels.slice(1).map((to, index) => ({ from: levels[index] ?? 0, to }))
}

/** The axis of the column is a plumb line: down through the foot, to a bob. */
function plumbLine(x: number, { head, foot }: ColumnLayout): Mark[] {
  const bob = foot + 44
  return [
    line('plumb', [x, head - 8], [x, bob - 10]),
    circle('plumb', [x, bob - 8.5], 1.5),
    polyline(
      'bob',
      [
        [x - 3.5, bob - 7],
        [x + 3.5, bob - 7],
        [x + 3.5, bob - 2],
        [x, bob + 7],
        [x - 3.5, bob - 2],
      ],
      true,
    ),
  ]
}

function buckledForm(lengths: EffectiveLength, x: number, layout: ColumnLayout): Mark {
  const bow = layout.width * BOW * 0.5
  return polyline(
    'buckled',
    lengths.shape.map(([height, sway]) => [x + sway * bow, layout.foot - height * layout.scale]),
  )
}

function segmentLengths(
  { segments }: EffectiveLength,
  { x, halfShaft, dimension }: ColumnLayout['views'][Axis],
  { foot, scale }: ColumnLayout,
  { system, height }: ColumnDrawing,
): Mark[] {
  return segments.flatMap((part) => {
    const [low, high] = [foot - part.from * scale, foot - part.to * scale]
    const middle = (low + high) / 2
    const room = low - high
    const value = part.kl === null ? 'free part' : computedLengthLabel(part.kl, system)
    const factor = part.k === null ? 'no K' : `K ${part.k.toFixed(2)}`
    const texts: Mark[] = []
    if (room >= TWO_LINES) {
      texts.push(words('note', [dimension + 7, middle - 7], factor, { size: 10 }))
      texts.push(words('value', [dimension + 7, middle + 6], value))
    } else if (room >= ONE_LINE) {
      texts.push(words('value', [dimension + 7, middle], value))
    }
    const edges = [part.from, part.to].map((at) => ({ at, y: foot - at * scale }))
    const inner = edges.filter(({ at }) => at > 0 && at < height)
    return [
      ...inner.map(({ y }) => line('witness', [x + halfShaft + 4, y], [dimension + 5, y])),
      ...standingLine(dimension, low, high),
      ...texts,
    ]
  })
}

function titles(
  axis: Axis,
  { lengths, system }: ColumnDrawing,
  { foot, views, compact }: ColumnLayout,
): Mark[] {
  const { x } = views[axis]
  const length = lengths?.[axis]
  const name = axis === 'strong' ? 'Strong axis' : 'Weak axis'
  const by = length?.governedBy === 'eigenvalue' ? 'by eigenvalue' : 'by segments'
  return [
    words('title', [x, foot + 66], name, { anchor: 'middle', size: 12 }),
    ...(length
      ? [
          words('note', [x, foot + 82], `Lc ${computedLengthLabel(length.used, system)} ${by}`, {
            anchor: 'middle',
            size: compact ? 10 : 11,
          }),
        ]
      : []),
  ]
}
