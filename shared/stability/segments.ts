import type { EndCondition, EndFixity, Ends, Segment } from './column.ts'
import { kFactor } from './k-table.ts'

/**
 * Segment method: the column is split at the braces of one axis and each part takes K from its two ends, a brace being a
 * pin (AISC 360-22 Commentary, Table C-A-7.1). mm. A part with a free end above (or below) a brace has no K of its own,
 * since a brace that does not hold rotation leaves it a mechanism: its `k` and `kl` are `null` and the eigenvalue decides.
 */
export function segmentsOf(
  height: number,
  ends: Ends,
  braceHeights: readonly number[],
  fixity: EndFixity,
): Segment[] {
  const points = [0, ...[...braceHeights].sort((a, b) => a - b), height]
  const last = points.length - 1
  const conditionAt = (index: number): EndCondition =>
    index === 0 ? ends.bottom : index === last ? ends.top : 'pinned'
  return points.slice(1).map((to, index) => {
    const from = points[index] ?? 0
    const k = kFactor(conditionAt(index), conditionAt(index + 1), fixity)
    return { from, to, k, kl: k === null ? null : k * (to - from) }
  })
}

/** Largest K·L of the segments that have a K, mm. */
export function segmentLength(segments: readonly Segment[]): number {
  return Math.max(0, ...segments.map((segment) => segment.kl ?? 0))
}
