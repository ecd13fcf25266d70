/** Pr/Pc from which the first of the two equations counts. */
export const INTERACTION_TURN = 0.2

/**
 * Flexure and axial force together: p + 8/9·(mx + my) for p ≥ 0.2, else p/2 + mx + my; each a required strength over an
 * available one. At most 1. ANSI/AISC 360-22 Eq. H1-1a, H1-1b; for tension H1.2 alike.
 */
export function interaction(p: number, mx: number, my: number): number {
  return p >= INTERACTION_TURN ? p + (8 / 9) * (mx + my) : p / 2 + mx + my
}
