import type { Column } from './column.ts'
import { criticalLoad } from './critical-load.ts'
import { holdsRotation } from './restraint.ts'

export interface TorsionLength {
  /** Lcz, mm. */
  used: number
  /** Parts between points that stop twist; a part with a free end counts 2.0 times. */
  segments: { from: number; to: number; length: number }[]
}

/** A part held against twist and warping at one end and free at the other, as a cantilever in bending. */
const FREE_PART = 2

function endStopsTwist(column: Column, end: 'bottom' | 'top'): boolean {
  return column.ends.strong[end] !== 'free' && column.ends.weak[end] !== 'free'
}

/** Heights that stop twist, mm, in order: every end that is not free about either axis, and the braces that say so. */
export function twistStops(column: Column): number[] {
  return [
    ...(endStopsTwist(column, 'bottom') ? [0] : []),
    ...column.braces.filter((brace) => brace.stopsTwist).map((brace) => brace.height),
    ...(endStopsTwist(column, 'top') ? [column.height] : []),
  ].sort((a, b) => a - b)
}

/**
 * Effective length for torsional buckling, Lcz, mm (AISC 360-22 E4): the largest part between points that stop twist. A brace
 * that stops translation alone does not shorten it. A part between a twist stop and a free end counts 2.0 times, which
 * supposes that the stop holds warping too. Above a brace it does not quite: warping runs through, and torsion obeys the
 * equation of bending with twist for deflection, so the eigenvalue of the whole counts where it is longer.
 */
export function torsionLength(column: Column): TorsionLength {
  const stops = twistStops(column)
  const first = stops[0] ?? 0
  const last = stops.at(-1) ?? column.height
  const parts = [...new Set([0, ...stops, column.height])].sort((a, b) => a - b)
  const segments = parts.slice(1).map((to, index) => {
    const from = parts[index] ?? 0
    const free = to <= first || from >= last
    return { from, to, length: (free ? FREE_PART : 1) * (to - from) }
  })
  const longest = Math.max(...segments.map((segment) => segment.length))
  const overhang = stops.length >= 2 && (first > 0 || last < column.height)
  return { used: overhang ? Math.max(longest, twistEigenvalue(column, stops)) : longest, segments }
}

function twistEigenvalue(column: Column, stops: readonly number[]): number {
  const end = (name: 'bottom' | 'top') => ({
    holdsTranslation: endStopsTwist(column, name),
    rotation: holdsRotation(column.ends.weak[name]) && endStopsTwist(column, name) ? Infinity : 0,
  })
  const braceHeights = stops.filter((at) => at > 0 && at < column.height)
  return criticalLoad({ height: column.height, bottom: end('bottom'), top: end('top'), braceHeights }).length
}
