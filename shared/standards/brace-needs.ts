import { braceHeightsOf } from '../stability/column-lengths.ts'
import type { Axis } from '../stability/column.ts'
import { braceStiffness, braceStrength } from './aisc360/bracing.ts'
import type { PreparedColumn } from './prepare-column.ts'

/** What a brace must give about one axis: ANSI/AISC 360-22 Appendix 6.2, point bracing. */
export interface BraceNeed {
  /** mm from the base. */
  height: number
  axis: Axis
  /** Unbraced length next to it, the shorter, mm. */
  length: number
  /** N, and N/mm. */
  strength: number
  stiffness: number
}

/**
 * Strength and stiffness that each brace must have about each axis that it holds, for the governing compression, N. The
 * shape is only as good as its braces. Under EN the same rule is used, LRFD-wise, and said to be AISC's.
 */
export function braceNeeds({ column, terms }: PreparedColumn, compression: number): BraceNeed[] {
  if (!column || compression <= 0) return []
  const method = terms.standard === 'EN 1993-1-1' ? 'LRFD' : terms.method
  return (['strong', 'weak'] as const).flatMap((axis) => {
    const heights = braceHeightsOf(column, axis)
    return heights.map((height, index): BraceNeed => {
      const below = height - (heights[index - 1] ?? 0)
      const above = (heights[index + 1] ?? column.height) - height
      const length = Math.min(below, above)
      return {
        ...{ height, axis, length },
        strength: braceStrength(compression),
        stiffness: braceStiffness(compression, length, method),
      }
    })
  })
}
