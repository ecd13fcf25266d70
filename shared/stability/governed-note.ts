import type { Axis, EffectiveLength } from './column.ts'

type Judged = Pick<EffectiveLength, 'segment' | 'eigenvalue' | 'governedBy' | 'segments'>

function percent(share: number): string {
  return `${(share * 100).toFixed(share < 0.1 ? 1 : 0)} %`
}

/** Which length method governed about one axis, and by how much, in plain words without units. */
export function axisNote(axis: Axis, length: Judged): string {
  const name = axis === 'strong' ? 'Strong axis' : 'Weak axis'
  if (length.governedBy === 'segment') {
    const shorter = 1 - length.eigenvalue / length.segment
    if (shorter < 0.0005)
      return `${name}: K of the segments governs; the eigenvalue of the whole column agrees.`
    return `${name}: K of the segments governs; the eigenvalue of the whole column is ${percent(shorter)} shorter and is not used.`
  }
  const longer = percent(length.eigenvalue / length.segment - 1)
  const cause = length.segments.some((segment) => segment.k === null)
    ? 'The part beyond the outermost brace is free and has no K of its own: it turns with the column below'
    : 'The column as a whole is weaker than its parts'
  return `${name}: ${cause}. The eigenvalue of the whole column governs; its length is ${longer} more than the longest braced part gives.`
}

/** One sentence or two for each axis. */
export function governedNote(lengths: { strong: Judged; weak: Judged }): string[] {
  return [axisNote('strong', lengths.strong), axisNote('weak', lengths.weak)]
}
