import { columnAnchors, type ColumnAnchors } from './column-anchors.ts'
import type { ColumnDrawing } from './column-drawing.ts'
import { layoutColumn, type ColumnLayout } from './column-layout.ts'
import { viewMarks } from './column-view.ts'
import { standingDimension } from './dimension.ts'
import { heightLabel } from './labels.ts'
import { loadMarks } from './load.ts'
import { line, type Mark, type Scene } from './scene.ts'

export interface ColumnScene extends Scene {
  /** Where inputs and handles belong, percent of the scene's width and height. */
  anchors: ColumnAnchors
  layout: ColumnLayout
}

export const COLUMN_SHEET = { width: 440, height: 640 }
/** Slenderness of the shaft drawn while there is no section: a neutral stick. */
const NO_SECTION = 1 / 28

/** The elevation of a column about both axes, side by side, to scale. */
export function columnScene(drawing: ColumnDrawing): ColumnScene {
  const layout = layoutColumn({
    columnHeight: drawing.height,
    depth: drawing.depth ?? drawing.height * NO_SECTION,
    width: drawing.width ?? drawing.height * NO_SECTION,
    sheet: drawing.sheet ?? COLUMN_SHEET,
  })
  const marks: Mark[] = [
    ...overallHeight(drawing, layout),
    ...viewMarks('strong', drawing, layout),
    ...viewMarks('weak', drawing, layout),
    ...loadMarks(drawing, layout),
  ]
  return {
    width: layout.width,
    height: layout.height,
    marks,
    anchors: columnAnchors(drawing, layout),
    layout,
  }
}

function overallHeight(
  { height, system }: ColumnDrawing,
  { overall, head, foot, views }: ColumnLayout,
): Mark[] {
  const until = views.strong.x - views.strong.halfShaft - 5
  return [
    line('witness', [overall - 5, foot], [until, foot]),
    line('witness', [overall - 5, head], [until, head]),
    ...standingDimension(overall, foot, head, heightLabel(height, system), 12),
  ]
}
