import type { ColumnDrawing } from './column-drawing.ts'
import type { ColumnLayout } from './column-layout.ts'

/** What the signs of this drawing mean, for under it; only those that occur. */
export function columnLegend(drawing: ColumnDrawing, layout: ColumnLayout): string[] {
  const notes: string[] = []
  if (layout.broken) notes.push('Heights to scale; shaft shown broken, drawn wider than to scale')
  else if (drawing.depth !== undefined) notes.push('To scale')
  if (drawing.lengths) notes.push('dashed: buckled form, its size has no meaning')
  if (drawing.braces.some((brace) => brace.stopsTwist)) notes.push('double tick: brace also stops twist')
  return notes
}
