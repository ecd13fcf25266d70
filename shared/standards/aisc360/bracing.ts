import type { Method } from './resistance.ts'

/** Required strength of a point brace: Pbr = 0.01·Pr, N. ANSI/AISC 360-22 Appendix 6, Eq. A-6-3. */
export function braceStrength(Pr: number): number {
  return 0.01 * Pr
}

/** Factors of brace stiffness, Appendix 6.2: φ = 0.75 (LRFD), Ω = 2.00 (ASD). */
const STIFFNESS_PHI = 0.75
const STIFFNESS_OMEGA = 2

/**
 * Required stiffness of a point brace: βbr = (1/φ)·8·Pr/Lbr (LRFD) or Ω·8·Pr/Lbr (ASD), N/mm.
 * Pr greatest required compression in the parts beside the brace, N; Lbr unbraced length next to it, mm.
 * ANSI/AISC 360-22 Appendix 6, Eq. A-6-4.
 */
export function braceStiffness(Pr: number, Lbr: number, method: Method): number {
  return (method === 'LRFD' ? 1 / STIFFNESS_PHI : STIFFNESS_OMEGA) * ((8 * Pr) / Lbr)
}
