import type { Column } from '../../../shared/stability/column.ts'
import { solveColumn, type ColumnSolution } from '../../../shared/stability/column-lengths.ts'
import { validateColumn } from '../../../shared/stability/validate-column.ts'
import type { Issue } from '../../../shared/units/refusal.ts'
import type { LineDraft } from './line-draft.ts'

export function columnOf(line: LineDraft): Column | undefined {
  if (line.height === undefined) return undefined
  return { height: line.height, ends: line.ends, braces: line.braces, endFixity: line.endFixity }
}

function isLoaded({ loads, kept }: LineDraft): boolean {
  return kept.required !== undefined || Object.values(loads).some((load) => load !== undefined && load !== 0)
}

/** What a shape cannot be found without; the desk asks for nothing else. */
export function missingOf(line: LineDraft): Issue[] {
  const issues: Issue[] = []
  if (line.mark.trim() === '') issues.push({ path: 'mark', message: 'a name for the column, such as A1' })
  if (!line.quantity || !Number.isInteger(line.quantity)) {
    issues.push({ path: 'quantity', message: 'how many of it, a whole number from 1' })
  }
  if (line.height === undefined) {
    issues.push({
      path: 'height',
      message: 'the height, from under the base plate to the top of the cap plate',
    })
  }
  if (!isLoaded(line)) issues.push({ path: 'loads.dead', message: 'at least one load' })
  return issues
}

/** What the geometry cannot be taken with; found here at once, by the same rules as on the server. */
export function geometryIssues(line: LineDraft): Issue[] {
  const column = columnOf(line)
  return column ? validateColumn(column) : []
}

/** Lengths for the drawing while it is being changed; they need no shape. */
export function solutionOf(line: LineDraft): ColumnSolution | undefined {
  const column = columnOf(line)
  return column && validateColumn(column).length === 0 ? solveColumn(column) : undefined
}
