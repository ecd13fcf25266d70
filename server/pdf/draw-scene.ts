import type { Mark, Meaning, Point, Scene, TextMark } from '../../shared/drawing/scene.ts'
import type { Sheet } from './sheet.ts'
import { INK, useFace } from './type-style.ts'

interface Pen {
  colour: string
  width: number
  dash?: [number, number]
  fill?: string
}

/** How a mark looks on paper, by what it means; the page has the same table as style sheet rules. */
const PENS: Record<Meaning, Pen> = {
  axis: { colour: INK.faint, width: 0.5, dash: [8, 3] },
  shaft: { colour: INK.ink, width: 1 },
  outline: { colour: INK.ink, width: 1, fill: INK.cut },
  break: { colour: INK.ink, width: 0.7 },
  support: { colour: INK.ink, width: 0.9, fill: INK.sheet },
  hatch: { colour: INK.faint, width: 0.5 },
  brace: { colour: INK.ink, width: 1.2, fill: INK.sheet },
  load: { colour: INK.ink, width: 1.1, fill: INK.ink },
  uplift: { colour: INK.ink, width: 1.1, fill: INK.ink },
  buckled: { colour: INK.hair, width: 0.9, dash: [3.5, 2.5] },
  dimension: { colour: INK.oxide, width: 0.6 },
  witness: { colour: INK.hair, width: 0.4 },
  plumb: { colour: INK.oxide, width: 0.6 },
  bob: { colour: INK.oxide, width: 0.5, fill: INK.oxide },
  plate: { colour: INK.ink, width: 1 },
  hole: { colour: INK.ink, width: 0.8, fill: INK.sheet },
  centre: { colour: INK.faint, width: 0.4 },
}

/** Draws a scene with its left top corner at `x`, `y`, as a figure with its description. */
export function drawScene(
  sheet: Sheet,
  scene: Scene,
  at: { x: number; y: number; scale: number },
  alt: string,
): void {
  const { doc } = sheet
  sheet.tag(
    'Figure',
    () => {
      doc.save()
      doc.translate(at.x, at.y).scale(at.scale)
      for (const mark of scene.marks) draw(doc, mark)
      doc.restore()
    },
    { alt },
  )
}

function trace(doc: PDFKit.PDFDocument, points: Point[], closed: boolean): void {
  points.forEach(([x, y], index) => (index === 0 ? doc.moveTo(x, y) : doc.lineTo(x, y)))
  if (closed) doc.closePath()
}

function draw(doc: PDFKit.PDFDocument, mark: Mark): void {
  if (mark.kind === 'text') {
    drawText(doc, mark)
    return
  }
  const { colour, width, dash, fill } = PENS[mark.meaning]
  doc.lineWidth(width).strokeColor(colour)
  if (dash) doc.dash(dash[0], { space: dash[1] })
  const open = mark.kind === 'polyline' && !mark.closed
  if (mark.kind === 'polyline') trace(doc, mark.points, mark.closed)
  else if (mark.kind === 'circle') doc.circle(mark.centre[0], mark.centre[1], mark.radius)
  else mark.rings.forEach((ring) => trace(doc, ring, true))
  if (fill && !open) doc.fillAndStroke(fill, colour, 'even-odd')
  else doc.stroke()
  if (dash) doc.undash()
}

/** Archivo's capitals stand 0.69 of the size high: half of that below its middle is the base line. */
const HALF_CAPITAL = 0.345

function drawText(
  doc: PDFKit.PDFDocument,
  { at: [x, y], text, anchor, size, turn, meaning }: TextMark,
): void {
  const colour = meaning === 'note' || meaning === 'axis-letter' ? INK.faint : INK.ink
  useFace(doc, size, colour, meaning === 'title')
  const width = doc.widthOfString(text)
  const left = { start: x, middle: x - width / 2, end: x - width }[anchor]
  doc.save()
  if (turn !== 0) doc.rotate(turn, { origin: [x, y] })
  // The paper shows through behind the letters, so that no line crosses them.
  doc.rect(left - 1.5, y - size * 0.5, width + 3, size).fill(INK.sheet)
  doc
    .fillColor(colour)
    .text(text, left, y + size * HALF_CAPITAL, { lineBreak: false, baseline: 'alphabetic' })
  doc.restore()
}
