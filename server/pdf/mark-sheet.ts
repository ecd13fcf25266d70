import type { QuoteLineDto } from '../../shared/contracts/quotes.ts'
import { basePlateScene } from '../../shared/drawing/base-plate-scene.ts'
import type { ColumnDrawing } from '../../shared/drawing/column-drawing.ts'
import { columnScene } from '../../shared/drawing/column-scene.ts'
import { describeBasePlate, describeColumn, describeSection } from '../../shared/drawing/describe-column.ts'
import { columnLegend } from '../../shared/drawing/legend.ts'
import { sectionScene } from '../../shared/drawing/section-scene.ts'
import type { UnitSystem } from '../../shared/units/step.ts'
import { drawScene } from './draw-scene.ts'
import { factColumns } from './fact-columns.ts'
import { makeFacts } from './make-facts.ts'
import { requirementFacts } from './requirement-facts.ts'
import type { Sheet } from './sheet.ts'

/** Drawn at this part of its size, the elevation's texts are 8 points. */
const SCALE = 0.8
const ELEVATION = { width: 350, height: 520 }
/** Height of A4 in points; on a lower sheet the drawings give way to what has to be read below them. */
const A4 = 842
const DRAWN = A4 / 2

/** A mark on a page of its own: drawing, section, base plate, how it is made, and what was asked. */
export function markSheet(
  sheet: Sheet,
  line: QuoteLineDto,
  pieceMass: number | undefined,
  system: UnitSystem,
): void {
  sheet.newPage()
  const pieces = line.spec.quantity === 1 ? '1 piece' : `${line.spec.quantity} pieces`
  sheet.heading(`${line.mark}, ${pieces}`)
  drawings(sheet, line, system)
  factColumns(sheet, makeFacts(line, pieceMass, system), 'How it is made')
  sheet.down(8)
  factColumns(sheet, requirementFacts(line.requirement, system), 'What was asked')
}

function drawings(sheet: Sheet, line: QuoteLineDto, system: UnitSystem): void {
  const top = sheet.y
  const fit = 1 - (A4 - sheet.doc.page.height) / DRAWN
  const scale = SCALE * fit
  const drawing = columnDrawing(line, system)
  let bottom = top
  const right = sheet.left + ELEVATION.width * SCALE + 16
  if (drawing) {
    const scene = columnScene({ ...drawing, sheet: { ...ELEVATION, height: ELEVATION.height * fit } })
    drawScene(sheet, scene, { x: sheet.left, y: top, scale: SCALE }, describeColumn(drawing))
    const legend = `${columnLegend(drawing, scene.layout).join('; ')}.`
    const y = top + scene.height * SCALE + 2
    sheet.tag('Caption', () => sheet.put('label', legend, { y, width: ELEVATION.width * SCALE }))
    bottom = sheet.y
  }
  const x = drawing ? right : sheet.left
  const section = sectionScene(line.outline, line.depth, line.width, system)
  const words = describeSection(line.spec.section, line.depth, line.width, system)
  const caption = (text: string, y: number) =>
    sheet.tag('Caption', () => sheet.put('subheading', text, { x, y, width: sheet.right - x }))
  caption('Section', top)
  drawScene(sheet, section, { x, y: top + 14, scale }, words)
  let y = top + 14 + section.height * scale + 14
  const { base } = line
  if (base) {
    const plate = {
      plate: base.plate,
      holes: base.holes,
      positions: base.rods.positions,
      outline: line.outline,
      system,
    }
    const scene = basePlateScene(plate)
    caption('Base plate', y)
    drawScene(sheet, scene, { x, y: y + 14, scale: scale * 0.95 }, describeBasePlate(plate))
    y += 14 + scene.height * scale * 0.95
  }
  sheet.moveTo(Math.max(bottom, y) + 10)
}

/** The elevation needs a height and ends; a request by effective lengths alone has none. */
function columnDrawing(line: QuoteLineDto, system: UnitSystem): ColumnDrawing | undefined {
  const { height, ends, braces } = line.requirement
  if (height === undefined || !ends) return undefined
  const { strong, weak } = line.check.lengths
  const required = Number(line.check.values.required ?? 0)
  return {
    height,
    ends,
    braces,
    lengths: { strong, weak },
    depth: line.depth,
    width: line.width,
    compression: required > 0 ? required : undefined,
    uplift: required < 0 ? -required : undefined,
    system,
  }
}
