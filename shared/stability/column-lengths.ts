import type { Axis, Column, EffectiveLength } from './column.ts'
import { solveLength, withStiffness, type LengthSolution } from './effective-length.ts'
import { torsionLength, type TorsionLength } from './torsion.ts'

export interface ColumnLengths {
  strong: EffectiveLength
  weak: EffectiveLength
  torsion: TorsionLength
}

/** Lengths of a column of any shape; solve once, then give each shape its stiffness with `lengthsWithStiffness`. */
export interface ColumnSolution {
  strong: LengthSolution
  weak: LengthSolution
  torsion: TorsionLength
}

/** Heights of the braces that hold one axis, mm, lowest first. */
export function braceHeightsOf(column: Column, axis: Axis): number[] {
  return column.braces
    .filter((brace) => brace.holds === axis || brace.holds === 'both')
    .map((brace) => brace.height)
    .sort((a, b) => a - b)
}

/** Both methods about both axes and the torsional length, for a column that `validateColumn` has found nothing against. */
export function solveColumn(column: Column): ColumnSolution {
  const about = (axis: Axis) =>
    solveLength({
      height: column.height,
      ends: column.ends[axis],
      braceHeights: braceHeightsOf(column, axis),
      endFixity: column.endFixity,
    })
  return { strong: about('strong'), weak: about('weak'), torsion: torsionLength(column) }
}

/** EI about each axis in N·mm². */
export function lengthsWithStiffness(
  solution: ColumnSolution,
  EIstrong: number,
  EIweak: number,
): ColumnLengths {
  return {
    strong: withStiffness(solution.strong, EIstrong),
    weak: withStiffness(solution.weak, EIweak),
    torsion: solution.torsion,
  }
}

/** Effective lengths of a column with bending stiffness EI about each axis, N·mm². */
export function columnLengths(column: Column, EIstrong: number, EIweak: number): ColumnLengths {
  return lengthsWithStiffness(solveColumn(column), EIstrong, EIweak)
}
