import type { Method } from './resistance.ts'

/** α: ASD loads are raised to what would bring collapse. Appendix 8, Eq. A-8-3. */
export function secondOrderFactor(method: Method): number {
  return method === 'LRFD' ? 1 : 1.6
}

/**
 * Cm = 0.6 − 0.4·(M1/M2), M1 the smaller end moment, the ratio positive in reverse curvature. Eq. A-8-4.
 * −1 ≤ ratio ≤ 1; a far end that is not moved has 0.
 */
export function equivalentMoment(ratio: number): number {
  return 0.6 - 0.4 * ratio
}

/** Pe1 = π²·E·I/Lc1², N; Lc1 in the plane of bending, mm. Eq. A-8-5. */
export function elasticLoad(EI: number, length: number): number {
  return (Math.PI ** 2 * EI) / length ** 2
}

/**
 * B1 = Cm/(1 − α·Pr/Pe1), at least 1; undefined where α·Pr reaches Pe1: the column is unstable. Pr is compression, N.
 * Eq. A-8-3.
 */
export function amplifier(Cm: number, Pr: number, Pe1: number, method: Method): number | undefined {
  const share = (secondOrderFactor(method) * Math.max(0, Pr)) / Pe1
  return share >= 1 ? undefined : Math.max(1, Cm / (1 - share))
}
