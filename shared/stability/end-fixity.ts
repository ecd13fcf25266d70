import type { EndCondition, EndFixity, Ends } from './column.ts'
import { kFactor } from './k-table.ts'
import { holdsRotation, holdsTranslation } from './restraint.ts'
import type { StrutEnd } from './strut.ts'

/*
 * A recommended K above the theoretical one says that no base is ideally rigid. These are the rotational springs, in
 * units of EI/L, with which a column of length L has just that K (u = π/K). Closed forms of the beam-column; with the
 * recommended K: 5.27 fixed–pinned, 5.46 at both ends of fixed–fixed, 9.77 at both of fixed–guided, 20 at a cantilever's foot.
 */
const SPRING: Record<EndCondition, (u: number) => number> = {
  pinned: (u) => (u ** 2 * Math.tan(u)) / (u - Math.tan(u)),
  fixed: (u) => -u / Math.tan(u / 2),
  guided: (u) => u * Math.tan(u / 2),
  free: (u) => u * Math.tan(u),
}

function springBesides(other: EndCondition, length: number): number {
  const k = kFactor('fixed', other, 'recommended')
  return k === null ? 0 : SPRING[other](Math.PI / k) / length
}

/**
 * Rotational restraint of both ends for the eigenvalue method. Theoretical fixity: rigid. Recommended: a fixed end becomes
 * the spring that its K implies, over the first unbraced part where the axis is braced, and over the whole column where it
 * is not; there a guided end that faces a fixed one is softened alike.
 */
export function strutEnds(
  height: number,
  ends: Ends,
  braceHeights: readonly number[],
  fixity: EndFixity,
): { bottom: StrutEnd; top: StrutEnd } {
  const lowest = Math.min(...braceHeights)
  const highest = Math.max(...braceHeights)
  const braced = braceHeights.length > 0

  function rotation(end: EndCondition, other: EndCondition, part: number): number {
    if (!holdsRotation(end)) return 0
    if (fixity === 'theoretical') return Infinity
    if (end === 'fixed') return springBesides(braced ? 'pinned' : other, part)
    return !braced && other === 'fixed' ? springBesides('guided', part) : Infinity
  }

  return {
    bottom: {
      holdsTranslation: holdsTranslation(ends.bottom),
      rotation: rotation(ends.bottom, ends.top, braced ? lowest : height),
    },
    top: {
      holdsTranslation: holdsTranslation(ends.top),
      rotation: rotation(ends.top, ends.bottom, braced ? height - highest : height),
    },
  }
}
