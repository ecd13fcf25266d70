import type { ISection, Section } from '../../sections/section.ts'
import { refuse } from '../../units/refusal.ts'

export type Curve = 'a' | 'b' | 'c' | 'd'

/** Imperfection factors α, EN 1993-1-1 Table 6.1. */
export const IMPERFECTION: Record<Curve, number> = { a: 0.21, b: 0.34, c: 0.49, d: 0.76 }

/**
 * Curves about the strong (y) and weak (z) axis, EN 1993-1-1 Table 6.2, S235 to S420. Rolled I: h/b > 1.2: tf ≤ 40 a/b,
 * to 100 b/c; h/b ≤ 1.2: tf ≤ 100 b/c, beyond d/d. Hollow: hot finished a, cold formed c. Refuses what is not tabulated.
 */
export function curvesOf(section: Section): { strong: Curve; weak: Curve } {
  if (section.shape !== 'I') {
    const curve = section.process === 'cold formed' ? 'c' : 'a'
    return { strong: curve, weak: curve }
  }
  const { depth, width, tf } = section
  if (depth / width <= 1.2) {
    return tf <= 100 ? { strong: 'b', weak: 'c' } : { strong: 'd', weak: 'd' }
  }
  if (tf <= 40) return { strong: 'a', weak: 'b' }
  if (tf <= 100) return { strong: 'b', weak: 'c' }
  return refuse(
    'section',
    `${section.designation}: h/b over 1.2 with a flange over 100 mm has no buckling curve`,
  )
}

/** Ncr = π²·E·I/Lcr², N. EN 1993-1-1 6.3.1.2. */
export function elasticLoadEn(EI: number, length: number): number {
  return (Math.PI ** 2 * EI) / length ** 2
}

/** Ncr,T = (G·It + π²·E·Iw/LT²)/i0², i0² = (Iy + Iz)/A; doubly symmetric I. N. EN 1993-1-1 6.3.1.4. */
export function torsionalLoad(
  { J, Cw, Ix, Iy, area }: Pick<ISection, 'J' | 'Cw' | 'Ix' | 'Iy' | 'area'>,
  E: number,
  G: number,
  length: number,
): number {
  return (G * J + (Math.PI ** 2 * E * Cw) / length ** 2) / ((Ix + Iy) / area)
}

/** λ̄ = √(Aeff·fy/Ncr). Eq. 6.49. */
export function relativeSlenderness(Aeff: number, fy: number, Ncr: number): number {
  return Math.sqrt((Aeff * fy) / Ncr)
}

/** χ = 1/(Φ + √(Φ² − λ̄²)) ≤ 1, Φ = 0.5·[1 + α·(λ̄ − 0.2) + λ̄²]. Eq. 6.49. */
export function bucklingReduction(lambda: number, curve: Curve): number {
  if (lambda <= 0.2) return 1
  const phi = halfPhi(lambda, curve)
  return Math.min(1, 1 / (phi + Math.sqrt(phi ** 2 - lambda ** 2)))
}

export function halfPhi(lambda: number, curve: Curve): number {
  return 0.5 * (1 + IMPERFECTION[curve] * (lambda - 0.2) + lambda ** 2)
}
