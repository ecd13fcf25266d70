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

/**
 * The solution of a column of the same form, its every height multiplied by `factor`: ends, braces and their springs all
 * scale with it, so lengths do.
 */
export function scaleSolution({ strong, weak, torsion }: ColumnSolution, factor: number): ColumnSolution {
  const scale = (one: LengthSolution): LengthSolution => ({
    segment: one.segment * factor,
    eigenvalue: one.eigenvalue * factor,
    used: one.used * factor,
    governedBy: one.governedBy,
    segments: one.segments.map(({ from, to, k, kl }) => ({
      from: from * factor,
      to: to * factor,
      k,
      kl: kl === null ? null : kl * factor,
    })),
    shape: one.shape.map(([height, deflection]) => [height * factor, deflection]),
  })
  return {
    strong: scale(strong),
    weak: scale(weak),
    torsion: {
      used: torsion.used * factor,
      segments: torsion.segments.map(({ from, to, length }) => ({
        from: from * factor,
        to: to * factor,
        length: length * factor,
      })),
    },
  }
}
